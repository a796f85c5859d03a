import { Migration } from '@mikro-orm/migrations';
import { appendOnly } from './append-only.ts';

const noted = `(SELECT a.actor_name FROM activity a WHERE a.subject_kind = 'supplier claim' AND a.subject_id = c.id
  ORDER BY a.seq DESC LIMIT 1)`;

const credits = [
  `CREATE TABLE claim_credit (
    id INTEGER PRIMARY KEY AUTOINCREMENT,
    supplier_claim_id INTEGER NOT NULL REFERENCES supplier_claim (id),
    credited INTEGER NOT NULL CHECK (credited >= 0),
    reason TEXT NOT NULL,
    at TEXT NOT NULL,
    actor_id INTEGER REFERENCES person (id),
    actor_name TEXT NOT NULL
  ) STRICT`,
  `CREATE INDEX claim_credit_supplier_claim ON claim_credit (supplier_claim_id)`,
  // Before, a credit was noted once and for good.
  `INSERT INTO claim_credit (supplier_claim_id, credited, reason, at, actor_name)
    SELECT c.id, c.credited, '', c.closed_at, COALESCE(${noted}, '') FROM supplier_claim c WHERE c.state = 'credited'`,
  ...appendOnly('claim_credit'),
];

/** What suppliers credited, each note of it a row, so that one written wrongly can be put right. */
export class TheCredits extends Migration {
  override up(): void {
    for (const statement of credits) this.addSql(statement);
  }
}
