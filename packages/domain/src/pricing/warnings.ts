import { sumOf } from '../costing/cost-run.ts';
import type { RunInput } from '../costing/run-input.ts';
import { unitPriceInFull } from '../money/amounts.ts';
import { Exact } from '../numbers/decimal-text.ts';
import type { BreakNumbers } from './run-numbers.ts';

/**
 * From how many pieces on the next larger quantity costs less in total: the smallest count below
 * that quantity which, at this rung's price, comes to more than the whole next rung.
 */
export function cheaperFrom(here: BreakNumbers, next: BreakNumbers | undefined): number | null {
  if (!next || new Exact(here.priceEach).lte(next.priceEach)) return null;
  const level = new Exact(next.priceEach).times(next.quantity).div(here.priceEach);
  const from = Math.max(here.quantity, level.floor().toNumber() + 1);
  return from < next.quantity ? from : null;
}

/** What to say about one rung, in plain words. */
export function breakWarnings(
  input: RunInput,
  here: BreakNumbers,
  next: BreakNumbers | undefined,
): string[] {
  const warnings: string[] = [];
  if (here.loses) {
    const short = sumOf(here.costLines, () => true).minus(here.total);
    warnings.push(
      `At ${here.quantity} this run loses ${short.toFixed(input.minorDigits)}: it costs more than it brings, wages included.`,
    );
  }
  if (!here.reachesTarget) {
    warnings.push(
      `At ${here.quantity} it leaves ${here.perBenchHour} per bench hour, below your ${input.targetPerHour}: ${unitPriceInFull(here.priceThatReachesTarget, input.minorDigits)} each would reach it.`,
    );
  }
  if (next && here.cheaperFrom === here.quantity) {
    warnings.push(
      `Ordering ${next.quantity} costs less in total than ${here.quantity}: raise its price or lower this one.`,
    );
  }
  return warnings;
}

/** What to say about the ladder and the order as a whole. */
export function ladderWarnings(input: RunInput, breaks: readonly BreakNumbers[]): string[] {
  return [...risingPrices(breaks, input.minorDigits), ...unpaidTooling(input)];
}

function risingPrices(breaks: readonly BreakNumbers[], digits: number): string[] {
  return breaks.flatMap((here, at) => {
    const next = breaks[at + 1];
    if (!next || new Exact(next.priceEach).lte(here.priceEach)) return [];
    const [lower, higher] = [here, next].map((rung) => unitPriceInFull(rung.priceEach, digits));
    return [
      `The price rises from ${lower} at ${here.quantity} to ${higher} at ${next.quantity}: a larger order should not cost more each.`,
    ];
  });
}

function unpaidTooling(input: RunInput): string[] {
  const unpaid = input.tooling.reduce(
    (sum, { cost, charge }) => sum.plus(cost).minus(charge),
    new Exact(0),
  );
  if (unpaid.lte(0)) return [];
  return [
    `The tooling costs ${unpaid.toFixed(input.minorDigits)} more than is charged for it: charge it, or the run pays for it.`,
  ];
}
