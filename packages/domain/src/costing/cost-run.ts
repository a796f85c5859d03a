import type { Decimal } from 'decimal.js';
import { NotWorkable } from '../errors/domain-error.ts';
import { type DecimalText, Exact, toAtMost, toPlaces } from '../numbers/decimal-text.ts';
import { upToFull } from '../rejects/allowance.ts';
import { cutCount } from '../rejects/cut-count.ts';
import { mm2ToFootage } from '../units/footage.ts';
import { benchMinutes, goodShare } from '../work/bench-minutes.ts';
import type { RunInput } from './run-input.ts';

export type CostKind = 'leather' | 'hardware' | 'tooling' | 'wages' | 'desk' | 'packing';

export interface CostLine {
  kind: CostKind;
  name: string;
  /** for the whole run, rounded half up once to the currency's decimals */
  amount: DecimalText;
  /** amount over the pieces ordered, 4 places */
  each: DecimalText;
  /** how it was worked out, in words and inputs */
  workings: string;
}

/** What a quantity takes and costs, before any price. */
export interface RunCost {
  quantity: number;
  cutCount: number;
  /** chance that the cut count gives the quantity */
  probability: number;
  containers: number;
  /** pieces that the containers hold */
  cutPieces: number;
  /** pieces that the containers hold beyond the cut count */
  overs: number;
  leatherAreaMm2: DecimalText;
  costLines: CostLine[];
  benchMinutes: DecimalText;
  /** bench and desk minutes */
  allMinutes: DecimalText;
  /** everything but tooling, over the pieces ordered, 4 places */
  unitCost: DecimalText;
}

/**
 * Leather is costed by whole containers, hardware by the pieces ordered, wages by the pieces cut;
 * desk time at the same wage; packing and tooling once. Each line is rounded once and they add up.
 * The input has been checked.
 */
export function costRun(input: RunInput, quantity: number): RunCost {
  const cut = cutCount({
    good: quantity,
    rate: goodShare(input.work),
    confidence: new Exact(input.confidencePercent).div(100).toNumber(),
  });
  const full = upToFull(cut.pieces, input.layout.pieces);
  const area = new Exact(input.layout.containerAreaMm2).times(full.containers);
  const bench = benchMinutes(input.work, { pieces: cut.pieces, containers: full.containers }).total;
  if (new Exact(bench).isZero()) {
    throw new NotWorkable(
      'Say how many minutes 100 pieces take: without bench time nothing is earned per hour.',
    );
  }
  const lines = new LineWriter(input.minorDigits, quantity);
  addLeather(lines, input, full.containers, area);
  addHardware(lines, input, quantity);
  for (const { name, cost } of input.tooling) lines.add('tooling', name, new Exact(cost), 'once');
  addTime(lines, input, bench);
  lines.add('packing', 'Packing', new Exact(input.packingPerOrder), 'per order');
  return {
    quantity,
    cutCount: cut.pieces,
    probability: Math.round(cut.probability * 1e6) / 1e6,
    containers: full.containers,
    cutPieces: full.pieces,
    overs: full.overs,
    leatherAreaMm2: toAtMost(area, 3),
    costLines: lines.lines,
    benchMinutes: bench,
    allMinutes: toAtMost(new Exact(bench).plus(input.deskMinutesPerOrder), 4),
    unitCost: toPlaces(sumOf(lines.lines, isNot('tooling')).div(quantity), 4),
  };
}

/** The sum of the cost lines that are asked for. */
export function sumOf(lines: readonly CostLine[], wanted: (kind: CostKind) => boolean): Decimal {
  return lines
    .filter(({ kind }) => wanted(kind))
    .reduce((sum, { amount }) => sum.plus(amount), new Exact(0) as Decimal);
}

/** All kinds but the given ones. */
export const isNot =
  (...kinds: CostKind[]) =>
  (kind: CostKind): boolean =>
    !kinds.includes(kind);

class LineWriter {
  readonly lines: CostLine[] = [];
  readonly #digits: number;
  readonly #quantity: number;

  constructor(digits: number, quantity: number) {
    this.#digits = digits;
    this.#quantity = quantity;
  }

  /** The one place where a cost is rounded. */
  add(kind: CostKind, name: string, exact: Decimal, workings: string): void {
    const amount = toPlaces(exact, this.#digits);
    const each = toPlaces(new Exact(amount).div(this.#quantity), 4);
    this.lines.push({ kind, name, amount, each, workings });
  }
}

function addLeather(lines: LineWriter, input: RunInput, containers: number, area: Decimal): void {
  const { leather, layout } = input;
  const footage = mm2ToFootage(area);
  const one = toAtMost(mm2ToFootage(layout.containerAreaMm2), 3);
  const noun = `${layout.form}${containers === 1 ? '' : 's'}`;
  lines.add(
    'leather',
    leather.name,
    footage.times(leather.pricePerFt2),
    `${containers} ${noun} × ${one} ft² at ${leather.pricePerFt2} per ft²`,
  );
}

function addHardware(lines: LineWriter, input: RunInput, quantity: number): void {
  for (const { name, unitPrice, perPiece } of input.hardware) {
    const count = perPiece * quantity;
    const workings = `${perPiece} per piece × ${quantity} at ${unitPrice}`;
    lines.add('hardware', name, new Exact(unitPrice).times(count), workings);
  }
}

function addTime(lines: LineWriter, input: RunInput, bench: DecimalText): void {
  const { wagePerHour, deskMinutesPerOrder: desk } = input;
  const wages = (minutes: DecimalText) => new Exact(minutes).times(wagePerHour).div(60);
  const workings = (minutes: DecimalText) =>
    `${toAtMost(new Exact(minutes), 1)} minutes at ${wagePerHour} per hour`;
  lines.add('wages', 'Bench hours', wages(bench), workings(bench));
  lines.add('desk', 'Desk time', wages(desk), workings(desk));
}
