import { Migration } from '@mikro-orm/migrations';

const changes = [
  `ALTER TABLE purchase_line ADD COLUMN service TEXT
    CHECK (service IS NULL OR (length(service) BETWEEN 1 AND 40 AND leather_id IS NOT NULL))`,
  `ALTER TABLE purchase_line ADD COLUMN from_lot_id INTEGER REFERENCES lot (id)
    CHECK ((from_lot_id IS NULL) = (service IS NULL))`,
  `ALTER TABLE purchase_line ADD COLUMN fixed_price INTEGER
    CHECK (fixed_price IS NULL OR (fixed_price >= 0 AND unit_price = 0 AND service IS NOT NULL))`,
  `CREATE INDEX purchase_line_from_lot ON purchase_line (from_lot_id)`,
  `ALTER TABLE receipt_line ADD COLUMN material INTEGER NOT NULL DEFAULT 0
    CHECK (material >= 0 AND (material = 0 OR (lot_id IS NOT NULL AND purchase_line_id IS NOT NULL)))`,
  `ALTER TABLE stock_movement ADD COLUMN purchase_line_id INTEGER REFERENCES purchase_line (id)
    CHECK (purchase_line_id IS NULL OR (kind IN ('take', 'return') AND (quantity < 0) = (kind = 'take')
      AND lot_id IS NOT NULL AND job_id IS NULL AND purchase_order_id IS NOT NULL))`,
  `CREATE INDEX stock_movement_purchase_line ON stock_movement (purchase_line_id)`,
];

/** Services bought in: an order's line can send a lot out; the ledger says which line it went out on, and a receipt what the leather had cost. */
export class TheServices extends Migration {
  override up(): void {
    for (const statement of changes) this.addSql(statement);
  }
}
