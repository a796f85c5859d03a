import { expect, it } from 'vitest';
import { beforeMigrations } from '../testing/before-migrations.ts';

const { run, up } = beforeMigrations();

const ago = (days: number) => `date('now', '-${days} days')`;
/** 25 ft² marked, 24 ft² measured, in thousandths of mm². */
const [marked, measured] = [2_322_576_000, 2_229_672_960];
const missing = marked - measured;

/** One order of leather and rivets for each delivery but the last, which came for the order of the one before it. */
const deliveries = [
  { order: 1, day: ago(2) },
  { order: 2, day: ago(8) },
  { order: 3, day: ago(40) },
  { order: 4, day: ago(40) },
  { order: 4, day: ago(2) },
];

const at = `'2026-11-09T09:00:00.000Z'`;

function came({ order, day }: (typeof deliveries)[number], index: number): string[] {
  const [receipt, lot, rivets] = [index + 1, 2 * index + 1, 2 * index + 2];
  const moved = `at, day, kind, quantity, value, purchase_order_id, reason, actor_name`;
  const lines = `receipt_id, position, purchase_line_id, quantity, batch, goods, carriage, movement_id`;
  return [
    `INSERT INTO lot (tag, leather_id, form, measured_area_mm2, pieces, cost, grade, shade, place, supplier_lot, received_on)
      VALUES ('T-${receipt}', 1, 'side', ${measured}, 1, 21250, '', '', '', '', ${day})`,
    `INSERT INTO stock_movement (lot_id, ${moved})
      VALUES (${receipt}, ${at}, ${day}, 'receive', ${measured}, 21250, ${order}, '', 'The maker')`,
    `INSERT INTO stock_movement (hardware_id, ${moved})
      VALUES (1, ${at}, ${day}, 'receive', 1000, 17000, ${order}, '', 'The maker')`,
    `INSERT INTO receipt (purchase_order_id, received_on, at, freight, duty, shared_by, tolerance_percent, actor_name)
      VALUES (${order}, ${day}, ${at}, 0, 0, 'value', 30000, 'The maker')`,
    `INSERT INTO receipt_line (lot_id, marked_area_mm2, ${lines})
      VALUES (${receipt}, ${marked}, ${receipt}, 1, ${2 * order - 1}, ${measured}, '', 21250, 0, ${lot})`,
    `INSERT INTO receipt_line (hardware_id, ${lines})
      VALUES (1, ${receipt}, 2, ${2 * order}, 1000, '', 17000, 0, ${rivets})`,
  ];
}

const before = [
  `INSERT INTO supplier (name, email, phone, lead_days, note, active) VALUES ('Oldbeck', '', '', 7, '', 1)`,
  `INSERT INTO leather (name, tannage, colour, finish, price_per_ft2, active) VALUES ('Oak tan', '', '', '', 90000, 1)`,
  `INSERT INTO hardware (name, kind, metal, colour, unit_price, pack_size, reorder_at, bin, active)
    VALUES ('Rivet', 'hardware', '', '', 1700, 100, 0, '', 1)`,
  ...[1, 2, 3, 4].flatMap((order) => [
    `INSERT INTO purchase_order (number, supplier_id, state, note, created_at, receipts)
      VALUES ('P-000${order}', 1, 'part received', '', ${at}, 1)`,
    // 8.50 per ft² and 0.1625 each: the leather came at its price, the rivets at 7.50 more.
    `INSERT INTO purchase_line (purchase_order_id, position, leather_id, quantity, received, unit_price)
      VALUES (${order}, 1, 1, ${2 * marked}, ${marked}, 85000)`,
    `INSERT INTO purchase_line (purchase_order_id, position, hardware_id, quantity, received, unit_price)
      VALUES (${order}, 2, 1, 2000, 1000, 1625)`,
  ]),
  ...deliveries.flatMap(came),
  `INSERT INTO supplier_claim (purchase_order_id, receipt_id, state, missing_area_mm2, worth, text, sent_by, note, opened_at)
    VALUES (4, 4, 'open', ${missing}, 850, 'Short', 'hand', '', ${at})`,
];

it('deliveries of before say what differs, and what had left Today already counts as answered', async () => {
  await up('migration-20261211-the-drafted-for');
  for (const statement of before) await run(statement);
  await up();
  const receipts = await run('SELECT price_difference, missing_area_mm2 FROM receipt');
  const same = { price_difference: 750, missing_area_mm2: missing };
  expect(receipts).toEqual(deliveries.map(() => same));
  expect(
    await run(
      `SELECT receipt_id, matter, price_difference, missing_area_mm2, reason, actor_id, actor_name
       FROM delivery_answer ORDER BY receipt_id, matter`,
    ),
  ).toEqual(
    [
      // The order of the last two was on Today yesterday, and what is claimed awaits its credit.
      { receipt_id: 2, matter: 'price', price_difference: 750, missing_area_mm2: null },
      { receipt_id: 3, matter: 'price', price_difference: 750, missing_area_mm2: null },
      { receipt_id: 3, matter: 'short', price_difference: null, missing_area_mm2: missing },
    ].map((answer) => ({
      ...answer,
      reason: 'It had left Today before answers were kept.',
      actor_id: null,
      actor_name: 'Hidewright',
    })),
  );
  expect(await run('PRAGMA foreign_key_check')).toEqual([]);
  await expect(run('DELETE FROM delivery_answer')).rejects.toThrow('append-only');
});
