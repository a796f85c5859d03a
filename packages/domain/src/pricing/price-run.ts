import { checkRunInput } from '../costing/check-run-input.ts';
import { costRun, type RunCost } from '../costing/cost-run.ts';
import type { RunInput } from '../costing/run-input.ts';
import { Exact, readDecimal, toText } from '../numbers/decimal-text.ts';
import { earn } from './earnings.ts';
import { breakWarnings, cheaperFrom, ladderWarnings } from './warnings.ts';
import type { BreakNumbers, RunNumbers } from './run-numbers.ts';
import { neverRising, targetPrice, toolingCharge } from './target-price.ts';

/**
 * The numbers of a run at each quantity: what to cut, what it costs, which price reaches the
 * target, and what the asked price earns per bench hour and per hour all in.
 * @throws InvalidInput · NotWorkable
 */
export function priceRun(input: RunInput): RunNumbers {
  checkRunInput(input);
  const costs = [...input.breaks]
    .sort((a, b) => a.quantity - b.quantity)
    .map(({ quantity, typedPrice }) => ({ cost: costRun(input, quantity), typedPrice }));
  const suggested = neverRising(costs.map(({ cost }) => targetPrice(input, cost, false)));
  const rungs = costs.map(({ cost, typedPrice }, at) =>
    rung(input, cost, suggested[at] as string, typedPrice),
  );
  const breaks = rungs.map((each, at) => {
    const withNext = { ...each, cheaperFrom: cheaperFrom(each, rungs[at + 1]) };
    return { ...withNext, warnings: breakWarnings(input, withNext, rungs[at + 1]) };
  });
  return { breaks, warnings: ladderWarnings(input, breaks) };
}

function rung(
  input: RunInput,
  cost: RunCost,
  suggestedPrice: string,
  typedPrice: string | null,
): BreakNumbers {
  const priceEach =
    typedPrice === null ? suggestedPrice : toText(readDecimal(typedPrice, 'typedPrice'));
  const earnings = earn(cost, priceEach, toolingCharge(input), input.minorDigits);
  return {
    ...cost,
    ...earnings,
    suggestedPrice,
    priceEach,
    typed: typedPrice !== null,
    reachesTarget: new Exact(earnings.perBenchHour).gte(input.targetPerHour),
    priceThatReachesTarget: targetPrice(input, cost, true),
    cheaperFrom: null,
    warnings: [],
  };
}
