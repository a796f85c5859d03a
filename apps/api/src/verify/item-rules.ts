import { none, type Rule } from './rule.ts';

export const itemRules: Rule[] = [
  none(
    'A kit has no stock of its own',
    `SELECT h.name || ' is a kit and has ' || b.on_hand || ' on hand, ' || b.reserved || ' held' AS fault
    FROM stock_balance b JOIN hardware h ON h.id = b.hardware_id
    WHERE (b.on_hand <> 0 OR b.reserved <> 0) AND EXISTS (SELECT 1 FROM kit_part k WHERE k.kit_id = h.id)`,
  ),
  none(
    'No part of a kit is a kit',
    `SELECT h.name || ' is a part of a kit and a kit itself' AS fault FROM kit_part k JOIN hardware h ON h.id = k.hardware_id
    WHERE EXISTS (SELECT 1 FROM kit_part deeper WHERE deeper.kit_id = k.hardware_id)`,
  ),
  none(
    'An offer asks no more each for more',
    `SELECT 'offer ' || o.id || ' line ' || (here.key + 1) || ' is out of order or dearer than the line above' AS fault
    FROM supplier_offer o, json_each(o.breaks) here, json_each(o.breaks) above
    WHERE above.key = here.key - 1
      AND (CAST(here.value ->> 'from' AS REAL) <= CAST(above.value ->> 'from' AS REAL)
        OR CAST(here.value ->> 'price' AS REAL) > CAST(above.value ->> 'price' AS REAL))`,
  ),
];
