import { type DecimalText, Exact, toAtMost } from '../numbers/decimal-text.ts';
import type { BenchMinutes, StepMinutes } from '../work/bench-minutes.ts';
import { ticketSteps, type WorkStep } from '../work/work-plan.ts';
import type { CostLines } from './cost-lines.ts';
import type { RunInput } from './run-input.ts';

/** Adds wages, desk time and overhead. */
export function addHours(lines: CostLines, input: RunInput, bench: BenchMinutes): void {
  const { wagePerHour, deskMinutesPerOrder: desk, overheadPerHour = '0' } = input;
  if (input.wagesByStep && input.work.kind === 'steps') addWagesByStep(lines, input, bench);
  else
    lines.add(
      'wages',
      'Bench hours',
      atRate(bench.total, wagePerHour),
      said(bench.total, wagePerHour),
    );
  lines.add('desk', 'Desk time', atRate(desk, wagePerHour), said(desk, wagePerHour));
  if (new Exact(overheadPerHour).isZero()) return;
  lines.add(
    'overhead',
    'Overhead',
    atRate(bench.total, overheadPerHour),
    said(bench.total, overheadPerHour),
  );
}

function addWagesByStep(lines: CostLines, input: RunInput, bench: BenchMinutes): void {
  ticketSteps(input.work).forEach((step, at) => {
    const { units, minutes } = bench.bySteps[at] as StepMinutes;
    if (step.pieceRate) {
      const workings = `${units} × ${step.pieceRate} ${perWords(step)}, ${toAtMost(new Exact(minutes), 1)} minutes`;
      lines.add('wages', step.name, new Exact(units).times(step.pieceRate), workings);
    } else {
      lines.add(
        'wages',
        step.name,
        atRate(minutes, input.wagePerHour),
        said(minutes, input.wagePerHour),
      );
    }
  });
}

const perWords = ({ per }: WorkStep): string => (per === 'run' ? 'for the run' : `a ${per}`);

const atRate = (minutes: DecimalText, perHour: DecimalText) =>
  new Exact(minutes).times(perHour).div(60);

const said = (minutes: DecimalText, perHour: DecimalText): string =>
  `${toAtMost(new Exact(minutes), 1)} minutes at ${perHour} per hour`;

/** What a piece rate comes to for an hour of the step's own time; null where the step takes none. */
export function hourlyOfPieceRate(step: WorkStep, { units, minutes }: StepMinutes) {
  if (!step.pieceRate || new Exact(minutes).isZero()) return null;
  return new Exact(units).times(step.pieceRate).times(60).div(minutes);
}
