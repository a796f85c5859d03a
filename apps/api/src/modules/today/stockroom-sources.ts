import { unscaled } from '../../db/columns/scaled-decimal.ts';
import { moneyText } from '../../http/decimal-text.ts';
import { by, type Source } from './to-do-source.ts';

/** What is being counted, for whoever counts. */
export const openCounts: Source = {
  roles: ['maker'],
  sql: `SELECT c.id, SUM(l.again AND l.counted_at IS NULL) AS number, c.title, '' AS customer, NULL AS day,
      COUNT(l.counted_at) || ' of ' || COUNT(*) AS extra
    FROM stock_count c JOIN count_line l ON l.count_id = c.id
    WHERE c.state = 'open' GROUP BY c.id ORDER BY c.id LIMIT 3`,
  say: (row) => ({
    kind: 'count',
    title: 'Count',
    detail: `${row.title}: ${row.extra ?? ''} counted${againWords(Number(row.number))}`,
    when: null,
    late: false,
    action: 'Go on',
    to: `/stockroom/counts/${row.id}`,
  }),
};

const againWords = (lines: number) => (lines === 0 ? '' : `, ${lines} to count once more`);

/** Sheets that the maker handed in: one by its name, several as one ticket. */
export const handedInCounts: Source = {
  roles: ['owner'],
  sql: `SELECT MIN(id) AS id, '' AS number, MIN(title) AS title, '' AS customer, NULL AS day, COUNT(*) AS extra
    FROM stock_count WHERE state = 'handed in' HAVING COUNT(*) > 0`,
  say: (row) => ({
    kind: 'approve',
    title: 'Counted',
    detail: isOne(row.extra)
      ? `The count of ${row.title} waits to be approved`
      : `${row.extra ?? ''} counts wait to be approved`,
    when: null,
    late: false,
    action: 'Look',
    to: isOne(row.extra) ? `/stockroom/counts/${row.id}` : '/stockroom/counts',
  }),
};

/** Orders that nobody has sent: one by its number, several as one ticket. */
export const draftOrders: Source = {
  roles: ['owner'],
  sql: `SELECT MIN(p.id) AS id, MIN(p.number) AS number, MIN(s.name) AS title, MIN(s.name) AS customer,
      NULL AS day, COUNT(*) AS extra
    FROM purchase_order p JOIN supplier s ON s.id = p.supplier_id WHERE p.state = 'draft' HAVING COUNT(*) > 0`,
  say: (row) => ({
    kind: 'order',
    title: 'Order',
    detail: isOne(row.extra)
      ? `${row.number} to ${row.customer} waits to be sent`
      : `${row.extra ?? ''} orders wait to be sent`,
    when: null,
    late: false,
    action: isOne(row.extra) ? 'Look' : 'Look at them',
    to: isOne(row.extra)
      ? `/stockroom/purchase-orders/${row.id}`
      : '/stockroom/purchase-orders?state=draft',
  }),
};

/** What the owner said to a delivery holds for what was missing, or for the difference of price, when it was said. */
const unanswered = (answered: 'missing_area_mm2' | 'price_difference') => `NOT EXISTS
  (SELECT 1 FROM delivery_answer a WHERE a.receipt_id = r.id AND a.${answered} = r.${answered})`;

/**
 * Orders of which lots came short of their mark beyond the tolerance of their delivery, as `compareArea` judges it, until
 * each delivery is answered, or claimed and its claim credited or given up. A claim is of all that is short in a delivery.
 */
