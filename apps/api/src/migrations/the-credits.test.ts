import { expect, it } from 'vitest';
import { beforeMigrations } from '../testing/before-migrations.ts';

const { run, up } = beforeMigrations();

const before = [
  `INSERT INTO supplier (name, email, phone, lead_days, note, active) VALUES ('Oldbeck', '', '', 7, '', 1)`,
  `INSERT INTO purchase_order (number, supplier_id, state, note, created_at, receipts) VALUES
    ('P-0001', 1, 'received', '', '2026-11-01T09:00:00.000Z', 1)`,
  `INSERT INTO receipt (purchase_order_id, received_on, at, freight, duty, shared_by, tolerance_percent, actor_name, version)
    VALUES (1, '2026-11-09', '2026-11-09T09:00:00.000Z', 0, 0, 'value', 0, 'The maker', 1)`,
  `INSERT INTO supplier_claim (purchase_order_id, receipt_id, state, missing_area_mm2, worth, text, sent_by, credited, note,
    opened_at, closed_at) VALUES
    (1, 1, 'credited', 100, 850, 'Short', 'hand', 800, '', '2026-11-10T09:00:00.000Z', '2026-11-20T09:00:00.000Z'),
    (1, 1, 'open', 100, 850, 'Short', 'hand', NULL, '', '2026-11-10T09:00:00.000Z', NULL)`,
  `INSERT INTO leather (name, tannage, colour, finish, price_per_ft2, active) VALUES ('Oak tan', '', '', '', 90000, 1)`,
  `INSERT INTO lot (tag, leather_id, form, measured_area_mm2, pieces, cost, grade, shade, place, supplier_lot, received_on)
    VALUES ('T-0001', 1, 'side', 2400, 1, 2, '', '', '', '', '2026-11-09')`,
  `INSERT INTO stock_movement (at, day, kind, lot_id, quantity, value, purchase_order_id, reason, actor_name)
    VALUES ('2026-11-09T09:00:00.000Z', '2026-11-09', 'receive', 1, 2400, 2, 1, '', 'The maker')`,
  `INSERT INTO receipt_line (receipt_id, position, lot_id, quantity, marked_area_mm2, batch, goods, carriage, movement_id)
    VALUES (1, 1, 1, 2400, 2500, '', 2, 0, 1)`,
  `INSERT INTO claimed_lot (supplier_claim_id, receipt_line_id) VALUES (2, 1)`,
  `INSERT INTO activity (seq, at, actor_id, actor_name, actor_role, action, subject_kind, subject_id, previous_hash, detail, hash)
    VALUES (1, '2026-11-20T09:00:00.000Z', NULL, 'The owner', 'owner', 'noted what a claim was credited', 'supplier claim', 1,
      '', '{}', 'h')`,
];

it('claims come through with their lots, and a credit is its own first note, and can be put right', async () => {
  await up('migration-20261209-the-marks');
  for (const statement of before) await run(statement);
  await up();
  expect(await run('SELECT * FROM claim_credit')).toEqual([
    {
      id: 1,
      supplier_claim_id: 1,
      credited: 800,
      reason: '',
      at: '2026-11-20T09:00:00.000Z',
      actor_id: null,
      actor_name: 'The owner',
    },
  ]);
  expect(await run('SELECT id, receipt_id, movement_id, state FROM supplier_claim')).toEqual([
    { id: 1, receipt_id: 1, movement_id: null, state: 'credited' },
    { id: 2, receipt_id: 1, movement_id: null, state: 'open' },
  ]);
  expect(await run('PRAGMA foreign_key_check')).toEqual([]);
  await expect(run('UPDATE claim_credit SET credited = 1')).rejects.toThrow('append-only');
});
