import { expect, it } from 'vitest';
import { beforeMigrations } from '../testing/before-migrations.ts';

const { run, up } = beforeMigrations();

/** One order whose side is marked as ordered, and one whose side measures more than is marked. */
const before = [
  `INSERT INTO supplier (name, email, phone, lead_days, note, active) VALUES ('Oldbeck', '', '', 7, '', 1)`,
  `INSERT INTO leather (name, tannage, colour, finish, price_per_ft2, active) VALUES ('Oak tan', '', '', '', 90000, 1)`,
  `INSERT INTO purchase_order (number, supplier_id, state, note, created_at, receipts) VALUES
    ('P-0001', 1, 'part received', '', '2026-11-01T09:00:00.000Z', 1),
    ('P-0002', 1, 'part received', '', '2026-11-01T09:00:00.000Z', 1)`,
  `INSERT INTO purchase_line (purchase_order_id, position, leather_id, quantity, received, unit_price, awaited_until)
    VALUES (1, 1, 1, 2550, 2400, 90000, NULL), (2, 1, 1, 2550, 2600, 90000, '2026-11-09')`,
  `INSERT INTO lot (tag, leather_id, form, measured_area_mm2, pieces, cost, grade, shade, place, supplier_lot,
    received_on, purchase_line_id) VALUES ('T-0001', 1, 'side', 2400, 1, 2, '', '', '', '', '2026-11-09', 1),
    ('T-0002', 1, 'side', 2600, 1, 2, '', '', '', '', '2026-11-09', 2)`,
  `INSERT INTO stock_movement (at, day, kind, lot_id, quantity, value, purchase_order_id, reason, actor_name) VALUES
    ('2026-11-09T09:00:00.000Z', '2026-11-09', 'receive', 1, 2400, 2, 1, '', 'The maker'),
    ('2026-11-09T09:00:00.000Z', '2026-11-09', 'receive', 2, 2600, 2, 2, '', 'The maker')`,
  `INSERT INTO receipt (purchase_order_id, received_on, at, freight, duty, shared_by, tolerance_percent, actor_name, version)
    VALUES (1, '2026-11-09', '2026-11-09T09:00:00.000Z', 0, 0, 'value', 0, 'The maker', 1),
      (2, '2026-11-09', '2026-11-09T09:00:00.000Z', 0, 0, 'value', 0, 'The maker', 1)`,
  `INSERT INTO receipt_line (receipt_id, position, purchase_line_id, lot_id, quantity, marked_area_mm2, batch, goods,
    carriage, movement_id) VALUES (1, 1, 1, 1, 2400, 2550, '', 2, 0, 1), (2, 1, 2, 2, 2600, 2500, '', 2, 0, 2)`,
];

it('leather that came before counts as it is marked, and its order is done or is not', async () => {
  await up('migration-20261208-the-days');
  for (const statement of before) await run(statement);
  await up();
  expect(await run('SELECT received, awaited_until FROM purchase_line ORDER BY id')).toEqual([
    { received: 2550, awaited_until: '2026-11-09' },
    { received: 2500, awaited_until: null },
  ]);
  expect(await run('SELECT state FROM purchase_order ORDER BY id')).toEqual([
    { state: 'received' },
    { state: 'part received' },
  ]);
});