export const shortOfMark: Source = {
  roles: ['owner'],
  sql: `SELECT p.id, p.number, '' AS title, s.name AS customer, MIN(r.received_on) AS day,
      SUM(w.claimed = 0) || ' ' || SUM(w.claimed) AS extra
    FROM (SELECT r.id, 0 AS claimed FROM receipt r WHERE r.missing_area_mm2 > 0 AND ${unanswered('missing_area_mm2')}
        AND NOT EXISTS (SELECT 1 FROM supplier_claim c WHERE c.receipt_id = r.id)
      UNION ALL SELECT receipt_id, 1 FROM supplier_claim WHERE state = 'open' AND receipt_id IS NOT NULL) w
      JOIN receipt r ON r.id = w.id JOIN receipt_line l ON l.receipt_id = r.id
      JOIN purchase_order p ON p.id = r.purchase_order_id JOIN supplier s ON s.id = p.supplier_id
    WHERE (l.marked_area_mm2 - l.quantity) * 1000000 > r.tolerance_percent * l.marked_area_mm2
    GROUP BY p.id ORDER BY SUM(w.claimed = 0) = 0, day, p.id LIMIT 3`,
  say: (row) => {
    const [unclaimed = 0, claimed = 0] = (row.extra ?? '').split(' ').map(Number);
    return {
      kind: 'claim',
      title: unclaimed > 0 ? 'Short of its mark' : 'Claimed',
      detail: `${row.number} from ${row.customer}: ${claimWords(unclaimed, claimed)}`,
      when: by('received', row.day),
      late: false,
      action: unclaimed > 0 ? 'Claim' : 'Look',
      to: `/stockroom/purchase-orders/${row.id}`,
    };
  },
};

/** Orders of which something went back to its supplier, until it is credited or given up. */
export const sentBack: Source = {
  roles: ['owner'],
  sql: `SELECT p.id, p.number, '' AS title, s.name AS customer, MIN(m.day) AS day, NULL AS extra
    FROM supplier_claim c JOIN stock_movement m ON m.id = c.movement_id
      JOIN purchase_order p ON p.id = c.purchase_order_id JOIN supplier s ON s.id = p.supplier_id
    WHERE c.state = 'open' GROUP BY p.id ORDER BY day, p.id LIMIT 3`,
  say: (row) => ({
    kind: 'claim',
    title: 'Sent back',
    detail: `${row.number} from ${row.customer}: what went back awaits its credit`,
    when: by('sent back', row.day),
    late: false,
    action: 'Look',
    to: `/stockroom/purchase-orders/${row.id}`,
  }),
};

/** Orders of which what came cost other than was ordered, until the owner lets it stand. */
export const notAtItsPrice: Source = {
  roles: ['owner'],
  sql: `SELECT p.id, p.number, '' AS title, s.name AS customer, MIN(r.received_on) AS day,
      COUNT(*) || ' ' || SUM(r.price_difference) AS extra
    FROM receipt r JOIN purchase_order p ON p.id = r.purchase_order_id JOIN supplier s ON s.id = p.supplier_id
    WHERE r.price_difference <> 0 AND ${unanswered('price_difference')}
    GROUP BY p.id ORDER BY day, p.id LIMIT 3`,
  say: (row) => {
    const [deliveries = 0, difference = 0] = (row.extra ?? '').split(' ').map(Number);
    return {
      kind: 'price',
      title: 'Not at its price',
      detail:
        deliveries === 1
          ? `${row.number} from ${row.customer} cost ${differenceWords(difference)} than ordered`
          : `${deliveries} deliveries of ${row.number} from ${row.customer} did not cost what was ordered`,
      when: by('received', row.day),
      late: false,
      action: 'Look',
      to: `/stockroom/purchase-orders/${row.id}`,
    };
  },
};

const differenceWords = (hundredths: number) =>
  `${moneyText(unscaled(Math.abs(hundredths), 2))} ${hundredths > 0 ? 'more' : 'less'}`;

function claimWords(unclaimed: number, claimed: number): string {
  const lots = (count: number) => (count === 1 ? '1 lot' : `${count} lots`);
  if (unclaimed > 0) return `${lots(unclaimed)} can be claimed`;
  return `the claim for ${lots(claimed)} awaits its credit`;
}

const isOne = (count: string | null) => Number(count) === 1;
