import { Migration } from '@mikro-orm/migrations';

const columns = [
  `outline TEXT CHECK (outline IS NULL OR json_valid(outline))`,
  `flaws TEXT NOT NULL DEFAULT '[]' CHECK (json_valid(flaws))`,
  `usable_percent INTEGER NOT NULL DEFAULT 850000 CHECK (usable_percent BETWEEN 10000 AND 1000000)`,
];

/** A lot's edge and flaws as drawn, and the share of it that can be used where nothing is drawn. */
export class TheSides extends Migration {
  override up(): void {
    for (const column of columns) this.addSql(`ALTER TABLE lot ADD COLUMN ${column}`);
  }
}
