import { Migration } from '@mikro-orm/migrations';

const kept = `id, number, kind, name, metal, cost, life_uses, used, slot, pattern_id, customer_id, state, version,
  pieces_per_strike, rule_thickness_mm, border_mm, relief_area_mm2`;

/**
 * SQLite changes no CHECK of a table that is there: the table is made anew under its name and filled again. The
 * ledger points at its rows meanwhile, so foreign keys are looked at when the transaction ends.
 */
const statements = [
  `PRAGMA defer_foreign_keys = ON`,
  `CREATE TABLE tool_before AS SELECT * FROM tool`,
  `DROP TABLE tool`,
  `CREATE TABLE tool (
    id INTEGER PRIMARY KEY AUTOINCREMENT,
    number TEXT NOT NULL,
    kind TEXT NOT NULL CHECK (kind IN ('cutting die', 'stamp plate')),
    name TEXT NOT NULL,
    metal TEXT NOT NULL CHECK (metal IN ('', 'steel', 'magnesium', 'copper', 'brass')),
    cost INTEGER NOT NULL CHECK (cost >= 0),
    life_uses INTEGER NOT NULL CHECK (life_uses > 0),
    used INTEGER NOT NULL CHECK (used >= 0),
    slot TEXT NOT NULL,
    pattern_id INTEGER REFERENCES pattern (id),
    customer_id INTEGER REFERENCES customer (id),
    owned_by TEXT NOT NULL DEFAULT 'shop' CHECK (owned_by IN ('shop', 'customer')),
    kept_until TEXT,
    state TEXT NOT NULL CHECK (state IN ('on the rack', 'on order', 'returned', 'scrapped')),
    pieces_per_strike INTEGER NOT NULL DEFAULT 1 CHECK (pieces_per_strike BETWEEN 1 AND 100),
    rule_thickness_mm INTEGER CHECK (rule_thickness_mm >= 0),
    border_mm INTEGER CHECK (border_mm >= 0),
    relief_area_mm2 INTEGER CHECK (relief_area_mm2 >= 0),
    version INTEGER NOT NULL DEFAULT 1 CHECK (version > 0),
    UNIQUE (kind, number),
    CHECK (owned_by = 'shop' OR customer_id IS NOT NULL),
    CHECK (kept_until IS NULL OR owned_by = 'customer'),
    CHECK (state <> 'returned' OR owned_by = 'customer')
  ) STRICT`,
  `INSERT INTO tool (${kept}) SELECT ${kept} FROM tool_before`,
  `DROP TABLE tool_before`,
  `CREATE TABLE plate_offer (
    id INTEGER PRIMARY KEY AUTOINCREMENT,
    metal TEXT NOT NULL UNIQUE CHECK (metal IN ('steel', 'magnesium', 'copper', 'brass')),
    price INTEGER NOT NULL CHECK (price > 0),
    life_uses INTEGER NOT NULL CHECK (life_uses > 0),
    version INTEGER NOT NULL DEFAULT 1 CHECK (version > 0)
  ) STRICT`,
];

/** Whose a tool is and how long it is kept, and what a new plate of each metal costs and lasts. */
export class TheTools extends Migration {
  override up(): void {
    for (const statement of statements) this.addSql(statement);
  }
}
