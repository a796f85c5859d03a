import type { Decimal } from 'decimal.js';
import { Exact, mm2ToFootage, round } from '@hidewright/domain';
import { unscaled } from '../../db/columns/scaled-decimal.ts';
import { invalid } from '../../http/problem.ts';

/** The largest amount that a contract's field can carry. */
const mostMoney = '999999999999.99';

/**
 * What an area of leather costs at a price per ft², to the cent.
 * @throws {Problem} 422 beside `field` when that is more than the books can hold
 */
export function leatherCost(areaMm2: Decimal, pricePerFt2: Decimal, field: string): Decimal {
  return bookable(round(mm2ToFootage(areaMm2).times(pricePerFt2), 2), field);
}

/**
 * What so many pieces cost, to the cent.
 * @throws {Problem} 422 beside `field` when that is more than the books can hold
 */
export function hardwareCost(quantity: number, unitPrice: Decimal, field: string): Decimal {
  return bookable(round(new Exact(quantity).times(unitPrice), 2), field);
}

interface Line {
  leatherId: number | null;
  quantity: number;
  unitPrice: Decimal;
  /** Of a service that is paid for the lot. */
  fixedPrice?: Decimal | null;
}

/** The amount of an order's line. */
export function lineAmount(line: Line, field = 'unitPrice'): Decimal {
  if (line.fixedPrice) return line.fixedPrice;
  return line.leatherId === null
    ? hardwareCost(line.quantity, line.unitPrice, field)
    : leatherCost(unscaled(line.quantity, 3), line.unitPrice, field);
}

/** @throws {Problem} 422 when the lines, or all of them together, come to more than the books can hold */
export function requireBookable(lines: Line[]): void {
  const amounts = lines.map((line, at) => lineAmount(line, `lines.${at}.unitPrice`));
  bookable(Exact.sum(0, ...amounts), 'lines');
}

function bookable(amount: Decimal, field: string): Decimal {
  if (amount.lessThanOrEqualTo(mostMoney)) return amount;
  const message = 'That costs more than the books can hold. Check the quantity and the price.';
  throw invalid([{ field, message }]);
}
