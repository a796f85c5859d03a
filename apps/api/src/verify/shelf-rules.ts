import { none, type Rule } from './rule.ts';

export const shelfRules: Rule[] = [
  none(
    'Finished pieces on the shelf, and what they cost, equal the sum of their ledger',
    `SELECT p.name || ' (' || f.sort || ') has ' || f.on_hand || ' at ' || f.value || ', its ledger sums to '
      || COALESCE(SUM(m.quantity), 0) || ' at ' || COALESCE(SUM(m.value), 0) AS fault
    FROM finished_piece f JOIN pattern p ON p.id = f.pattern_id
      LEFT JOIN finished_movement m ON m.finished_piece_id = f.id
    GROUP BY f.id
    HAVING COALESCE(SUM(m.quantity), 0) <> f.on_hand OR COALESCE(SUM(m.value), 0) <> f.value`,
  ),
  none(
    'No job put more on the shelf than it made',
    `SELECT j.number || ' made ' || (j.good + j.seconds) || ' and put ' || SUM(m.quantity) || ' on the shelf' AS fault
    FROM finished_movement m JOIN job j ON j.id = m.job_id
    GROUP BY j.id HAVING SUM(m.quantity) > j.good + j.seconds`,
  ),
];
