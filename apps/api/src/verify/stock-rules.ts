import { none, type Rule } from './rule.ts';

const item = `CASE WHEN b.lot_id IS NULL THEN (SELECT name FROM hardware WHERE id = b.hardware_id)
  ELSE (SELECT tag FROM lot WHERE id = b.lot_id) END`;

export const stockRules: Rule[] = [
  none(
    'What is on hand equals the sum of its movements',
    `SELECT ${item} || ' has ' || b.on_hand || ' on hand, its movements sum to ' || moved AS fault FROM (
      SELECT b.*, (SELECT COALESCE(SUM(quantity), 0) FROM stock_movement m
        WHERE m.lot_id IS b.lot_id AND m.hardware_id IS b.hardware_id) AS moved FROM stock_balance b) b
    WHERE moved <> b.on_hand`,
  ),
  none(
    'Everything that moved has a balance',
    `SELECT 'a movement of ' || day || ' has no balance' AS fault FROM stock_movement m
    WHERE NOT EXISTS (SELECT 1 FROM stock_balance b WHERE b.lot_id IS m.lot_id AND b.hardware_id IS m.hardware_id)`,
  ),
  none(
    'What is held equals what the jobs hold',
    `SELECT ${item} || ' has ' || b.reserved || ' held, its reservations sum to ' || held AS fault FROM (
      SELECT b.*, (SELECT COALESCE(SUM(open), 0) FROM reservation r
        WHERE r.lot_id IS b.lot_id AND r.hardware_id IS b.hardware_id) AS held FROM stock_balance b) b
    WHERE held <> b.reserved`,
  ),
  none(
    'What a reservation holds equals the sum of its rows',
    `SELECT 'reservation ' || r.id || ' holds ' || r.open || ', its rows sum to ' || moved AS fault FROM (
      SELECT r.*, (SELECT COALESCE(SUM(quantity), 0) FROM reservation_movement m
        WHERE m.reservation_id = r.id) AS moved FROM reservation r) r
    WHERE moved <> r.open`,
  ),
  none(
    'A finished job holds nothing',
    `SELECT j.number || ' is finished and still holds stock' AS fault FROM reservation r JOIN job j ON j.id = r.job_id
    WHERE j.state = 'finished' AND r.open > 0`,
  ),
  none(
    'A lot came in with the area that it was measured at, and at its cost',
    `SELECT l.tag || ' was measured at ' || l.measured_area_mm2 || ' and received as ' || COALESCE(m.quantity, 0) AS fault
    FROM lot l LEFT JOIN (SELECT lot_id, SUM(quantity) AS quantity, SUM(value) AS value FROM stock_movement
      WHERE kind = 'receive' OR from_lot_id IS NOT NULL GROUP BY lot_id) m ON m.lot_id = l.id
    WHERE m.quantity IS NOT l.measured_area_mm2 OR m.value IS NOT l.cost`,
  ),
  none(
    'An offcut came once, from the lot that it hangs on',
    `SELECT l.tag || ' hangs on lot ' || COALESCE(l.parent_id, 0) || ', its first row on ' || COALESCE(MIN(m.from_lot_id), 0) AS fault
    FROM lot l JOIN stock_movement m ON m.lot_id = l.id AND m.from_lot_id IS NOT NULL
    GROUP BY l.id HAVING MIN(m.from_lot_id) IS NOT l.parent_id OR COUNT(m.id) > 1`,
  ),
  none(
    'What came back from a service hangs on the lot that went out, and no other lot but an offcut hangs on one',
    `SELECT l.tag || ' hangs on lot ' || COALESCE(l.parent_id, 0) || ', out went lot ' || COALESCE(n.from_lot_id, 0) AS fault
    FROM lot l LEFT JOIN purchase_line n ON n.id = l.purchase_line_id
    WHERE NOT EXISTS (SELECT 1 FROM stock_movement m WHERE m.lot_id = l.id AND m.from_lot_id IS NOT NULL)
      AND l.parent_id IS NOT n.from_lot_id`,
  ),
  none(
    'No job brought back more of a lot than it took, whole or as offcuts',
    `SELECT l.tag || ' gave a job ' || -SUM(m.quantity) || ' in all' AS fault
    FROM stock_movement m JOIN lot l ON l.id = COALESCE(m.from_lot_id, m.lot_id)
    WHERE m.job_id IS NOT NULL GROUP BY m.job_id, l.id HAVING SUM(m.quantity) > 0`,
  ),
  none(
    'An approved count posted each of its differences, and no other sheet posted any',
    `SELECT c.title || ' line ' || l.id || ' differs by ' || COALESCE(l.counted - l.book, 0) || ', posted ' || COALESCE(m.quantity, 0) AS fault
    FROM count_line l JOIN stock_count c ON c.id = l.count_id LEFT JOIN stock_movement m ON m.id = l.movement_id
    WHERE COALESCE(m.quantity, 0) <> CASE c.state WHEN 'approved' THEN COALESCE(l.counted - l.book, 0) ELSE 0 END`,
  ),
  none(
    'A tool’s uses equal the sum of its ledger',
    `SELECT t.kind || ' ' || t.number || ' says ' || t.used || ' uses, its ledger ' || COALESCE(SUM(i.uses), 0) AS fault
    FROM tool t LEFT JOIN impression i ON i.tool_id = t.id GROUP BY t.id HAVING COALESCE(SUM(i.uses), 0) <> t.used`,
  ),
];
