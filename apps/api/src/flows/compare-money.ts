import type { Compared } from '@hidewright/contract';
import type { BreakNumbers, CostKind, RunInput } from '@hidewright/domain';
import { Decimal } from 'decimal.js';
import { moneyText } from '../http/decimal-text.ts';
import type { Used } from './used-by-job.ts';

const asEstimated: readonly CostKind[] = ['supplies', 'tooling', 'packing', 'carriage', 'fees'];

/**
 * What the run cost and earned, as it was said and as it was. Left: the price less all that is bought. Per bench
 * hour: left by bench hours. Per hour all in: left less all wages and overhead, by bench and desk hours. What is not
 * recorded at the bench (supplies, tooling, packing, carriage, card fees, desk time) is taken as it was estimated.
 */
export function compareMoney(input: RunInput, numbers: BreakNumbers, used: Used): Compared[] {
  const said = (kind: CostKind): Decimal =>
    numbers.costLines
      .filter((line) => line.kind === kind)
      .reduce((sum, { amount }) => sum.plus(amount), new Decimal(0));
  const leather = used.leatherCost ?? (said('leather').isZero() ? new Decimal(0) : null);
  const hardware = used.hardwareCost ?? (said('hardware').isZero() ? new Decimal(0) : null);
  const left =
    leather === null || hardware === null
      ? null
      : asEstimated.reduce(
          (rest, kind) => rest.minus(said(kind)),
          new Decimal(numbers.total).minus(leather).minus(hardware),
        );
  return [
    row('Leather', said('leather'), leather),
    row('Hardware', said('hardware'), hardware),
    row('Bench wages', said('wages'), used.wages),
    row('Left after everything bought', numbers.left, left),
    row('Per bench hour', numbers.perBenchHour, perBenchHour(left, used.minutes)),
    row('Per hour all in', numbers.perHourAllIn, perHourAllIn(input, left, used)),
  ];
}

const row = (what: string, estimate: Decimal | string, fact: Decimal | null): Compared => ({
  what,
  unit: 'money',
  estimate: moneyText(new Decimal(estimate)),
  fact: fact === null ? null : moneyText(fact),
});

function perBenchHour(left: Decimal | null, minutes: Decimal | null): Decimal | null {
  return left === null || minutes === null ? null : left.times(60).dividedBy(minutes);
}

function perHourAllIn(
  input: RunInput,
  left: Decimal | null,
  { minutes, wages: paid }: Used,
): Decimal | null {
  if (left === null || minutes === null || paid === null) return null;
  const all = minutes.plus(input.deskMinutesPerOrder);
  const desk = new Decimal(input.deskMinutesPerOrder).times(input.wagePerHour).dividedBy(60);
  const wages = paid.plus(desk);
  const overhead = minutes.times(input.overheadPerHour ?? 0).dividedBy(60);
  return left.minus(wages).minus(overhead).times(60).dividedBy(all);
}
