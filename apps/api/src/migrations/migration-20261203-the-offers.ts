import { Migration } from '@mikro-orm/migrations';

const columns: [string, string[]][] = [
  [
    'hardware',
    [
      `unit TEXT NOT NULL DEFAULT 'piece' CHECK (length(unit) BETWEEN 1 AND 20)`,
      `metal TEXT NOT NULL DEFAULT ''`,
      `colour TEXT NOT NULL DEFAULT ''`,
      `bin TEXT NOT NULL DEFAULT ''`,
      `from_customer INTEGER NOT NULL DEFAULT 0 CHECK (from_customer IN (0, 1))`,
      `price_from_parts INTEGER NOT NULL DEFAULT 0 CHECK (price_from_parts IN (0, 1))`,
      `post_length_mm INTEGER CHECK (post_length_mm > 0)`,
      `stack_min_mm INTEGER CHECK (stack_min_mm >= 0)`,
      `stack_max_mm INTEGER CHECK (stack_max_mm > 0 AND stack_max_mm >= COALESCE(stack_min_mm, 0))`,
      `setting_die TEXT NOT NULL DEFAULT ''`,
      `setting_die_here INTEGER NOT NULL DEFAULT 1 CHECK (setting_die_here IN (0, 1))`,
    ],
  ],
  [
    'workshop',
    [`area_shown TEXT NOT NULL DEFAULT 'tenth' CHECK (area_shown IN ('tenth', 'quarter'))`],
  ],
];

const tables = [
  `CREATE TABLE supplier_offer (
    id INTEGER PRIMARY KEY AUTOINCREMENT,
    supplier_id INTEGER NOT NULL REFERENCES supplier (id),
    leather_id INTEGER REFERENCES leather (id),
    hardware_id INTEGER REFERENCES hardware (id),
    article_number TEXT NOT NULL,
    lead_days INTEGER CHECK (lead_days BETWEEN 0 AND 365),
    minimum INTEGER CHECK (minimum > 0),
    multiple INTEGER CHECK (multiple > 0),
    breaks TEXT NOT NULL CHECK (json_array_length(breaks) BETWEEN 1 AND 12),
    preferred INTEGER NOT NULL CHECK (preferred IN (0, 1)),
    version INTEGER NOT NULL DEFAULT 1 CHECK (version > 0),
    UNIQUE (supplier_id, leather_id),
    UNIQUE (supplier_id, hardware_id),
    CHECK ((leather_id IS NULL) <> (hardware_id IS NULL)),
    CHECK (multiple IS NULL OR minimum IS NULL OR minimum % multiple = 0)
  ) STRICT`,
  `CREATE UNIQUE INDEX supplier_offer_preferred_leather ON supplier_offer (leather_id) WHERE preferred = 1`,
  `CREATE UNIQUE INDEX supplier_offer_preferred_hardware ON supplier_offer (hardware_id) WHERE preferred = 1`,
  `CREATE INDEX supplier_offer_leather ON supplier_offer (leather_id)`,
  `CREATE INDEX supplier_offer_hardware ON supplier_offer (hardware_id)`,
  `CREATE TABLE kit_part (
    id INTEGER PRIMARY KEY AUTOINCREMENT,
    kit_id INTEGER NOT NULL REFERENCES hardware (id),
    hardware_id INTEGER NOT NULL REFERENCES hardware (id),
    quantity INTEGER NOT NULL CHECK (quantity BETWEEN 1 AND 1000),
    UNIQUE (kit_id, hardware_id),
    CHECK (kit_id <> hardware_id)
  ) STRICT`,
  `CREATE INDEX kit_part_hardware ON kit_part (hardware_id)`,
  `CREATE TABLE stand_in (
    id INTEGER PRIMARY KEY AUTOINCREMENT,
    hardware_id INTEGER NOT NULL REFERENCES hardware (id),
    by_hardware_id INTEGER NOT NULL REFERENCES hardware (id),
    UNIQUE (hardware_id, by_hardware_id),
    CHECK (hardware_id <> by_hardware_id)
  ) STRICT`,
];

/** Several suppliers for one thing with their prices, kits, what stands in for what, and what a post holds. */
export class TheOffers extends Migration {
  override up(): void {
    for (const [table, added] of columns) {
      for (const column of added) this.addSql(`ALTER TABLE ${table} ADD COLUMN ${column}`);
    }
    for (const statement of tables) this.addSql(statement);
  }
}
