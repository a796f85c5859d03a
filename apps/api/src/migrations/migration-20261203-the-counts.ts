import { Migration } from '@mikro-orm/migrations';

const tables = [
  `CREATE TABLE stock_count (
    id INTEGER PRIMARY KEY AUTOINCREMENT,
    state TEXT NOT NULL CHECK (state IN ('open', 'handed in', 'approved', 'cancelled')),
    title TEXT NOT NULL CHECK (length(title) BETWEEN 1 AND 120),
    place TEXT,
    leather_id INTEGER REFERENCES leather (id),
    opened_at TEXT NOT NULL,
    opened_by_name TEXT NOT NULL,
    handed_in_at TEXT,
    handed_in_by_name TEXT,
    settled_at TEXT,
    settled_by_name TEXT,
    version INTEGER NOT NULL DEFAULT 1 CHECK (version > 0),
    CHECK ((settled_at IS NOT NULL) = (state IN ('approved', 'cancelled')))
  ) STRICT`,
  `CREATE TABLE count_line (
    id INTEGER PRIMARY KEY AUTOINCREMENT,
    count_id INTEGER NOT NULL REFERENCES stock_count (id),
    lot_id INTEGER REFERENCES lot (id),
    hardware_id INTEGER REFERENCES hardware (id),
    added INTEGER NOT NULL CHECK (added IN (0, 1)),
    counted INTEGER CHECK (counted >= 0),
    book INTEGER CHECK (book >= 0),
    unmeasured INTEGER NOT NULL CHECK (unmeasured IN (0, 1)),
    again INTEGER NOT NULL CHECK (again IN (0, 1)),
    counted_at TEXT,
    counted_by_id INTEGER REFERENCES person (id),
    counted_by_name TEXT,
    movement_id INTEGER REFERENCES stock_movement (id),
    CHECK ((lot_id IS NULL) <> (hardware_id IS NULL)),
    CHECK ((counted IS NULL) = (book IS NULL)),
    CHECK (counted IS NULL OR unmeasured = 0),
    CHECK ((counted_at IS NULL) = (counted IS NULL AND unmeasured = 0)),
    UNIQUE (count_id, lot_id),
    UNIQUE (count_id, hardware_id)
  ) STRICT`,
  `CREATE INDEX count_line_lot ON count_line (lot_id)`,
  `CREATE INDEX count_line_hardware ON count_line (hardware_id)`,
  `ALTER TABLE workshop ADD COLUMN stock_value TEXT NOT NULL DEFAULT 'moving average'
    CHECK (stock_value IN ('moving average', 'first in first out'))`,
  `ALTER TABLE workshop ADD COLUMN stock_value_after INTEGER NOT NULL DEFAULT 0 CHECK (stock_value_after >= 0)`,
  `CREATE INDEX stock_movement_day ON stock_movement (day)`,
];

/** Sheets on which a shelf is counted, and how the shop values what it counts by the piece. */
export class TheCounts extends Migration {
  override up(): void {
    for (const statement of tables) this.addSql(statement);
  }
}
