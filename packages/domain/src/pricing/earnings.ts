import type { Decimal } from 'decimal.js';
import { isNot, type RunCost, sumOf } from '../costing/cost-run.ts';
import { type DecimalText, Exact, toPlaces } from '../numbers/decimal-text.ts';
import { lineAmount } from '../money/amounts.ts';

export interface Earnings {
  goodsTotal: DecimalText;
  toolingCharge: DecimalText;
  total: DecimalText;
  marginPercent: DecimalText;
  left: DecimalText;
  perBenchHour: DecimalText;
  perHourAllIn: DecimalText;
  loses: boolean;
}

/**
 * What a price earns. Per bench hour: the total less everything bought, by bench hours. Per hour
 * all in: the same less all wages, by bench and desk hours. Hourly figures rounded half up to the
 * currency's decimals.
 */
export function earn(
  cost: RunCost,
  priceEach: DecimalText,
  toolingCharge: DecimalText,
  digits: number,
): Earnings {
  const goodsTotal = lineAmount(cost.quantity, priceEach, digits);
  const total = new Exact(goodsTotal).plus(toolingCharge);
  const left = total.minus(sumOf(cost.costLines, isNot('wages', 'desk')));
  const profit = total.minus(sumOf(cost.costLines, () => true));
  return {
    goodsTotal,
    toolingCharge,
    total: toPlaces(total, digits),
    marginPercent: total.isZero() ? '0.0' : toPlaces(profit.div(total).times(100), 1),
    left: toPlaces(left, digits),
    perBenchHour: perHour(left, cost.benchMinutes, digits),
    perHourAllIn: perHour(profit, cost.allMinutes, digits),
    loses: profit.isNegative() && !profit.isZero(),
  };
}

const perHour = (amount: Decimal, minutes: DecimalText, digits: number): DecimalText =>
  toPlaces(amount.times(60).div(minutes), digits);
