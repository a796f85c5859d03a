import { Migration } from '@mikro-orm/migrations';
import { appendOnly } from './append-only.ts';

const tables = [
  `CREATE TABLE finished_piece (
    id INTEGER PRIMARY KEY AUTOINCREMENT,
    pattern_id INTEGER NOT NULL REFERENCES pattern (id),
    option_name TEXT NOT NULL,
    sort TEXT NOT NULL CHECK (sort IN ('good', 'seconds')),
    customer_id INTEGER REFERENCES customer (id),
    on_hand INTEGER NOT NULL CHECK (on_hand >= 0),
    value INTEGER NOT NULL CHECK (value >= 0),
    place TEXT NOT NULL,
    version INTEGER NOT NULL DEFAULT 1 CHECK (version > 0),
    CHECK (on_hand > 0 OR value = 0)
  ) STRICT`,
  `CREATE UNIQUE INDEX finished_piece_kind
    ON finished_piece (pattern_id, option_name, sort, COALESCE(customer_id, 0))`,
  `CREATE TABLE finished_movement (
    id INTEGER PRIMARY KEY AUTOINCREMENT,
    finished_piece_id INTEGER NOT NULL REFERENCES finished_piece (id),
    at TEXT NOT NULL,
    day TEXT NOT NULL,
    kind TEXT NOT NULL CHECK (kind IN ('made', 'sold', 'given', 'spoiled', 'count')),
    quantity INTEGER NOT NULL CHECK (quantity <> 0),
    value INTEGER NOT NULL,
    job_id INTEGER REFERENCES job (id),
    reason TEXT NOT NULL,
    actor_id INTEGER REFERENCES person (id),
    actor_name TEXT NOT NULL,
    CHECK (kind = 'count' OR (quantity > 0) = (kind = 'made')),
    CHECK (quantity * value >= 0)
  ) STRICT`,
  `CREATE INDEX finished_movement_piece ON finished_movement (finished_piece_id)`,
  `CREATE INDEX finished_movement_job ON finished_movement (job_id)`,
  ...appendOnly('finished_movement'),
  `ALTER TABLE purchase_line ADD COLUMN closed INTEGER NOT NULL DEFAULT 0 CHECK (closed IN (0, 1))`,
];

/** Finished pieces and seconds that stay in the shop, with a ledger of their own; and order lines of which nothing more comes. */
export class TheShelf extends Migration {
  override up(): void {
    for (const statement of tables) this.addSql(statement);
  }
}
