import { Migration } from '@mikro-orm/migrations';

/** What one customer's runs of a pattern say, in place of what the pattern says; and what an hour is paid. */
export class TheDesigns extends Migration {
  override up(): void {
    this.addSql(`CREATE TABLE design (
      id INTEGER PRIMARY KEY AUTOINCREMENT,
      customer_id INTEGER NOT NULL REFERENCES customer (id),
      pattern_id INTEGER NOT NULL REFERENCES pattern (id),
      estimate TEXT NOT NULL CHECK (json_valid(estimate)),
      learned_on TEXT NOT NULL,
      runs INTEGER NOT NULL CHECK (runs > 0),
      UNIQUE (customer_id, pattern_id)
    ) STRICT`);
    this.addSql(`ALTER TABLE person ADD COLUMN wage_per_hour INTEGER CHECK (wage_per_hour >= 0)`);
    this.addSql(
      `ALTER TABLE bench_log ADD COLUMN wage_per_hour INTEGER CHECK (wage_per_hour >= 0)`,
    );
  }
}
