import type { FinishedPiece } from '@hidewright/contract';
import { lineAmount, minorDigits } from '@hidewright/domain';
import { Decimal } from 'decimal.js';

interface SaleWorth {
  /** Before tax. */
  amount: string;
  /** Leather and hardware in these pieces, at the average of those on the shelf; not said of more than lie there. */
  cost: string | undefined;
  belowCost: boolean;
}

const price = /^\d{1,9}(\.\d{1,4})?$/;

/** What a sale as it is typed brings, beside what its pieces cost; nothing while it cannot be said. */
export function saleWorth(
  { quantity, unitPrice }: { quantity: unknown; unitPrice: unknown },
  { onHand, value }: Pick<FinishedPiece, 'onHand' | 'value'>,
  currency: string,
): SaleWorth | undefined {
  if (typeof quantity !== 'number' || quantity < 1 || typeof unitPrice !== 'string')
    return undefined;
  if (!price.test(unitPrice)) return undefined;
  const amount = lineAmount(quantity, unitPrice, minorDigits(currency));
  if (value === undefined || quantity > onHand)
    return { amount, cost: undefined, belowCost: false };
  const cost = new Decimal(value).times(quantity).dividedBy(onHand);
  return { amount, cost: cost.toFixed(2), belowCost: cost.greaterThan(amount) };
}
