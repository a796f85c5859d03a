import { checkRunInput } from '../costing/check-run-input.ts';
import { costRun, type RunCost } from '../costing/cost-run.ts';
import type { RunInput, RunOption } from '../costing/run-input.ts';
import { type DecimalText, Exact, readDecimal, toPlaces, toText } from '../numbers/decimal-text.ts';
import { earn } from './earnings.ts';
import { optionBreaks } from './option-breaks.ts';
import { rulePrice } from './rule-price.ts';
import type { BreakNumbers, RunNumbers } from './run-numbers.ts';
import { neverRising, notBelow, targetPrice } from './target-price.ts';
import { breakWarnings, cheaperOrder, ladderWarnings } from './warnings.ts';

/**
 * The numbers of a run at each quantity: what to cut, what it costs, which price keeps the rule, and
 * what the asked price earns per bench hour and per hour all in; and the same for every option.
 * @throws InvalidInput · NotWorkable
 */
export function priceRun(input: RunInput): RunNumbers {
  checkRunInput(input);
  const costs = costsOf(input);
  const breaks = ladderOf(input, costs);
  const options = (input.options ?? []).map((option, at) => ({
    name: option.name,
    breaks: optionLadder(
      { ...input, hardware: option.hardware, options: [] },
      option,
      at,
      breaks,
      costs,
    ),
  }));
  return { breaks, options, warnings: ladderWarnings(input, breaks, options) };
}

function optionLadder(
  run: RunInput,
  option: RunOption,
  at: number,
  breaks: readonly BreakNumbers[],
  cuts: readonly RunCost[],
): BreakNumbers[] {
  const costs = cuts.map((cut) => costRun(run, cut.quantity, cut));
  const suggested = option.typedExtra === null ? suggestedPrices(run, costs) : null;
  return ladderOf({ ...run, breaks: optionBreaks(option, at, breaks, suggested) }, costs);
}

function ladderOf(input: RunInput, costs: readonly RunCost[]): BreakNumbers[] {
  const suggested = suggestedPrices(input, costs);
  const rungs = costs.map((cost, at) => rung(input, cost, suggested[at] as string));
  return rungs.map((each, at) => {
    const cheaper = cheaperOrder(each, rungs.slice(at + 1));
    return {
      ...each,
      cheaperFrom: cheaper?.from ?? null,
      cheaperQuantity: cheaper?.quantity ?? null,
      warnings: breakWarnings(input, each, cheaper),
    };
  });
}

const costsOf = (input: RunInput): RunCost[] =>
  input.breaks
    .map(({ quantity }) => quantity)
    .sort((a, b) => a - b)
    .map((quantity) => costRun(input, quantity));

/** By each quantity's own rule or else the run's, never below the floor, never rising. */
function suggestedPrices(input: RunInput, costs: readonly RunCost[]): DecimalText[] {
  const prices = costs.map((cost) => {
    const own = input.breaks.find(({ quantity }) => quantity === cost.quantity)?.rule;
    const price = rulePrice(input, cost, own ?? input.priceRule ?? { kind: 'target' });
    return notBelow(input.floorPrice, input.priceStep, price);
  });
  return neverRising(prices);
}

function rung(input: RunInput, cost: RunCost, suggestedPrice: string): BreakNumbers {
  const typedPrice =
    input.breaks.find(({ quantity }) => quantity === cost.quantity)?.typedPrice ?? null;
  const priceEach =
    typedPrice === null ? suggestedPrice : toText(readDecimal(typedPrice, 'typedPrice'));
  const earnings = earn(input, cost, priceEach);
  const reachesTarget = new Exact(earnings.perBenchHour).gte(input.targetPerHour);
  return {
    ...cost,
    ...earnings,
    suggestedPrice,
    priceEach,
    typed: typedPrice !== null,
    reachesTarget,
    priceThatReachesTarget: targetPrice(input, cost, true),
    cheaperFrom: null,
    reorderTotal: new Exact(earnings.total)
      .minus(earnings.toolingCharge)
      .toFixed(input.minorDigits),
    resaleMarginPercent: resaleMargin(input.resalePrice, priceEach),
    warnings: [],
  };
}

function resaleMargin(resale: DecimalText | null | undefined, priceEach: DecimalText) {
  if (!resale || new Exact(resale).isZero()) return null;
  return toPlaces(new Exact(resale).minus(priceEach).div(resale).times(100), 1);
}
