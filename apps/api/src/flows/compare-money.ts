import type { Compared } from '@hidewright/contract';
import type { BreakNumbers, CostKind, RunInput } from '@hidewright/domain';
import { Decimal } from 'decimal.js';
import { moneyText } from '../http/decimal-text.ts';
import type { Used } from './used-by-job.ts';

/**
 * What the run cost and earned, as it was said and as it was. Left: the price less leather, hardware, tooling and
 * packing. Per bench hour: left by bench hours. Per hour all in: left less all wages, by bench and desk hours. Tooling,
 * packing and desk time are taken as they were estimated.
 */
export function compareMoney(input: RunInput, numbers: BreakNumbers, used: Used): Compared[] {
  const said = (kind: CostKind): Decimal =>
    numbers.costLines
      .filter((line) => line.kind === kind)
      .reduce((sum, { amount }) => sum.plus(amount), new Decimal(0));
  const leather = used.leatherCost ?? (said('leather').isZero() ? new Decimal(0) : null);
  const hardware = used.hardwareCost ?? (said('hardware').isZero() ? new Decimal(0) : null);
  const wages = used.minutes?.times(input.wagePerHour).dividedBy(60) ?? null;
  const left =
    leather === null || hardware === null
      ? null
      : new Decimal(numbers.total)
          .minus(leather)
          .minus(hardware)
          .minus(said('tooling'))
          .minus(said('packing'));
  return [
    row('Leather', said('leather'), leather),
    row('Hardware', said('hardware'), hardware),
    row('Bench wages', said('wages'), wages),
    row('Left after everything bought', numbers.left, left),
    row('Per bench hour', numbers.perBenchHour, perBenchHour(left, used.minutes)),
    row('Per hour all in', numbers.perHourAllIn, perHourAllIn(input, left, used.minutes)),
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
  minutes: Decimal | null,
): Decimal | null {
  if (left === null || minutes === null) return null;
  const all = minutes.plus(input.deskMinutesPerOrder);
  const wages = all.times(input.wagePerHour).dividedBy(60);
  return left.minus(wages).times(60).dividedBy(all);
}
