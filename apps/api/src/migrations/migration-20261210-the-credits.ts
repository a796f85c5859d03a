import { Migration } from '@mikro-orm/migrations';
import { appendOnly } from './append-only.ts';

const kept = `id, purchase_order_id, receipt_id, state, missing_area_mm2, worth, text, sent_by, credited, note, opened_at,
  closed_at, version`;

/**
 * What went back is owed for as what is short is: a claim is of the one or the other. SQLite lets no column be empty
 * that was not, so the table is made anew under its name and filled again. Claimed lots point at its rows meanwhile, so
 * foreign keys are looked at when the transaction ends. What went back before opens nothing: whether it was credited
 * is written nowhere.
 */
const claims = [
  `PRAGMA defer_foreign_keys = ON`,
  `CREATE TABLE supplier_claim_before AS SELECT * FROM supplier_claim`,
  `DROP TABLE supplier_claim`,
  `CREATE TABLE supplier_claim (
    id INTEGER PRIMARY KEY AUTOINCREMENT,
    purchase_order_id INTEGER NOT NULL REFERENCES purchase_order (id),
    receipt_id INTEGER REFERENCES receipt (id),
    missing_area_mm2 INTEGER CHECK (missing_area_mm2 > 0),
    movement_id INTEGER UNIQUE REFERENCES stock_movement (id),
    state TEXT NOT NULL CHECK (state IN ('open', 'credited', 'given up')),
    worth INTEGER NOT NULL CHECK (worth >= 0),
    text TEXT NOT NULL,
    sent_by TEXT NOT NULL CHECK (sent_by IN ('mail', 'hand')),
    credited INTEGER CHECK (credited > 0),
    note TEXT NOT NULL,
    opened_at TEXT NOT NULL,
    closed_at TEXT,
    version INTEGER NOT NULL DEFAULT 1 CHECK (version > 0),
    CHECK ((receipt_id IS NULL) = (missing_area_mm2 IS NULL)),
    CHECK ((receipt_id IS NULL) <> (movement_id IS NULL)),
    CHECK ((state = 'credited') = (credited IS NOT NULL)),
    CHECK ((state = 'open') = (closed_at IS NULL))
  ) STRICT`,
  `INSERT INTO supplier_claim (${kept}) SELECT ${kept} FROM supplier_claim_before`,
  `DROP TABLE supplier_claim_before`,
  `CREATE INDEX supplier_claim_purchase_order ON supplier_claim (purchase_order_id)`,
  `CREATE INDEX stock_movement_purchase_order ON stock_movement (purchase_order_id) WHERE purchase_order_id IS NOT NULL`,
];

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

/** What suppliers owe for what went back, and what they credited: each note of it a row, so that one written wrongly can be put right. */
export class TheCredits extends Migration {
  override up(): void {
    for (const statement of [...claims, ...credits]) this.addSql(statement);
  }
}
