import { expect, it } from 'vitest';
import { beforeMigrations } from '../testing/before-migrations.ts';

const { run, up } = beforeMigrations();

const before = [
  `INSERT INTO customer (id, name, contact_name, email, phone, address, note, active, created_at)
    VALUES (1, 'Brambling Brewery', '', '', '', '', '', 1, '2026-11-01')`,
  `INSERT INTO pattern (id, name, latest_version, active) VALUES (1, 'Round coaster', 1, 1)`,
  `INSERT INTO pattern_version (id, pattern_id, number, definition, created_at, created_by)
    VALUES (1, 1, 1, '{}', '2026-11-01', 'The owner')`,
  `INSERT INTO layout (id, input_hash, input, result, pieces, created_at) VALUES (1, 'h', '{}', '{}', 1, '2026-11-01')`,
  `INSERT INTO quote (id, number, revision, customer_id, pattern_version_id, layout_id, title, state, input, numbers,
    overrides, message, created_at)
    VALUES (1, 'Q-0001', 1, 1, 1, 1, 'Coasters', 'sent', '{}', '{}', '{}', '', '2026-11-01')`,
  `INSERT INTO customer_order (id, number, quote_id, customer_id, title, quantity, price_each, goods_total, tooling_charge,
    total, state, awaits, promised_on, taken_on_at)
    VALUES (1, 'O-0001', 1, 1, 'Coasters', 10, 10000, 1000, 0, 1000, 'shipped', '[]', '2026-11-20', '2026-11-02')`,
  ...[
    [1, `'I-0001', 1`, `'issued'`],
    [2, 'NULL, NULL', `'draft'`],
    [3, 'NULL, NULL', `'draft'`],
  ].map(
    ([id, numbered, state]) =>
      `INSERT INTO invoice (id, number, sequence, order_id, customer_id, state, net, tax, total, paid, credited, created_at)
        VALUES (${id}, ${numbered}, 1, 1, ${state}, 1000, 0, 1000, 0, 0, '2026-11-21')`,
  ),
  `DELETE FROM invoice WHERE id = 3`,
  `INSERT INTO posting (entry, day, account, amount, invoice_id, at) VALUES (1, '2026-11-21', 'sales', -1000, 1, '')`,
  `INSERT INTO finished_piece (id, pattern_id, option_name, sort, on_hand, value, place) VALUES (1, 1, '', 'good', 2, 300, '')`,
  `INSERT INTO finished_movement (finished_piece_id, at, day, kind, quantity, value, reason, actor_name)
    VALUES (1, '', '2026-11-20', 'count', 3, 450, 'found', 'The owner'), (1, '', '2026-11-21', 'sold', -1, -150, 'market', 'The owner')`,
];

it('invoices and the shelf’s ledger from before come through, as locked as they were', async () => {
  await up('migration-20261206-the-weights');
  for (const row of before) await run(row);
  await up();
  expect(await run(`SELECT id, number, order_id, state FROM invoice ORDER BY id`)).toEqual([
    { id: 1, number: 'I-0001', order_id: 1, state: 'issued' },
    { id: 2, number: null, order_id: 1, state: 'draft' },
  ]);
  expect(await run(`SELECT kind, quantity, value, shelf_sale_id FROM finished_movement`)).toEqual([
    { kind: 'count', quantity: 3, value: 450, shelf_sale_id: null },
    { kind: 'sold', quantity: -1, value: -150, shelf_sale_id: null },
  ]);
  expect(await run(`PRAGMA foreign_key_check`)).toEqual([]);
  await expect(run(`UPDATE invoice SET net = 1, total = 1 WHERE id = 1`)).rejects.toThrow(
    'does not change',
  );
  await expect(run(`DELETE FROM invoice WHERE id = 1`)).rejects.toThrow('is not deleted');
  await expect(run(`DELETE FROM finished_movement`)).rejects.toThrow('append-only');
  await expect(
    run(`INSERT INTO posting (entry, day, account, amount, invoice_id, at)
    VALUES (2, '2026-11-21', 'sales', -1, 9, '')`),
  ).rejects.toThrow('FOREIGN KEY');
  await run(`INSERT INTO invoice (customer_id, state, net, tax, total, paid, credited, created_at)
    VALUES (1, 'draft', 0, 0, 0, 0, 0, '2026-12-02')`);
  // The discarded draft was number 3, and stays the only one.
  expect(await run(`SELECT id FROM invoice WHERE order_id IS NULL`)).toEqual([{ id: 4 }]);
});
