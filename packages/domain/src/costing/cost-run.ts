import type { Decimal } from 'decimal.js';
import { NotWorkable } from '../errors/domain-error.ts';
import { type DecimalText, Exact, toAtMost } from '../numbers/decimal-text.ts';
import { type CutPlan, planCut } from '../rejects/plan-cut.ts';
import { type BenchMinutes, benchMinutes, goodShare } from '../work/bench-minutes.ts';
import { addHours } from './cost-hours.ts';
import { addMaterials, boughtWhole, type BoughtWhole } from './cost-materials.ts';
import { hardwareCounts } from './hardware-counts.ts';
import { type CostLine, CostLines } from './cost-lines.ts';
import type { RunInput } from './run-input.ts';

/** What a quantity takes and costs, before any price. */
export interface RunCost extends CutPlan {
  quantity: number;
  /** pieces that are expected good enough to sell for less, of those cut */
  seconds: number;
  leatherAreaMm2: DecimalText;
  /** leather that must be bought whole for it; null where nobody said what a whole one is */
  boughtWhole: BoughtWhole | null;
  /** units of each line of hardware, in the order of the input */
  hardwareCounts: number[];
  costLines: CostLine[];
  benchMinutes: DecimalText;
  minutesByStep: BenchMinutes['bySteps'];
  /** bench and desk minutes */
  allMinutes: DecimalText;
}

/**
 * Leather is costed by whole containers and what runs take on top, hardware by the pieces that need it, wages by the pieces
 * cut; desk time at the same wage; packing, carriage and tooling once. Each line is rounded once and
 * they add up. What a card costs depends on the price and is added there. The input has been checked.
 */
export function costRun(
  input: RunInput,
  quantity: number,
  cut: CutPlan = cutOf(input, quantity),
): RunCost {
  const area = leatherArea(input, cut.containers);
  const bench = benchMinutes(input.work, {
    pieces: cut.cutCount,
    containers: cut.containers,
    restPercent: input.restPercent,
  });
  if (new Exact(bench.total).isZero()) {
    const what =
      input.work.kind === 'steps'
        ? 'Give a step of the pattern its setup or its seconds a piece, with somebody at it'
        : 'Say how many minutes 100 pieces take';
    throw new NotWorkable(`${what}: without bench time nothing is earned per hour.`);
  }
  const lines = new CostLines(input.minorDigits, quantity);
  const counts = hardwareCounts(input, quantity, cut.cutCount);
  addMaterials(lines, input, { quantity, containers: cut.containers, area, counts });
  for (const { name, cost } of input.tooling) lines.add('tooling', name, new Exact(cost), 'once');
  addHours(lines, input, bench);
  addPackingAndCarriage(lines, input, quantity);
  return {
    ...cut,
    quantity,
    seconds: new Exact(input.work.secondsPercent ?? '0')
      .times(cut.cutCount)
      .div(100)
      .round()
      .toNumber(),
    leatherAreaMm2: toAtMost(area, 3),
    boughtWhole: boughtWhole(input, area),
    hardwareCounts: counts,
    costLines: lines.lines,
    benchMinutes: bench.total,
    minutesByStep: bench.bySteps,
    allMinutes: toAtMost(new Exact(bench.total).plus(input.deskMinutesPerOrder), 4),
  };
}

/** Whole panels or strips, and what runs take on top of them. */
function leatherArea({ layout, leather }: RunInput, containers: number): Decimal {
  const factor = new Exact(leather.extraPercent ?? '0').plus(100).div(100);
  return new Exact(layout.containerAreaMm2).times(containers).times(factor);
}

/** How many to cut for so many good ones. It is the same for every option of a run. */
function cutOf(input: RunInput, quantity: number): CutPlan {
  return planCut({
    good: quantity,
    rate: goodShare(input.work),
    history: input.history,
    confidence: new Exact(input.confidencePercent).div(100).toNumber(),
    perContainer: input.layout.pieces,
    perRow: input.layout.rowPieces,
  });
}

function addPackingAndCarriage(lines: CostLines, input: RunInput, quantity: number): void {
  const { packingPerOrder: once, packingPerPiece: each = '0', carriage } = input;
  const byPiece = new Exact(each).times(quantity);
  const workings = byPiece.isZero() ? 'per order' : `${once} per order and ${each} per piece`;
  lines.add('packing', 'Packing', byPiece.plus(once), workings);
  if (carriage && !new Exact(carriage.cost).isZero()) {
    lines.add('carriage', 'Carriage', new Exact(carriage.cost), 'what the carrier asks');
  }
}
