import { none, type Rule } from './rule.ts';

const logged = (kind: string, table: string) =>
  none(
    `Every ${kind} stands in the log of who did what`,
    `SELECT 'a ${kind} has no row in the log' AS fault FROM ${table} t
    WHERE NOT EXISTS (SELECT 1 FROM activity WHERE subject_kind = '${kind}' AND subject_id = t.id)`,
  );

export const workRules: Rule[] = [
  none(
    'A step’s counts equal the sum of what was logged on it',
    `SELECT j.number || ', ' || s.name || ': its counts differ from its log' AS fault
    FROM job_step s JOIN job j ON j.id = s.job_id LEFT JOIN bench_log l ON l.job_step_id = s.id
    GROUP BY s.id
    HAVING COALESCE(SUM(l.good), 0) <> s.good OR COALESCE(SUM(l.rejects), 0) <> s.rejects
      OR COALESCE(SUM(l.seconds), 0) <> s.seconds OR COALESCE(SUM(l.minutes), 0) <> s.minutes`,
  ),
  none(
    'A job makes what its order asks for',
    `SELECT j.number || ' makes another quantity than ' || o.number AS fault
    FROM job j JOIN customer_order o ON o.id = j.order_id WHERE j.quantity <> o.quantity`,
  ),
  none(
    'A job’s planned minutes are those of its steps',
    `SELECT j.number || ' plans other minutes than its steps' AS fault FROM job j JOIN job_step s ON s.job_id = j.id
    GROUP BY j.id HAVING ABS(SUM(s.planned_minutes) - j.planned_minutes) > COUNT(s.id)`,
  ),
  none(
    'An order and its job agree on how far they are',
    `SELECT o.number || ' is ' || o.state || ' while ' || j.number || ' is ' || j.state AS fault
    FROM customer_order o JOIN job j ON j.order_id = o.id
    WHERE (j.state = 'finished') <> (o.state IN ('packed', 'part shipped', 'shipped', 'closed')) AND o.state <> 'cancelled'`,
  ),
  logged('quote', 'quote'),
  logged('order', 'customer_order'),
  logged('job', 'job'),
  logged('pattern', 'pattern'),
  logged('purchase order', 'purchase_order'),
];
