import { sumOf } from '../costing/cost-lines.ts';
import { hourlyOfPieceRate } from '../costing/cost-hours.ts';
import type { RunInput } from '../costing/run-input.ts';
import { unitPriceInFull } from '../money/amounts.ts';
import { Exact } from '../numbers/decimal-text.ts';
import type { StepMinutes } from '../work/bench-minutes.ts';
import { ticketSteps } from '../work/work-plan.ts';
import type { BreakNumbers, OptionNumbers } from './run-numbers.ts';

/** A larger quantity that costs less in total than so many pieces at a rung's price. */
interface CheaperOrder {
  from: number;
  quantity: number;
}

/**
 * From how many pieces on ordering a larger quantity costs less in total: the smallest count below the next rung
 * which, at this rung's price, comes to more than the whole of a later rung; and that rung, the cheapest of those.
 * @param later the rungs above, in rising order of quantity
 */
export function cheaperOrder(
  here: BreakNumbers,
  later: readonly BreakNumbers[],
): CheaperOrder | null {
  const [next] = later;
  if (next === undefined || new Exact(here.priceEach).lte(0)) return null;
  const totalOf = (rung: BreakNumbers) => new Exact(rung.priceEach).times(rung.quantity);
  const least = later.reduce((best, rung) => (totalOf(rung).lt(totalOf(best)) ? rung : best), next);
  const level = totalOf(least).div(here.priceEach);
  const from = Math.max(here.quantity, level.floor().toNumber() + 1);
  return from < next.quantity ? { from, quantity: least.quantity } : null;
}

/** What to say about one rung, in plain words. */
export function breakWarnings(
  input: RunInput,
  here: BreakNumbers,
  cheaper: CheaperOrder | null,
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
  if (cheaper?.from === here.quantity) {
    warnings.push(
      `Ordering ${cheaper.quantity} costs less in total than ${here.quantity}: raise its price or lower this one.`,
    );
  }
  return [...warnings, ...belowFloor(input, here)];
}

function belowFloor({ floorPrice, minorDigits }: RunInput, here: BreakNumbers): string[] {
  if (!floorPrice || new Exact(here.priceEach).gte(floorPrice)) return [];
  const [price, floor] = [here.priceEach, floorPrice].map((each) =>
    unitPriceInFull(each, minorDigits),
  );
  return [`At ${here.quantity} a piece goes for ${price}, below your floor of ${floor}.`];
}

/** What to say about the ladder and the order as a whole. */
export function ladderWarnings(
  input: RunInput,
  breaks: readonly BreakNumbers[],
  options: readonly OptionNumbers[],
): string[] {
  return [
    ...risingPrices(breaks, input.minorDigits),
    ...unpaidTooling(input),
    ...withoutPrice(input),
    ...lowWages(input, breaks),
    ...options.flatMap((option) => weakOption(option, input.minorDigits)),
  ];
}

function risingPrices(
  breaks: readonly BreakNumbers[],
  digits: number,
  what = 'The price',
): string[] {
  return breaks.flatMap((here, at) => {
    const next = breaks[at + 1];
    if (!next || new Exact(next.priceEach).lte(here.priceEach)) return [];
    const [lower, higher] = [here, next].map((rung) => unitPriceInFull(rung.priceEach, digits));
    return [
      `${what} rises from ${lower} at ${here.quantity} to ${higher} at ${next.quantity}: a larger order should not cost more each.`,
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

/** Priced all the same, with what has no price counted as nothing. */
function withoutPrice({ leather, hardware, supplies = [], options = [] }: RunInput): string[] {
  const bought = [...hardware, ...supplies, ...options.flatMap((option) => option.hardware)];
  const missing = new Set([
    ...(new Exact(leather.pricePerFt2).isZero() ? [leather.name] : []),
    ...bought.filter(({ unitPrice }) => new Exact(unitPrice).isZero()).map(({ name }) => name),
  ]);
  return [...missing].map(
    (name) => `${name} has no price yet and is counted as nothing: enter one.`,
  );
}

function lowWages(input: RunInput, breaks: readonly BreakNumbers[]): string[] {
  const least = input.minimumWagePerHour;
  const [first] = breaks;
  if (!least || !first || new Exact(least).isZero()) return [];
  const rule = `below the minimum of ${least} that you entered. The local authority's rules come first.`;
  const byPiece = ticketSteps(input.work).flatMap((step, at) => {
    const hourly = hourlyOfPieceRate(step, first.minutesByStep[at] as StepMinutes);
    if (hourly === null || hourly.gte(least)) return [];
    return [`${step.name} at ${step.pieceRate} comes to ${hourly.toFixed(2)} an hour, ${rule}`];
  });
  const byHour = new Exact(input.wagePerHour).lt(least)
    ? [`The wage of ${input.wagePerHour} an hour is ${rule}`]
    : [];
  return [...byHour, ...byPiece];
}

function weakOption({ name, breaks }: OptionNumbers, digits: number): string[] {
  const losing = breaks.filter(({ loses }) => loses);
  const missing = breaks.filter(({ loses, reachesTarget }) => !loses && !reachesTarget);
  const at = (rungs: readonly BreakNumbers[]) => rungs.map(({ quantity }) => quantity).join(', ');
  return [
    ...risingPrices(breaks, digits, `With ${name} the price`),
    ...(losing.length > 0 ? [`With ${name} the run loses money at ${at(losing)}.`] : []),
    ...(missing.length > 0 ? [`With ${name} the target is missed at ${at(missing)}.`] : []),
  ];
}
