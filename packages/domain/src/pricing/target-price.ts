import type { Decimal } from 'decimal.js';
import { hourlyKinds, isNot, sumOf } from '../costing/cost-lines.ts';
import type { RunCost } from '../costing/cost-run.ts';
import type { RunInput } from '../costing/run-input.ts';
import { type DecimalText, Exact, toText } from '../numbers/decimal-text.ts';
import { cardFeeOn, totalAt } from './charges.ts';
import { leastPrice } from './least-price.ts';

/**
 * The smallest multiple of the price step with which an order earns the target per bench hour.
 * With `tooling` false the pieces are looked at alone, as if the tooling paid for itself and nobody
 * were in a hurry: that is the price to suggest, since charged once never goes into a unit price.
 */
export function targetPrice(input: RunInput, cost: RunCost, tooling: boolean): DecimalText {
  // A minimum order would let any price reach it.
  const asked = tooling ? { ...input, minimumOrder: '0' } : withoutExtras(input);
  const bought = sumOf(
    cost.costLines,
    isNot(...hourlyKinds, ...(tooling ? [] : ['tooling' as const])),
  );
  const wanted = new Exact(input.targetPerHour).times(cost.benchMinutes).div(60);
  return leastPrice(input.priceStep, guess(asked, wanted.plus(bought), cost.quantity), (price) => {
    const total = totalAt(asked, cost.quantity, price);
    const fee = cardFeeOn(asked, total).toDecimalPlaces(input.minorDigits);
    const hourly = total.minus(bought).minus(fee).times(60).div(cost.benchMinutes);
    return hourly.toDecimalPlaces(input.minorDigits).gte(input.targetPerHour);
  });
}

/** The price each that brings so much after card fees, charges deducted; right but for rounding. */
function guess(input: RunInput, wanted: Decimal, quantity: number): Decimal {
  const { percent = '0', each = '0' } = input.cardFee ?? {};
  const total = wanted.plus(each).div(new Exact(100).minus(percent)).times(100);
  return total.minus(totalAt({ ...input, minimumOrder: '0' }, 0, new Exact(0))).div(quantity);
}

/** The same run without what is charged once for its tools, its hurry, or its smallness. */
export const withoutExtras = (input: RunInput): RunInput => ({
  ...input,
  tooling: [],
  rushPercent: '0',
  minimumOrder: '0',
});

/** Raises each price to the one of the next larger quantity, so that a ladder never rises. */
export function neverRising(prices: readonly DecimalText[]): DecimalText[] {
  return prices.map((price, at) =>
    prices.slice(at).reduce((most, each) => (new Exact(each).gt(most) ? each : most), price),
  );
}

/** A price brought up to the floor, in whole steps. */
export function notBelow(
  floor: DecimalText | null | undefined,
  step: DecimalText,
  price: DecimalText,
) {
  if (!floor || new Exact(price).gte(floor)) return price;
  return toText(upToStep(new Exact(floor), step));
}

const upToStep = (price: Decimal, step: DecimalText): Decimal => price.div(step).ceil().times(step);
