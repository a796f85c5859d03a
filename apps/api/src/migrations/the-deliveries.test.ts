import { expect, it } from 'vitest';
import { beforeMigrations } from '../testing/before-migrations.ts';

const { run, up } = beforeMigrations();

const before = [
  `INSERT INTO supplier (name, email, phone, lead_days, note, active) VALUES ('Oldbeck', '', '', 7, '', 1)`,
  `INSERT INTO leather (name, tannage, colour, finish, price_per_ft2, active) VALUES ('Oak tan', '', '', '', 90000, 1)`,
  `INSERT INTO hardware (name, kind, unit_price, pack_size, reorder_at, active) VALUES ('Rivet', 'hardware', 1700, 1, 0, 1)`,
  `INSERT INTO purchase_order (number, supplier_id, state, note, created_at)
    VALUES ('P-0001', 1, 'part received', '', '2026-11-01T09:00:00.000Z')`,
  `INSERT INTO purchase_line (purchase_order_id, position, leather_id, hardware_id, quantity, received, unit_price)
    VALUES (1, 1, 1, NULL, 9000000, 2000000, 90000), (1, 2, NULL, 1, 900, 600, 1700)`,
  `INSERT INTO lot (tag, leather_id, form, measured_area_mm2, pieces, cost, grade, shade, place, supplier_lot,
    received_on, purchase_line_id) VALUES ('T-0001', 1, 'side', 2000000, 1, 210, '', '', '', '', '2026-11-09', 1)`,
  `INSERT INTO stock_movement (at, day, kind, lot_id, hardware_id, quantity, value, purchase_order_id, reason, actor_name)
    VALUES ('2026-11-09T09:00:00.000Z', '2026-11-09', 'receive', 1, NULL, 2000000, 210, 1, '', 'The maker'),
      ('2026-11-09T09:00:00.000Z', '2026-11-09', 'receive', NULL, 1, 500, 8500, 1, '', 'The maker'),
      ('2026-11-12T09:00:00.000Z', '2026-11-12', 'receive', NULL, 1, 100, 1700, 1, '', 'The owner'),
      ('2026-11-13T09:00:00.000Z', '2026-11-13', 'receive', NULL, 1, 40, 680, NULL, '', 'The owner')`,
];

it('what came on an order before becomes deliveries, one for each time something came', async () => {
  await up('migration-20261202-the-photos');
  for (const statement of before) await run(statement);
  await up();
  expect(
    await run('SELECT id, purchase_order_id, received_on, freight, actor_name FROM receipt'),
  ).toEqual([
    expect.objectContaining({ id: 1, received_on: '2026-11-09', actor_name: 'The maker' }),
    expect.objectContaining({ id: 2, received_on: '2026-11-12', freight: 0 }),
  ]);
  expect(
    await run(
      'SELECT receipt_id, position, purchase_line_id, quantity, goods, movement_id FROM receipt_line ORDER BY id',
    ),
  ).toEqual([
    expect.objectContaining({ receipt_id: 1, position: 1, purchase_line_id: 1, goods: 210 }),
    expect.objectContaining({ receipt_id: 1, position: 2, purchase_line_id: 2, quantity: 500 }),
    expect.objectContaining({ receipt_id: 2, position: 1, purchase_line_id: 2, movement_id: 3 }),
  ]);
  expect(await run('SELECT receipts FROM purchase_order')).toEqual([
    expect.objectContaining({ receipts: 2 }),
  ]);
  expect(await run('PRAGMA foreign_key_check')).toEqual([]);
});
