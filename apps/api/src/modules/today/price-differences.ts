import type { ToDo } from '@hidewright/contract';
import { Decimal } from 'decimal.js';
import { moneyText } from '../../http/decimal-text.ts';
import type { Work } from '../../work.ts';
import { paidOf, readPaid } from '../purchase-orders/paid-for-lines.ts';
import { PurchaseLine } from '../purchase-orders/purchase-line.entity.ts';

interface Order {
  id: number;
  number: string;
  supplier: string;
  receivedOn: string;
}

/** A week is long enough to have seen a bill beside what was ordered. */
const lately = `SELECT p.id, p.number, s.name AS supplier, MAX(r.received_on) AS receivedOn
  FROM receipt r JOIN purchase_order p ON p.id = r.purchase_order_id JOIN supplier s ON s.id = p.supplier_id
  WHERE r.received_on > date(?, '-7 days') GROUP BY p.id ORDER BY receivedOn DESC, p.id DESC`;

/** Orders of the last seven days of which what came cost other than was ordered, the newest three. */
export async function priceDifferences({ em, today }: Work): Promise<ToDo[]> {
  const orders = await em.execute<Order[]>(lately, [today]);
  const lines = await em.find(PurchaseLine, { purchaseOrderId: orders.map(({ id }) => id) });
  const paid = await readPaid(em, lines);
  const differenceOf = ({ id }: Order) =>
    Decimal.sum(
      0,
      ...lines
        .filter((line) => line.purchaseOrderId === id)
        .map((line) => paidOf(paid, line).priceDifference),
    );
  return orders
    .map((order) => ({ order, difference: differenceOf(order) }))
    .filter(({ difference }) => !difference.isZero())
    .slice(0, 3)
    .map(({ order, difference }) => toDo(order, difference));
}

function toDo({ id, number, supplier, receivedOn }: Order, difference: Decimal): ToDo {
  const more = difference.isPositive() ? 'more' : 'less';
  return {
    kind: 'price',
    title: 'Not at its price',
    detail: `${number} from ${supplier} cost ${moneyText(difference.abs())} ${more} than ordered`,
    when: { word: 'received', day: receivedOn },
    late: false,
    action: 'Look',
    to: `/stockroom/purchase-orders/${id}`,
  };
}
