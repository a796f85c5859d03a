import { isNot, type RunCost, sumOf } from '../costing/cost-run.ts';
import type { RunInput } from '../costing/run-input.ts';
import { type DecimalText, Exact, toText } from '../numbers/decimal-text.ts';
import { earn } from './earnings.ts';

/**
 * The smallest multiple of the price step with which an order earns the target per bench hour.
 * With `tooling` false the goods are looked at alone, as if the tooling paid for itself: that is
 * the price to suggest, since tooling never goes into a unit price.
 */
export function targetPrice(input: RunInput, cost: RunCost, tooling: boolean): DecimalText {
  const step = new Exact(input.priceStep);
  const goods = { ...cost, costLines: cost.costLines.filter(({ kind }) => kind !== 'tooling') };
  const [order, charge] = tooling ? [cost, toolingCharge(input)] : [goods, '0'];
  const wanted = new Exact(input.targetPerHour).times(cost.benchMinutes).div(60);
  const bought = sumOf(order.costLines, isNot('wages', 'desk'));
  const exact = wanted.plus(bought).minus(charge).div(cost.quantity);
  const reaches = (steps: number) => {
    const earned = earn(order, toText(step.times(steps)), charge, input.minorDigits);
    return new Exact(earned.perBenchHour).gte(input.targetPerHour);
  };
  // Rounding of the line and of the hourly figure can move the exact answer by a step or two.
  let steps = Math.max(1, exact.div(step).ceil().toNumber());
  while (!reaches(steps)) steps += 1;
  while (steps > 1 && reaches(steps - 1)) steps -= 1;
  return toText(step.times(steps));
}

/** What the customer pays for tooling, once. */
export function toolingCharge(input: RunInput): DecimalText {
  const sum = input.tooling.reduce((total, { charge }) => total.plus(charge), new Exact(0));
  return sum.toFixed(input.minorDigits);
}

/** Raises each price to the one of the next larger quantity, so that a ladder never rises. */
export function neverRising(prices: readonly DecimalText[]): DecimalText[] {
  return prices.map((price, at) =>
    prices.slice(at).reduce((most, each) => (new Exact(each).gt(most) ? each : most), price),
  );
}
