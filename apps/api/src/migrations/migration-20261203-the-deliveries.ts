import { Migration } from '@mikro-orm/migrations';

const columns = [
  `ALTER TABLE workshop ADD COLUMN area_tolerance_percent INTEGER NOT NULL DEFAULT 30000
    CHECK (area_tolerance_percent BETWEEN 0 AND 1000000)`,
  `ALTER TABLE purchase_order ADD COLUMN receipts INTEGER NOT NULL DEFAULT 0 CHECK (receipts >= 0)`,
  `ALTER TABLE purchase_order ADD COLUMN paper_hash TEXT REFERENCES stored_file (hash)`,
  `ALTER TABLE purchase_line ADD COLUMN expected_on TEXT`,
];

const tables = [
  `CREATE TABLE receipt (
    id INTEGER PRIMARY KEY AUTOINCREMENT,
    purchase_order_id INTEGER REFERENCES purchase_order (id),
    received_on TEXT NOT NULL,
    at TEXT NOT NULL,
    freight INTEGER NOT NULL CHECK (freight >= 0),
    duty INTEGER NOT NULL CHECK (duty >= 0),
    shared_by TEXT NOT NULL CHECK (shared_by IN ('value', 'area', 'count')),
    tolerance_percent INTEGER NOT NULL CHECK (tolerance_percent BETWEEN 0 AND 1000000),
    actor_id INTEGER REFERENCES person (id),
    actor_name TEXT NOT NULL,
    version INTEGER NOT NULL DEFAULT 1 CHECK (version > 0)
  ) STRICT`,
  `CREATE INDEX receipt_purchase_order ON receipt (purchase_order_id)`,
  `CREATE TABLE receipt_line (
    id INTEGER PRIMARY KEY AUTOINCREMENT,
    receipt_id INTEGER NOT NULL REFERENCES receipt (id),
    position INTEGER NOT NULL CHECK (position > 0),
    purchase_line_id INTEGER REFERENCES purchase_line (id),
    lot_id INTEGER UNIQUE REFERENCES lot (id),
    hardware_id INTEGER REFERENCES hardware (id),
    quantity INTEGER NOT NULL CHECK (quantity > 0),
    marked_area_mm2 INTEGER CHECK (marked_area_mm2 > 0),
    batch TEXT NOT NULL,
    goods INTEGER NOT NULL CHECK (goods >= 0),
    carriage INTEGER NOT NULL CHECK (carriage >= 0),
    movement_id INTEGER NOT NULL UNIQUE REFERENCES stock_movement (id),
    UNIQUE (receipt_id, position),
    CHECK ((lot_id IS NULL) <> (hardware_id IS NULL)),
    CHECK (marked_area_mm2 IS NULL OR lot_id IS NOT NULL)
  ) STRICT`,
  `CREATE INDEX receipt_line_purchase_line ON receipt_line (purchase_line_id)`,
  `CREATE TABLE supplier_claim (
    id INTEGER PRIMARY KEY AUTOINCREMENT,
    purchase_order_id INTEGER NOT NULL REFERENCES purchase_order (id),
    receipt_id INTEGER NOT NULL REFERENCES receipt (id),
    state TEXT NOT NULL CHECK (state IN ('open', 'credited', 'given up')),
    missing_area_mm2 INTEGER NOT NULL CHECK (missing_area_mm2 > 0),
    worth INTEGER NOT NULL CHECK (worth >= 0),
    text TEXT NOT NULL,
    sent_by TEXT NOT NULL CHECK (sent_by IN ('mail', 'hand')),
    credited INTEGER CHECK (credited > 0),
    note TEXT NOT NULL,
    opened_at TEXT NOT NULL,
    closed_at TEXT,
    version INTEGER NOT NULL DEFAULT 1 CHECK (version > 0),
    CHECK ((state = 'credited') = (credited IS NOT NULL)),
    CHECK ((state = 'open') = (closed_at IS NULL))
  ) STRICT`,
  `CREATE INDEX supplier_claim_purchase_order ON supplier_claim (purchase_order_id)`,
  `CREATE TABLE claimed_lot (
    id INTEGER PRIMARY KEY AUTOINCREMENT,
    supplier_claim_id INTEGER NOT NULL REFERENCES supplier_claim (id),
    receipt_line_id INTEGER NOT NULL UNIQUE REFERENCES receipt_line (id)
  ) STRICT`,
];

/** What came on an order before receipts were kept: one receipt for each moment at which something came. */
const earlier = [
  `INSERT INTO receipt (purchase_order_id, received_on, at, freight, duty, shared_by, tolerance_percent, actor_id, actor_name)
    SELECT purchase_order_id, MIN(day), at, 0, 0, 'value', 30000, MIN(actor_id), MIN(actor_name)
    FROM stock_movement WHERE kind = 'receive' AND purchase_order_id IS NOT NULL
    GROUP BY purchase_order_id, at ORDER BY MIN(id)`,
  `INSERT INTO receipt_line (receipt_id, position, purchase_line_id, lot_id, hardware_id, quantity, marked_area_mm2,
      batch, goods, carriage, movement_id)
    SELECT r.id, ROW_NUMBER() OVER (PARTITION BY r.id ORDER BY m.id),
      COALESCE(lot.purchase_line_id, (SELECT MIN(n.id) FROM purchase_line n
        WHERE n.purchase_order_id = m.purchase_order_id AND n.hardware_id = m.hardware_id)),
      m.lot_id, m.hardware_id, m.quantity, NULL, '', m.value, 0, m.id
    FROM stock_movement m
    JOIN receipt r ON r.purchase_order_id = m.purchase_order_id AND r.at = m.at
    LEFT JOIN lot ON lot.id = m.lot_id
    WHERE m.kind = 'receive'`,
  `UPDATE purchase_order SET receipts = (SELECT COUNT(*) FROM receipt r WHERE r.purchase_order_id = purchase_order.id)`,
];

/** Deliveries as papers of their own, with their freight, their batches and what is claimed of them. */
export class TheDeliveries extends Migration {
  override up(): void {
    for (const statement of [...columns, ...tables, ...earlier]) this.addSql(statement);
  }
}
