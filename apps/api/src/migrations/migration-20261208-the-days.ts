import { Migration } from '@mikro-orm/migrations';
import { appendOnly } from './append-only.ts';

const lastDeed = `(SELECT substr(MAX(a.at), 1, 10) FROM activity a
  WHERE a.subject_kind = 'purchase order' AND a.subject_id = purchase_line.purchase_order_id)`;

const tables = [
  `CREATE TABLE reservation_movement (
    id INTEGER PRIMARY KEY AUTOINCREMENT,
    reservation_id INTEGER NOT NULL REFERENCES reservation (id),
    at TEXT NOT NULL,
    day TEXT NOT NULL,
    quantity INTEGER NOT NULL CHECK (quantity <> 0)
  ) STRICT`,
  `CREATE INDEX reservation_movement_reservation ON reservation_movement (reservation_id)`,
  ...appendOnly('reservation_movement'),
  `CREATE INDEX stock_movement_job ON stock_movement (job_id) WHERE job_id IS NOT NULL`,
  `ALTER TABLE purchase_line ADD COLUMN awaited_until TEXT`,
];

/**
 * Of what was held before nobody wrote down when: it counts as held since the order was taken on, and as let go of
 * when the job last took of it, or else when the job was finished.
 */
const earlier = [
  `INSERT INTO reservation_movement (reservation_id, at, day, quantity)
    SELECT r.id, o.taken_on_at, substr(o.taken_on_at, 1, 10), r.quantity
    FROM reservation r JOIN job j ON j.id = r.job_id JOIN customer_order o ON o.id = j.order_id ORDER BY r.id`,
  `INSERT INTO reservation_movement (reservation_id, at, day, quantity)
    SELECT id, gone, substr(gone, 1, 10), open - quantity FROM (
      SELECT r.id, r.open, r.quantity, COALESCE(
        (SELECT MAX(m.at) FROM stock_movement m WHERE m.job_id = r.job_id AND m.kind = 'take'
          AND m.lot_id IS r.lot_id AND m.hardware_id IS r.hardware_id),
        j.finished_at, o.taken_on_at) AS gone
      FROM reservation r JOIN job j ON j.id = r.job_id JOIN customer_order o ON o.id = j.order_id
      WHERE r.open < r.quantity) ORDER BY id`,
  // Nor when nothing more of a line was awaited: at the latest when something was last done about its order.
  `UPDATE purchase_line SET awaited_until = COALESCE(
      (SELECT MAX(t.received_on) FROM receipt_line l JOIN receipt t ON t.id = l.receipt_id
        WHERE l.purchase_line_id = purchase_line.id AND purchase_line.received >= purchase_line.quantity),
      ${lastDeed}, substr((SELECT o.created_at FROM purchase_order o WHERE o.id = purchase_line.purchase_order_id), 1, 10))
    WHERE closed = 1 OR received >= quantity OR EXISTS (SELECT 1 FROM purchase_order o
      WHERE o.id = purchase_line.purchase_order_id AND o.state IN ('received', 'cancelled'))`,
];

/** Since when something was held, and until when it was awaited: so that what was free can be told of any day. */
export class TheDays extends Migration {
  override up(): void {
    for (const statement of [...tables, ...earlier]) this.addSql(statement);
  }
}
