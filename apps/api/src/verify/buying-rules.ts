import { none, type Rule } from './rule.ts';

/** Thousandths of mm² at ten-thousandths per ft², in hundredths; in two parts, which keeps large areas within whole numbers. */
const ofLeather = (area: string) =>
  `CAST(${area} / 9290304000 * n.unit_price + (${area} % 9290304000 * n.unit_price + 4645152000) / 9290304000 AS INTEGER)`;

/** What the rows of one delivery on one line would have cost at the order's price, each to the cent. */
const atOrderedPrice = `CASE
  WHEN n.service IS NOT NULL THEN COALESCE(n.fixed_price, ${ofLeather('n.quantity')})
  WHEN n.leather_id IS NOT NULL THEN SUM(${ofLeather('COALESCE(l.marked_area_mm2, l.quantity)')})
  ELSE SUM(CAST((l.quantity * n.unit_price + 50) / 100 AS INTEGER)) END`;

export const buyingRules: Rule[] = [
  none(
    'An order line counts as received what came on it',
    `SELECT p.number || ' line ' || n.position || ' says ' || n.received || ' received, its deliveries ' ||
      COALESCE(SUM(COALESCE(l.marked_area_mm2, l.quantity)), 0) AS fault
    FROM purchase_line n JOIN purchase_order p ON p.id = n.purchase_order_id
    LEFT JOIN receipt_line l ON l.purchase_line_id = n.id
    GROUP BY n.id HAVING COALESCE(SUM(COALESCE(l.marked_area_mm2, l.quantity)), 0) <> n.received`,
  ),
  none(
    'An order counts its deliveries',
    `SELECT p.number || ' says ' || p.receipts || ' deliveries, and ' || COUNT(r.id) || ' are there' AS fault
    FROM purchase_order p LEFT JOIN receipt r ON r.purchase_order_id = p.id
    GROUP BY p.id HAVING COUNT(r.id) <> p.receipts`,
  ),
  none(
    'Freight and duty of a delivery are borne by its lines, to the cent',
    `SELECT 'the delivery of ' || r.received_on || ' cost ' || (r.freight + r.duty) || ' to bring, its lines bear ' ||
      COALESCE(SUM(l.carriage), 0) AS fault
    FROM receipt r LEFT JOIN receipt_line l ON l.receipt_id = r.id
    GROUP BY r.id HAVING COALESCE(SUM(l.carriage), 0) <> r.freight + r.duty`,
  ),
  none(
    'A delivery knows how much more it cost than at the prices of its order',
    `SELECT 'the delivery of ' || r.received_on || ' says ' || r.price_difference || ' more than ordered, its lines ' || more AS fault
    FROM (SELECT r.*, COALESCE((SELECT SUM(of_line.more) FROM (
        SELECT SUM(l.goods) - ${atOrderedPrice} AS more FROM receipt_line l JOIN purchase_line n ON n.id = l.purchase_line_id
        WHERE l.receipt_id = r.id GROUP BY n.id) of_line), 0) AS more FROM receipt r) r
    WHERE r.price_difference <> more`,
  ),
  none(
    'A delivery knows what is missing of the lots in it that are short of their mark',
    `SELECT 'the delivery of ' || r.received_on || ' says ' || r.missing_area_mm2 || ' missing, its lots ' || missing AS fault
    FROM (SELECT r.*, COALESCE((SELECT SUM(l.marked_area_mm2 - l.quantity) FROM receipt_line l WHERE l.receipt_id = r.id
        AND (l.marked_area_mm2 - l.quantity) * 1000000 > r.tolerance_percent * l.marked_area_mm2), 0) AS missing FROM receipt r) r
    WHERE r.missing_area_mm2 <> missing`,
  ),
  none(
    'What is not claimed is what is missing in a delivery for an order, and a price is let stand of such a delivery only',
    `SELECT 'an answer to the delivery of ' || r.received_on || ' is of another' AS fault
    FROM delivery_answer a JOIN receipt r ON r.id = a.receipt_id
    WHERE r.purchase_order_id IS NULL OR a.missing_area_mm2 <> r.missing_area_mm2`,
  ),
  none(
    'What came stands in the ledger with its quantity, at what goods and carriage cost and what leather had cost before a service',
    `SELECT 'line ' || l.position || ' of the delivery of ' || r.received_on || ' differs from the ledger' AS fault
    FROM receipt_line l JOIN receipt r ON r.id = l.receipt_id JOIN stock_movement m ON m.id = l.movement_id
    WHERE m.kind <> 'receive' OR m.quantity <> l.quantity OR m.value <> l.goods + l.carriage + l.material
      OR m.lot_id IS NOT l.lot_id OR m.hardware_id IS NOT l.hardware_id
      OR m.purchase_order_id IS NOT r.purchase_order_id`,
  ),
  none(
    'Leather is out on a sent line for a service until it is back, all of it and at what it went for',
    `SELECT p.number || ' line ' || n.position || ' has ' || COALESCE(-SUM(m.quantity), 0) || ' out at ' || COALESCE(-SUM(m.value), 0)
      || ', and should have ' || CASE WHEN n.received > 0 OR (n.closed = 0 AND p.state IN ('sent', 'part received'))
        THEN n.quantity ELSE 0 END AS fault
    FROM purchase_line n JOIN purchase_order p ON p.id = n.purchase_order_id
    LEFT JOIN stock_movement m ON m.purchase_line_id = n.id
    WHERE n.service IS NOT NULL GROUP BY n.id
    HAVING COALESCE(-SUM(m.quantity), 0) <> CASE WHEN n.received > 0 OR (n.closed = 0 AND p.state IN ('sent', 'part received'))
        THEN n.quantity ELSE 0 END
      OR (COALESCE(SUM(m.quantity), 0) = 0 AND COALESCE(SUM(m.value), 0) <> 0)
      OR SUM(m.lot_id <> n.from_lot_id OR m.purchase_order_id <> n.purchase_order_id) > 0`,
  ),
  none(
    'What came back from a service bears what the leather had cost that went out, to the cent',
    `SELECT p.number || ' line ' || n.position || ' went out at ' || cost || ', and came back with ' || material AS fault FROM (
      SELECT n.*, (SELECT COALESCE(-SUM(m.value), 0) FROM stock_movement m WHERE m.purchase_line_id = n.id) AS cost,
        (SELECT COALESCE(SUM(l.material), 0) FROM receipt_line l WHERE l.purchase_line_id = n.id) AS material
      FROM purchase_line n) n JOIN purchase_order p ON p.id = n.purchase_order_id
    WHERE material <> CASE WHEN n.service IS NOT NULL AND n.received > 0 THEN cost ELSE 0 END`,
  ),
  none(
    'A claim is of lots that came with its delivery and are short of their mark',
    `SELECT 'a claim on ' || p.number || ' misses ' || c.missing_area_mm2 || ', its lots ' ||
      COALESCE(SUM(l.marked_area_mm2 - l.quantity), 0) AS fault
    FROM supplier_claim c JOIN purchase_order p ON p.id = c.purchase_order_id
    LEFT JOIN claimed_lot k ON k.supplier_claim_id = c.id
    LEFT JOIN receipt_line l ON l.id = k.receipt_line_id AND l.receipt_id = c.receipt_id
    GROUP BY c.id HAVING COALESCE(SUM(l.marked_area_mm2 - l.quantity), 0) <> COALESCE(c.missing_area_mm2, 0)`,
  ),
  none(
    'A claim for what went back is of a return on its own order',
    `SELECT 'a claim on ' || p.number || ' is for row ' || m.id || ' of the ledger, which is no return on it' AS fault
    FROM supplier_claim c JOIN purchase_order p ON p.id = c.purchase_order_id JOIN stock_movement m ON m.id = c.movement_id
    WHERE m.kind <> 'reject' OR m.purchase_order_id IS NOT c.purchase_order_id`,
  ),
  none(
    'A claim was credited what was noted of it last',
    `SELECT 'a claim on ' || p.number || ' says ' || COALESCE(c.credited, 0) || ' credited, its last note ' || noted AS fault
    FROM (SELECT c.*, COALESCE((SELECT k.credited FROM claim_credit k WHERE k.supplier_claim_id = c.id ORDER BY k.id DESC LIMIT 1), 0)
      AS noted FROM supplier_claim c) c JOIN purchase_order p ON p.id = c.purchase_order_id
    WHERE COALESCE(c.credited, 0) <> noted`,
  ),
];
