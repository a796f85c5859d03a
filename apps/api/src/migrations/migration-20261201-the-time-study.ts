import { Migration } from '@mikro-orm/migrations';
import { appendOnly } from './append-only.ts';

const tables = [
  `CREATE TABLE time_reading (
    id INTEGER PRIMARY KEY AUTOINCREMENT,
    pattern_id INTEGER NOT NULL REFERENCES pattern (id),
    step_name TEXT NOT NULL CHECK (length(step_name) BETWEEN 1 AND 60),
    seconds INTEGER NOT NULL CHECK (seconds > 0),
    at TEXT NOT NULL,
    person_id INTEGER REFERENCES person (id),
    person_name TEXT NOT NULL
  ) STRICT`,
  `CREATE INDEX time_reading_pattern ON time_reading (pattern_id)`,
  ...appendOnly('time_reading'),
];

/** How long a step took, reading by reading. */
export class TheTimeStudy extends Migration {
  override up(): void {
    for (const statement of tables) this.addSql(statement);
  }
}
