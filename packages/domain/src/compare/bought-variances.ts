import type { Decimal } from 'decimal.js';
import { type DecimalText, readDecimal, toPlaces } from '../numbers/decimal-text.ts';
import { roundParts } from './round-parts.ts';

/** Leather or one kind of hardware, as it was said and as it was; quantities in the unit of the price. */
export interface BoughtFor {
  saidQuantity: Decimal;
  /** what was said would be needed for as many good pieces as were made */
  saidForMade: Decimal;
  wasQuantity: Decimal;
  /** per unit, as the estimate had it */
  saidPrice: Decimal;
  /** as the estimate had it, rounded */
  saidCost: DecimalText;
  /** as the stock ledger has it */
  wasCost: DecimalText;
}

/** Why it cost more (above 0) or less; the parts add up to `sum` exactly. */
export interface BoughtVariances {
  /** (actual price − said price) × actual quantity */
  price: DecimalText;
  /** (actual quantity − said for the pieces made) × said price */
  usage: DecimalText;
  /** (said for the pieces made − said quantity) × said price: more or fewer came out than ordered */
  made: DecimalText;
  /** what the estimate counted or rounded otherwise */
  other: DecimalText;
  /** actual cost − said cost */
  sum: DecimalText;
}

/**
 * Splits the difference of a material's cost into price, usage and pieces made, as standard costing
 * does (from memory), the usage flexed to the good pieces that came out.
 * @param places decimals of the currency, which both costs have at most
 * @throws InvalidInput
 */
export function boughtVariances(bought: BoughtFor, places: number): BoughtVariances {
  const { saidQuantity, saidForMade, wasQuantity, saidPrice } = bought;
  const saidCost = readDecimal(bought.saidCost, 'saidCost', { places });
  const wasCost = readDecimal(bought.wasCost, 'wasCost', { places });
  const exact = [
    wasCost.minus(wasQuantity.times(saidPrice)),
    wasQuantity.minus(saidForMade).times(saidPrice),
    saidForMade.minus(saidQuantity).times(saidPrice),
    saidQuantity.times(saidPrice).minus(saidCost),
  ];
  const [price, usage, made, other] = roundParts(exact, places).map((part) =>
    toPlaces(part, places),
  ) as [DecimalText, DecimalText, DecimalText, DecimalText];
  return { price, usage, made, other, sum: toPlaces(wasCost.minus(saidCost), places) };
}
