import { Migration } from '@mikro-orm/migrations';

/** The lines of goods that some marked leather has come on. */
const marked = `service IS NULL AND id IN (SELECT purchase_line_id FROM receipt_line
  WHERE purchase_line_id IS NOT NULL AND marked_area_mm2 IS NOT NULL)`;

const open = `purchase_order_id IN (SELECT id FROM purchase_order WHERE state IN ('sent', 'part received'))`;

const lastCame = `(SELECT MAX(t.received_on) FROM receipt_line l JOIN receipt t ON t.id = l.receipt_id
  WHERE l.purchase_line_id = purchase_line.id)`;

/** Leather counts towards its order as it is paid for, which is as it is marked; before, it counted as measured. */
const statements = [
  `UPDATE purchase_line SET received = (SELECT SUM(COALESCE(l.marked_area_mm2, l.quantity)) FROM receipt_line l
    WHERE l.purchase_line_id = purchase_line.id) WHERE ${marked}`,
  // What an order that is over awaits no more stays so; of one that is open, a line is done or it is not.
  `UPDATE purchase_line SET awaited_until = CASE WHEN received >= quantity THEN COALESCE(awaited_until, ${lastCame}) END
    WHERE ${marked} AND closed = 0 AND ${open}`,
  `UPDATE purchase_order SET state = 'received', version = version + 1 WHERE state = 'part received'
    AND id IN (SELECT purchase_order_id FROM purchase_line WHERE ${marked})
    AND NOT EXISTS (SELECT 1 FROM purchase_line n
      WHERE n.purchase_order_id = purchase_order.id AND n.closed = 0 AND n.received < n.quantity)`,
];

export class TheMarks extends Migration {
  override up(): void {
    for (const statement of statements) this.addSql(statement);
  }
}
