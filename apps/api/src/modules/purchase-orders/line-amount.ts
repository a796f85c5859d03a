import type { Decimal } from 'decimal.js';
import { Exact, mm2ToFootage, round } from '@hidewright/domain';
import { unscaled } from '../../db/columns/scaled-decimal.ts';

/** What an area of leather costs at a price per ft², to the cent. */
export function leatherCost(areaMm2: Decimal, pricePerFt2: Decimal): Decimal {
  return round(mm2ToFootage(areaMm2).times(pricePerFt2), 2);
}

/** What so many pieces cost, to the cent. */
export function hardwareCost(quantity: number, unitPrice: Decimal): Decimal {
  return round(new Exact(quantity).times(unitPrice), 2);
}

/** The amount of an order's line. */
export function lineAmount(line: { leatherId: number | null; quantity: number; unitPrice: Decimal }): Decimal {
  return line.leatherId === null
    ? hardwareCost(line.quantity, line.unitPrice)
    : leatherCost(unscaled(line.quantity, 3), line.unitPrice);
}
