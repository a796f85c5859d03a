import type { EntityManager } from '@mikro-orm/sqlite';
import { Decimal } from 'decimal.js';
import { scaled } from '../../db/columns/scaled-decimal.ts';
import { moneyText } from '../../http/decimal-text.ts';
import { ReceiptLine } from '../receipts/receipt-line.entity.ts';
import { lineAmount } from './line-amount.ts';
import { PurchaseLine } from './purchase-line.entity.ts';

/** What came on each line of an order, by the line's id. */
export type Paid = Map<number, ReceiptLine[]>;

export async function readPaid(em: EntityManager, lines: PurchaseLine[]): Promise<Paid> {
  const came = await em.find(ReceiptLine, { purchaseLineId: lines.map(({ id }) => id) });
  const paid: Paid = new Map(lines.map(({ id }) => [id, []]));
  for (const row of came) paid.get(row.purchaseLineId ?? 0)?.push(row);
  return paid;
}

/** What was paid for what came on a line, and how much more that is than at the order's price. */
export function paidOf(paid: Paid, line: PurchaseLine): { paid: string; priceDifference: string } {
  const came = paid.get(line.id) ?? [];
  const difference = goodsOf(came).minus(atOrderedPrice(came, line));
  return { paid: moneyText(goodsOf(came)), priceDifference: moneyText(difference) };
}

type Came = Pick<ReceiptLine, 'purchaseLineId' | 'quantity' | 'markedAreaMm2' | 'goods'>;

/** How much more a delivery cost than at its order's prices; what came beyond the order has none. */
export async function priceDifferenceOf(em: EntityManager, came: Came[]): Promise<Decimal> {
  const ids = [...new Set(came.flatMap(({ purchaseLineId }) => purchaseLineId ?? []))];
  const lines = await em.find(PurchaseLine, { id: ids });
  const differences = lines.map((line) => {
    const onIt = came.filter(({ purchaseLineId }) => purchaseLineId === line.id);
    return goodsOf(onIt).minus(atOrderedPrice(onIt, line));
  });
  return Decimal.sum(0, ...differences);
}

const goodsOf = (came: Came[]) => Decimal.sum(0, ...came.map(({ goods }) => goods));

/** Thousandths of mm² that were measured of what came, where its marks say otherwise; else null. */
export function measuredOf(paid: Paid, { id, received, service }: PurchaseLine): number | null {
  const came = paid.get(id) ?? [];
  if (service !== null || came.every(({ markedAreaMm2 }) => markedAreaMm2 === null)) return null;
  const measured = came.reduce((sum, { quantity }) => sum + quantity, 0);
  return measured === received ? null : measured;
}

/**
 * What that would have cost at the order's price. Leather is priced by the area marked on it, where one is; each row
 * rounds to the cent by itself, as it was received. A service has its price however much of it comes back, and comes
 * back at once.
 */
function atOrderedPrice(came: Came[], line: PurchaseLine): Decimal {
  if (line.service !== null) return came.length === 0 ? new Decimal(0) : lineAmount(line);
  const { leatherId, unitPrice } = line;
  const amounts = came.map(({ markedAreaMm2, quantity }) =>
    lineAmount({
      leatherId,
      quantity: markedAreaMm2 === null ? quantity : scaled(markedAreaMm2, 3),
      unitPrice,
    }),
  );
  return Decimal.sum(0, ...amounts);
}
