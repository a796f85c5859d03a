import type { EntityManager } from '@mikro-orm/sqlite';
import { Decimal } from 'decimal.js';
import { scaled } from '../../db/columns/scaled-decimal.ts';
import { moneyText } from '../../http/decimal-text.ts';
import { ReceiptLine } from '../receipts/receipt-line.entity.ts';
import { lineAmount } from './line-amount.ts';
import type { PurchaseLine } from './purchase-line.entity.ts';

/** What came on each line of an order, by the line's id. */
export type Paid = Map<number, ReceiptLine[]>;

export async function readPaid(em: EntityManager, lines: PurchaseLine[]): Promise<Paid> {
  const came = await em.find(ReceiptLine, { purchaseLineId: lines.map(({ id }) => id) });
  const paid: Paid = new Map(lines.map(({ id }) => [id, []]));
  for (const row of came) paid.get(row.purchaseLineId ?? 0)?.push(row);
  return paid;
}

/**
 * What was paid for what came on a line, and how much more that is than at the order's price. Leather is priced by
 * the area marked on it, where one is; each delivery rounds to the cent by itself, as it was received. A service has its price
 * however much of it comes back.
 */
export function paidOf(paid: Paid, line: PurchaseLine): { paid: string; priceDifference: string } {
  const came = paid.get(line.id) ?? [];
  const sum = (amounts: Decimal[]) => Decimal.sum(0, ...amounts);
  const goods = sum(came.map((row) => row.goods));
  const asOrdered =
    line.service === null
      ? sum(came.map((row) => atOrderedPrice(row, line)))
      : sum(came.length === 0 ? [] : [lineAmount(line)]);
  return { paid: moneyText(goods), priceDifference: moneyText(goods.minus(asOrdered)) };
}

/** Thousandths of mm² that were measured of what came, where its marks say otherwise; else null. */
export function measuredOf(paid: Paid, { id, received, service }: PurchaseLine): number | null {
  const came = paid.get(id) ?? [];
  if (service !== null || came.every(({ markedAreaMm2 }) => markedAreaMm2 === null)) return null;
  const measured = came.reduce((sum, { quantity }) => sum + quantity, 0);
  return measured === received ? null : measured;
}

function atOrderedPrice(row: ReceiptLine, line: PurchaseLine): Decimal {
  const { leatherId, unitPrice } = line;
  const quantity = row.markedAreaMm2 === null ? row.quantity : scaled(row.markedAreaMm2, 3);
  return lineAmount({ leatherId, quantity, unitPrice });
}
