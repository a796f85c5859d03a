import type { GoodsLineTyped } from '@hidewright/contract';
import { Exact, type OfferTerms } from '@hidewright/domain';
import { Decimal } from 'decimal.js';
import { priceText } from '../../http/decimal-text.ts';

export interface Thing {
  of: 'leather' | 'hardware';
  id: number;
}

/** A line of a draft, at the price of the break that its quantity reaches. */
export function boughtLine(
  { of, id }: Thing,
  { breaks }: OfferTerms,
  quantity: string,
): GoodsLineTyped {
  const reached = breaks.findLast(({ from }) => new Exact(from).lte(quantity)) ?? breaks[0];
  const unitPrice = priceText(new Decimal(reached?.price ?? '0'));
  return of === 'leather'
    ? { of, leatherId: id, areaMm2: quantity, unitPrice }
    : { of, hardwareId: id, quantity: Number(quantity), unitPrice };
}
