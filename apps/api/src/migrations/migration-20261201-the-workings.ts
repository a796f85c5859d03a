import { Migration } from '@mikro-orm/migrations';

const columns: [string, string[]][] = [
  [
    'workshop',
    [
      `minimum_wage_per_hour INTEGER NOT NULL DEFAULT 0 CHECK (minimum_wage_per_hour >= 0)`,
      `rest_percent INTEGER NOT NULL DEFAULT 0 CHECK (rest_percent BETWEEN 0 AND 1000000)`,
      `overhead_per_hour INTEGER NOT NULL DEFAULT 0 CHECK (overhead_per_hour >= 0)`,
      `packing_per_piece INTEGER NOT NULL DEFAULT 0 CHECK (packing_per_piece >= 0)`,
      `card_fee_percent INTEGER NOT NULL DEFAULT 0 CHECK (card_fee_percent BETWEEN 0 AND 500000)`,
      `card_fee_each INTEGER NOT NULL DEFAULT 0 CHECK (card_fee_each >= 0)`,
      `set_up_charge INTEGER NOT NULL DEFAULT 0 CHECK (set_up_charge >= 0)`,
      `minimum_order INTEGER NOT NULL DEFAULT 0 CHECK (minimum_order >= 0)`,
      `price_rule TEXT NOT NULL DEFAULT '{"kind":"target"}' CHECK (json_valid(price_rule))`,
    ],
  ],
  [
    'leather',
    [
      `whole_form TEXT CHECK (length(whole_form) BETWEEN 1 AND 20)`,
      `whole_area_mm2 INTEGER CHECK (whole_area_mm2 > 0)`,
      `whole_usable_percent INTEGER NOT NULL DEFAULT 850000 CHECK (whole_usable_percent BETWEEN 10000 AND 1000000)`,
    ],
  ],
  [
    'quote',
    [
      `terms TEXT NOT NULL DEFAULT '{}' CHECK (json_valid(terms))`,
      `agreed_option TEXT CHECK (length(agreed_option) BETWEEN 1 AND 60)`,
    ],
  ],
];

const kept = `id, number, quote_id, customer_id, title, quantity, price_each, goods_total, tooling_charge, total, state,
  awaits, in_hands_on, promised_on, taken_on_at, shipped_on, version`;

/** An order's total is checked against its parts, and SQLite changes no CHECK of a table that is there. */
const orders = [
  `PRAGMA defer_foreign_keys = ON`,
  `CREATE TABLE customer_order_before AS SELECT * FROM customer_order`,
  `DROP TABLE customer_order`,
  `CREATE TABLE customer_order (
    id INTEGER PRIMARY KEY AUTOINCREMENT,
    number TEXT NOT NULL UNIQUE,
    quote_id INTEGER NOT NULL UNIQUE REFERENCES quote (id),
    customer_id INTEGER NOT NULL REFERENCES customer (id),
    title TEXT NOT NULL,
    option_name TEXT CHECK (length(option_name) BETWEEN 1 AND 60),
    quantity INTEGER NOT NULL CHECK (quantity > 0),
    price_each INTEGER NOT NULL CHECK (price_each >= 0),
    goods_total INTEGER NOT NULL CHECK (goods_total >= 0),
    tooling_charge INTEGER NOT NULL CHECK (tooling_charge >= 0),
    charges TEXT NOT NULL DEFAULT '[]' CHECK (json_valid(charges)),
    charges_total INTEGER NOT NULL DEFAULT 0 CHECK (charges_total >= 0),
    total INTEGER NOT NULL CHECK (total = goods_total + tooling_charge + charges_total),
    state TEXT NOT NULL CHECK (state IN ('awaiting proof', 'awaiting deposit', 'awaiting tooling', 'taken on',
      'in work', 'packed', 'part shipped', 'shipped', 'closed', 'cancelled')),
    awaits TEXT NOT NULL CHECK (json_valid(awaits)),
    in_hands_on TEXT,
    promised_on TEXT NOT NULL,
    taken_on_at TEXT NOT NULL,
    shipped_on TEXT,
    version INTEGER NOT NULL DEFAULT 1 CHECK (version > 0)
  ) STRICT`,
  `INSERT INTO customer_order (${kept}) SELECT ${kept} FROM customer_order_before`,
  `DROP TABLE customer_order_before`,
  `CREATE INDEX order_customer ON customer_order (customer_id)`,
];

/** What a run's numbers rest on beside leather, hardware and minutes: the shop's own rates, terms and options. */
export class TheWorkings extends Migration {
  override up(): void {
    for (const [table, added] of columns) {
      for (const column of added) this.addSql(`ALTER TABLE ${table} ADD COLUMN ${column}`);
    }
    for (const statement of orders) this.addSql(statement);
  }
}
