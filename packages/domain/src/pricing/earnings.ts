import type { Decimal } from 'decimal.js';
import { type CostLine, CostLines, hourlyKinds, isNot, sumOf } from '../costing/cost-lines.ts';
import type { RunCost } from '../costing/cost-run.ts';
import type { RunInput } from '../costing/run-input.ts';
import { type DecimalText, Exact, toPlaces } from '../numbers/decimal-text.ts';
import { type Billed, bill, cardFeeOn } from './charges.ts';

export interface Earnings extends Billed {
  costLines: CostLine[];
  /** everything but tooling, over the pieces ordered, 4 places */
  unitCost: DecimalText;
  marginPercent: DecimalText;
  left: DecimalText;
  perBenchHour: DecimalText;
  perHourAllIn: DecimalText;
  loses: boolean;
}

/**
 * What a price earns. Per bench hour: the total less everything bought, card fees and carriage
 * included, by bench hours. Per hour all in: the same less wages and overhead, by bench and desk
 * hours. Hourly figures rounded half up to the currency's decimals.
 */
export function earn(input: RunInput, cost: RunCost, priceEach: DecimalText): Earnings {
  const digits = input.minorDigits;
  const billed = bill(input, cost.quantity, priceEach);
  const costLines = [...cost.costLines, ...cardFee(input, cost.quantity, billed.total)];
  const total = new Exact(billed.total);
  const left = total.minus(sumOf(costLines, isNot(...hourlyKinds)));
  const profit = total.minus(sumOf(costLines, () => true));
  return {
    ...billed,
    costLines,
    unitCost: toPlaces(sumOf(costLines, isNot('tooling')).div(cost.quantity), 4),
    marginPercent: total.isZero() ? '0.0' : toPlaces(profit.div(total).times(100), 1),
    left: toPlaces(left, digits),
    perBenchHour: perHour(left, cost.benchMinutes, digits),
    perHourAllIn: perHour(profit, cost.allMinutes, digits),
    loses: profit.isNegative() && !profit.isZero(),
  };
}

function cardFee(input: RunInput, quantity: number, total: DecimalText): CostLine[] {
  const fee = cardFeeOn(input, new Exact(total));
  if (!input.cardFee || fee.isZero()) return [];
  const lines = new CostLines(input.minorDigits, quantity);
  const { percent, each } = input.cardFee;
  lines.add('fees', 'Card fees', fee, `${percent} % of ${total} and ${each} for the payment`);
  return lines.lines;
}

const perHour = (amount: Decimal, minutes: DecimalText, digits: number): DecimalText =>
  toPlaces(amount.times(60).div(minutes), digits);
