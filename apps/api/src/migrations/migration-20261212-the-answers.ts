import { Migration } from '@mikro-orm/migrations';
import { appendOnly } from './append-only.ts';

/** Thousandths of mm² at ten-thousandths per ft², in hundredths; in two parts, which keeps large areas within whole numbers. */
const ofLeather = (area: string, price: string) =>
  `CAST(${area} / 9290304000 * ${price} + (${area} % 9290304000 * ${price} + 4645152000) / 9290304000 AS INTEGER)`;

const paidFor = 'COALESCE(l.marked_area_mm2, l.quantity)';
/** Each row of a delivery rounds by itself; work bought in has its price once, however many lots come back. */
const atOrderedPrice = `CASE
  WHEN n.service IS NOT NULL THEN CASE WHEN l.position = (SELECT MIN(o.position) FROM receipt_line o
      WHERE o.receipt_id = l.receipt_id AND o.purchase_line_id = n.id)
    THEN COALESCE(n.fixed_price, ${ofLeather('n.quantity', 'n.unit_price')}) ELSE 0 END
  WHEN n.leather_id IS NOT NULL THEN ${ofLeather(paidFor, 'n.unit_price')}
  ELSE CAST((l.quantity * n.unit_price + 50) / 100 AS INTEGER) END`;

const differences = [
  `ALTER TABLE receipt ADD COLUMN price_difference INTEGER NOT NULL DEFAULT 0`,
  `ALTER TABLE receipt ADD COLUMN missing_area_mm2 INTEGER NOT NULL DEFAULT 0 CHECK (missing_area_mm2 >= 0)`,
  `UPDATE receipt SET price_difference = COALESCE((SELECT SUM(l.goods - ${atOrderedPrice})
    FROM receipt_line l JOIN purchase_line n ON n.id = l.purchase_line_id WHERE l.receipt_id = receipt.id), 0)`,
  `UPDATE receipt SET missing_area_mm2 = COALESCE((SELECT SUM(l.marked_area_mm2 - l.quantity)
    FROM receipt_line l WHERE l.receipt_id = receipt.id
      AND (l.marked_area_mm2 - l.quantity) * 1000000 > receipt.tolerance_percent * l.marked_area_mm2), 0)`,
  `CREATE INDEX receipt_price_difference ON receipt (id) WHERE price_difference <> 0`,
  `CREATE INDEX receipt_missing_area ON receipt (id) WHERE missing_area_mm2 > 0`,
  `CREATE INDEX supplier_claim_receipt ON supplier_claim (receipt_id)`,
  `CREATE INDEX supplier_claim_open ON supplier_claim (receipt_id) WHERE state = 'open'`,
];

const by = `'It had left Today before answers were kept.', strftime('%Y-%m-%dT%H:%M:%fZ', 'now'), 'Hidewright'`;

const answers = [
  `CREATE TABLE delivery_answer (
    id INTEGER PRIMARY KEY AUTOINCREMENT,
    receipt_id INTEGER NOT NULL REFERENCES receipt (id),
    matter TEXT NOT NULL CHECK (matter IN ('price', 'short')),
    price_difference INTEGER CHECK (price_difference <> 0),
    missing_area_mm2 INTEGER CHECK (missing_area_mm2 > 0),
    reason TEXT NOT NULL,
    at TEXT NOT NULL,
    actor_id INTEGER REFERENCES person (id),
    actor_name TEXT NOT NULL,
    CHECK ((matter = 'price') = (price_difference IS NOT NULL)),
    CHECK ((matter = 'short') = (missing_area_mm2 IS NOT NULL))
  ) STRICT`,
  `CREATE INDEX delivery_answer_receipt ON delivery_answer (receipt_id)`,
  // Until now a price left Today 7 days after the last delivery of its order, and what nobody claimed after 30.
  `INSERT INTO delivery_answer (receipt_id, matter, price_difference, reason, at, actor_name)
    SELECT r.id, 'price', r.price_difference, ${by} FROM receipt r WHERE r.price_difference <> 0
      AND NOT EXISTS (SELECT 1 FROM receipt o WHERE o.purchase_order_id = r.purchase_order_id
        AND o.received_on > date('now', '-7 days'))`,
  `INSERT INTO delivery_answer (receipt_id, matter, missing_area_mm2, reason, at, actor_name)
    SELECT r.id, 'short', r.missing_area_mm2, ${by} FROM receipt r
    WHERE r.missing_area_mm2 > 0 AND r.purchase_order_id IS NOT NULL AND r.received_on < date('now', '-30 days')
      AND NOT EXISTS (SELECT 1 FROM supplier_claim c WHERE c.receipt_id = r.id)`,
  ...appendOnly('delivery_answer'),
];

/** What differs stands with its delivery, and what the owner answered to it in rows that are only added: so Today asks until somebody has looked. */
export class TheAnswers extends Migration {
  override up(): void {
    for (const statement of [...differences, ...answers]) this.addSql(statement);
  }
}
