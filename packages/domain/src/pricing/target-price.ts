import type { Decimal } from 'decimal.js';
import { hourlyKinds, isNot, sumOf } from '../costing/cost-lines.ts';
import type { RunCost } from '../costing/cost-run.ts';
import type { RunInput } from '../costing/run-input.ts';
import { type DecimalText, Exact, toText } from '../numbers/decimal-text.ts';
import { toolingCharge } from './charges.ts';
import { earn } from './earnings.ts';
import { leastPrice } from './least-price.ts';

/**
 * The smallest multiple of the price step with which an order earns the target per bench hour.
 * With `tooling` false the pieces are looked at alone, as if the tooling paid for itself and nobody
 * were in a hurry: that is the price to suggest, since charged once never goes into a unit price.
 */
export function targetPrice(input: RunInput, cost: RunCost, tooling: boolean): DecimalText {
  const asked = tooling ? input : withoutExtras(input);
  const order = tooling ? cost : withoutTooling(cost);
  const wanted = new Exact(input.targetPerHour).times(cost.benchMinutes).div(60);
  const bought = sumOf(order.costLines, isNot(...hourlyKinds));
  const charged = new Exact(toolingCharge(asked))
    .plus(asked.setUpCharge ?? '0')
    .plus(asked.carriage?.charge ?? '0');
  const guess = wanted.plus(bought).minus(charged).div(cost.quantity);
  return leastPrice(input.priceStep, guess, (price) =>
    new Exact(earn(asked, order, price).perBenchHour).gte(input.targetPerHour),
  );
}

/** The same run without what is charged once for its tools, its hurry, or its smallness. */
export const withoutExtras = (input: RunInput): RunInput => ({
  ...input,
  tooling: [],
  rushPercent: '0',
  minimumOrder: '0',
});

export const withoutTooling = (cost: RunCost): RunCost => ({
  ...cost,
  costLines: cost.costLines.filter(({ kind }) => kind !== 'tooling'),
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
