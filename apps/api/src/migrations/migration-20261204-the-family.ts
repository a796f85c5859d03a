import { Migration } from '@mikro-orm/migrations';

const changes = [
  `ALTER TABLE stock_movement ADD COLUMN from_lot_id INTEGER REFERENCES lot (id)
    CHECK (from_lot_id IS NULL
      OR (kind = 'return' AND job_id IS NOT NULL AND lot_id IS NOT NULL AND lot_id <> from_lot_id))`,
  `CREATE INDEX stock_movement_from_lot ON stock_movement (from_lot_id)`,
  `CREATE INDEX lot_parent ON lot (parent_id)`,
];

/** Offcuts: the row of the ledger that puts one on the rack says which lot its leather was taken from. */
export class TheFamily extends Migration {
  override up(): void {
    for (const statement of changes) this.addSql(statement);
  }
}
