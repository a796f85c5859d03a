import { Migration } from '@mikro-orm/migrations';

const tables = [
  `CREATE TABLE press (
    id INTEGER PRIMARY KEY AUTOINCREMENT,
    name TEXT NOT NULL CHECK (length(name) BETWEEN 1 AND 60),
    bed_width_mm INTEGER NOT NULL CHECK (bed_width_mm > 0),
    bed_depth_mm INTEGER NOT NULL CHECK (bed_depth_mm > 0),
    throat_mm INTEGER CHECK (throat_mm > 0),
    shut_height_mm INTEGER CHECK (shut_height_mm > 0),
    rule_mm INTEGER CHECK (rule_mm > 0),
    relief_area_mm2 INTEGER CHECK (relief_area_mm2 > 0),
    active INTEGER NOT NULL DEFAULT 1 CHECK (active IN (0, 1)),
    version INTEGER NOT NULL DEFAULT 1 CHECK (version > 0)
  ) STRICT`,
  `ALTER TABLE tool ADD COLUMN pieces_per_strike INTEGER NOT NULL DEFAULT 1 CHECK (pieces_per_strike BETWEEN 1 AND 100)`,
  `ALTER TABLE tool ADD COLUMN rule_thickness_mm INTEGER CHECK (rule_thickness_mm >= 0)`,
  `ALTER TABLE tool ADD COLUMN border_mm INTEGER CHECK (border_mm >= 0)`,
  `ALTER TABLE tool ADD COLUMN relief_area_mm2 INTEGER CHECK (relief_area_mm2 >= 0)`,
];

/** Presses, and what of a die or plate meets them: pieces per strike, rule, border, relief. */
export class ThePresses extends Migration {
  override up(): void {
    for (const statement of tables) this.addSql(statement);
  }
}
