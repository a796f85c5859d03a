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
  none(
    'What an invoice sells from the shelf left it, and what was undone lies there again',
    `SELECT 'sale ' || id || ' of ' || name || ' says ' || says || ', its ledger sums to ' || moved || ' at ' || value AS fault
    FROM (SELECT s.id, p.name, COALESCE(l.quantity, 0) AS says, COALESCE(SUM(m.quantity), 0) AS moved,
        COALESCE(SUM(m.value), 0) AS value
      FROM shelf_sale s JOIN finished_piece f ON f.id = s.finished_piece_id JOIN pattern p ON p.id = f.pattern_id
        LEFT JOIN invoice_line l ON l.id = s.invoice_line_id
        LEFT JOIN finished_movement m ON m.shelf_sale_id = s.id AND m.finished_piece_id = f.id
      GROUP BY s.id)
    WHERE moved <> -says OR (says = 0 AND value <> 0)`,
  ),
  none(
    'Every line of an invoice without an order sells from the shelf, and no other does; marked pieces go to their customer',
    `SELECT COALESCE(i.number, 'a draft invoice') || ' has a wrong line ' || l.position AS fault
    FROM invoice_line l JOIN invoice i ON i.id = l.invoice_id LEFT JOIN shelf_sale s ON s.invoice_line_id = l.id
      LEFT JOIN finished_piece f ON f.id = s.finished_piece_id
    WHERE (i.order_id IS NULL) <> (s.id IS NOT NULL) OR COALESCE(f.customer_id, i.customer_id) <> i.customer_id`,
  ),
];
