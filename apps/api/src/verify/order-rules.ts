import { none, type Rule } from './rule.ts';

export const orderRules: Rule[] = [
  none(
    'A cancelled order holds no stock',
    `SELECT o.number || ' is cancelled, and ' || j.number || ' still holds stock' AS fault
    FROM customer_order o JOIN job j ON j.order_id = o.id JOIN reservation r ON r.job_id = j.id
    WHERE o.state = 'cancelled' AND r.open > 0 GROUP BY o.id`,
  ),
  none(
    'A cancelled order has no open invoice',
    `SELECT o.number || ' is cancelled, and its invoice ' || COALESCE(i.number, 'draft') || ' is ' || i.state AS fault
    FROM customer_order o JOIN invoice i ON i.order_id = o.id
    WHERE o.state = 'cancelled' AND i.state <> 'credited'`,
  ),
  none(
    'An order is cancelled exactly where it is written why',
    `SELECT o.number || ' is ' || o.state || CASE WHEN c.id IS NULL THEN ' without' ELSE ' with' END
      || ' a reason to cancel it' AS fault
    FROM customer_order o LEFT JOIN order_cancellation c ON c.order_id = o.id
    WHERE (o.state = 'cancelled') <> (c.id IS NOT NULL)`,
  ),
  none(
    'Each move of a promised day begins where the one before ended, and the last ends on the day promised now',
    `SELECT o.number || ' was moved to ' || m.to_day || ', and then it was promised for ' || m.next AS fault
    FROM customer_order o JOIN (SELECT p.order_id, p.to_day, COALESCE(
        (SELECT n.from_day FROM promise_move n WHERE n.order_id = p.order_id AND n.id > p.id ORDER BY n.id LIMIT 1),
        (SELECT promised_on FROM customer_order WHERE id = p.order_id)) AS next FROM promise_move p) m
      ON m.order_id = o.id
    WHERE m.next <> m.to_day`,
  ),
];
