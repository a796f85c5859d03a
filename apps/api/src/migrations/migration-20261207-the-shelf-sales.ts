import { Migration } from '@mikro-orm/migrations';
import { appendOnly } from './append-only.ts';

const invoiceKept = `id, number, sequence, order_id, customer_id, state, issued_on, due_on, net, tax, total, paid, credited,
  snapshot, snapshot_hash, created_at, version`;

/**
 * What is sold from the shelf has no order. SQLite takes no NOT NULL off a column: the table is made anew under its
 * name and filled again, and goes on counting where it was, so that no discarded draft's id comes twice.
 */
const invoices = [
  `PRAGMA defer_foreign_keys = ON`,
  `CREATE TABLE invoice_before AS SELECT * FROM invoice`,
  `CREATE TABLE invoice_ids_before AS SELECT seq FROM sqlite_sequence WHERE name = 'invoice'`,
  `DROP TABLE invoice`,
  `CREATE TABLE invoice (
    id INTEGER PRIMARY KEY AUTOINCREMENT,
    number TEXT UNIQUE,
    sequence INTEGER UNIQUE CHECK (sequence > 0),
    order_id INTEGER REFERENCES customer_order (id),
    customer_id INTEGER NOT NULL REFERENCES customer (id),
    state TEXT NOT NULL CHECK (state IN ('draft', 'issued', 'part paid', 'paid', 'credited')),
    issued_on TEXT,
    due_on TEXT,
    net INTEGER NOT NULL CHECK (net >= 0),
    tax INTEGER NOT NULL CHECK (tax >= 0),
    total INTEGER NOT NULL CHECK (total = net + tax),
    paid INTEGER NOT NULL CHECK (paid >= 0),
    credited INTEGER NOT NULL CHECK (credited >= 0),
    snapshot TEXT,
    snapshot_hash TEXT,
    created_at TEXT NOT NULL,
    version INTEGER NOT NULL DEFAULT 1 CHECK (version > 0),
    CHECK (paid + credited <= total),
    CHECK ((state = 'draft') = (number IS NULL)),
    CHECK ((number IS NULL) = (sequence IS NULL))
  ) STRICT`,
  `INSERT INTO invoice (${invoiceKept}) SELECT ${invoiceKept} FROM invoice_before`,
  `DELETE FROM sqlite_sequence WHERE name = 'invoice'`,
  `INSERT INTO sqlite_sequence (name, seq) SELECT 'invoice', seq FROM invoice_ids_before`,
  `DROP TABLE invoice_before`,
  `DROP TABLE invoice_ids_before`,
  `CREATE TRIGGER issued_invoice_stays BEFORE UPDATE ON invoice
    WHEN OLD.number IS NOT NULL AND (
      NEW.number IS NOT OLD.number OR NEW.sequence IS NOT OLD.sequence OR NEW.order_id IS NOT OLD.order_id
      OR NEW.customer_id IS NOT OLD.customer_id OR NEW.issued_on IS NOT OLD.issued_on OR NEW.due_on IS NOT OLD.due_on
      OR NEW.net IS NOT OLD.net OR NEW.tax IS NOT OLD.tax OR NEW.total IS NOT OLD.total
      OR NEW.snapshot IS NOT OLD.snapshot OR NEW.snapshot_hash IS NOT OLD.snapshot_hash)
    BEGIN SELECT RAISE(ABORT, 'an issued invoice does not change'); END`,
  `CREATE TRIGGER issued_invoice_is_kept BEFORE DELETE ON invoice WHEN OLD.number IS NOT NULL
    BEGIN SELECT RAISE(ABORT, 'an issued invoice is not deleted'); END`,
];

/** A sale outlives the draft that it was on, so that the ledger can name it: it loses its line when it is undone. */
const sales = [
  `CREATE TABLE shelf_sale (
    id INTEGER PRIMARY KEY AUTOINCREMENT,
    finished_piece_id INTEGER NOT NULL REFERENCES finished_piece (id),
    invoice_line_id INTEGER UNIQUE REFERENCES invoice_line (id),
    undone_at TEXT,
    CHECK ((invoice_line_id IS NULL) = (undone_at IS NOT NULL))
  ) STRICT`,
  `CREATE TRIGGER shelf_sale_is_only_undone BEFORE UPDATE ON shelf_sale
    WHEN NEW.undone_at IS NULL OR OLD.undone_at IS NOT NULL OR NEW.finished_piece_id IS NOT OLD.finished_piece_id
      OR (SELECT invoice.number FROM invoice_line JOIN invoice ON invoice.id = invoice_line.invoice_id
        WHERE invoice_line.id = OLD.invoice_line_id) IS NOT NULL
    BEGIN SELECT RAISE(ABORT, 'a sale from the shelf does not change'); END`,
  `CREATE TRIGGER shelf_sale_is_kept BEFORE DELETE ON shelf_sale
    BEGIN SELECT RAISE(ABORT, 'a sale from the shelf is not deleted'); END`,
];

const movementKept = `id, finished_piece_id, at, day, kind, quantity, value, job_id, reason, actor_id, actor_name`;

const movements = [
  `CREATE TABLE finished_movement_before AS SELECT * FROM finished_movement`,
  `DROP TABLE finished_movement`,
  `CREATE TABLE finished_movement (
    id INTEGER PRIMARY KEY AUTOINCREMENT,
    finished_piece_id INTEGER NOT NULL REFERENCES finished_piece (id),
    at TEXT NOT NULL,
    day TEXT NOT NULL,
    kind TEXT NOT NULL CHECK (kind IN ('made', 'sold', 'given', 'spoiled', 'count', 'put back')),
    quantity INTEGER NOT NULL CHECK (quantity <> 0),
    value INTEGER NOT NULL,
    job_id INTEGER REFERENCES job (id),
    shelf_sale_id INTEGER REFERENCES shelf_sale (id),
    reason TEXT NOT NULL,
    actor_id INTEGER REFERENCES person (id),
    actor_name TEXT NOT NULL,
    CHECK (kind = 'count' OR (quantity > 0) = (kind IN ('made', 'put back'))),
    CHECK (shelf_sale_id IS NULL OR kind IN ('sold', 'put back')),
    CHECK (kind <> 'put back' OR shelf_sale_id IS NOT NULL),
    CHECK (quantity * value >= 0),
    UNIQUE (shelf_sale_id, kind)
  ) STRICT`,
  `INSERT INTO finished_movement (${movementKept}) SELECT ${movementKept} FROM finished_movement_before`,
  `DROP TABLE finished_movement_before`,
  `CREATE INDEX finished_movement_piece ON finished_movement (finished_piece_id)`,
  `CREATE INDEX finished_movement_job ON finished_movement (job_id)`,
  ...appendOnly('finished_movement'),
];

/** Pieces that are sold from the shelf with an invoice: invoices without an order, and what the ledger says of them. */
export class TheShelfSales extends Migration {
  override up(): void {
    for (const statement of [...invoices, ...sales, ...movements]) this.addSql(statement);
  }
}
