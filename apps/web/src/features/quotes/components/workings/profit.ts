import type { BreakNumbers } from '@hidewright/domain';
import { Decimal } from 'decimal.js';

/** What remains of an order after all its costs, wages included. */
export function profitOf({ total, costLines }: BreakNumbers): string {
  return costLines.reduce((rest, { amount }) => rest.minus(amount), new Decimal(total)).toFixed(2);
}
