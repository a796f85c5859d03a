import { Migration } from '@mikro-orm/migrations';
import { appendOnly } from './append-only.ts';

const tables = [
  `CREATE TABLE order_cancellation (
    id INTEGER PRIMARY KEY AUTOINCREMENT,
    order_id INTEGER NOT NULL UNIQUE REFERENCES customer_order (id),
    at TEXT NOT NULL,
    why TEXT NOT NULL CHECK (length(why) > 0),
    actor_id INTEGER REFERENCES person (id),
    actor_name TEXT NOT NULL
  ) STRICT`,
  ...appendOnly('order_cancellation'),
  `CREATE TABLE promise_move (
    id INTEGER PRIMARY KEY AUTOINCREMENT,
    order_id INTEGER NOT NULL REFERENCES customer_order (id),
    from_day TEXT NOT NULL,
    to_day TEXT NOT NULL,
    at TEXT NOT NULL,
    why TEXT NOT NULL CHECK (length(why) > 0),
    actor_id INTEGER REFERENCES person (id),
    actor_name TEXT NOT NULL,
    CHECK (from_day <> to_day)
  ) STRICT`,
  `CREATE INDEX promise_move_order ON promise_move (order_id)`,
  ...appendOnly('promise_move'),
];

/** Why an order was cancelled, and how its promised day was moved: written once, and never changed. */
export class TheChangedOrders extends Migration {
  override up(): void {
    for (const statement of tables) this.addSql(statement);
  }
}
