import { centred } from './centred.ts';
import { checkNestProblem, fitsNowhere } from './check-problem.ts';
import { fullTurn } from './candidates.ts';
import { FreeLines } from './free-lines.ts';
import { nestFaults } from './nest-faults.ts';
import { patternsFor, planRegular } from './plan-regular.ts';
import { stripRows } from './plan-strip.ts';
import type { NestPlacement, NestProblem, RegularPlan } from './problem.ts';
import { ringBounds, turned } from './ring.ts';
import { Room } from './room.ts';
import { shapeOf } from './shape.ts';
import { type CutCell, CutCells } from './side-strip-cells.ts';

/** Which way the cuts run: along the side's x, or along its y. */
type CutWay = 'x' | 'y';

/** A side cut into strips, each laid in the same rows. */
export interface SideStripsPlan extends RegularPlan {
  way: CutWay;
  /** where the cuts cross the other axis, rising, in mm */
  cuts: number[];
}

/** First cuts tried for every repeat, and for what then gives most. */
const [firstTries, lastTries] = [12, 60];
/** So many of the repeats are looked at closely. */
const mostClose = 8;

/**
 * The most pieces from a side that is first cut into strips no wider than a press takes: parallel
 * cuts, all strips between two cuts as wide as whole rows ask for, the same rows in each. No piece
 * lies across a cut, and trim is kept from it as from the side's edge. The same problem always gives
 * the same plan; what does not fit gives none, and no cuts.
 * @param widestMm what the press takes, above 0
 * @throws InvalidInput naming what makes no sense · NotWorkable beyond 20,000 pieces
 */
export function planSideStrips(given: NestProblem, widestMm: number): SideStripsPlan {
  checkNestProblem(given);
  const whole = wayWhole(given, widestMm);
  if (whole) return { ...planRegular(given), way: whole, cuts: [] };
  const { problem, asGiven } = centred(given);
  const plan = planCentred(problem, widestMm);
  return { ...plan, placements: plan.placements.map(asGiven) };
}

/** The way that a side lies in the press as one strip; null where it is too wide both ways. */
function wayWhole({ container }: NestProblem, widestMm: number): CutWay | null {
  const { minX, maxX, minY, maxY } = ringBounds(
    container.type === 'polygon' ? [container.points] : [],
  );
  if (maxY - minY <= widestMm) return 'x';
  return maxX - minX <= widestMm ? 'y' : null;
}

function planCentred(problem: NestProblem, widestMm: number): SideStripsPlan {
  const shape = shapeOf(problem.outline, problem.gap);
  if (fitsNowhere(problem, shape)) return nothing;
  const patterns = problem.rotations === 'free' ? patternsFor(problem, shape) : [];
  const cells = new CutCells(problem, shape, patterns, widestMm);
  const tried = (['x', 'y'] as const).flatMap((way) => {
    const lying = lyingFor(problem, way);
    const room = new Room(lying, shape);
    const lines = new FreeLines((rot) => room.free(rot));
    const ground: Ground = { way, lines, widestMm, ...spanOf(lying) };
    return cells.for(lying.rotations).map((cell) => bestCut(ground, cell, firstTries));
  });
  const close = mostFirst(tried).slice(0, mostClose);
  const finer = close.map(({ ground, cell }) => bestCut(ground, cell, lastTries));
  for (const cut of mostFirst([...finer, ...close])) {
    if (cut.count === 0) break;
    const plan = planOf(cut);
    if (nestFaults(problem, plan.placements).length === 0) return plan;
  }
  return nothing;
}

const nothing: SideStripsPlan = {
  placements: [],
  rows: null,
  planeDensity: 0,
  cellAreaMm2: null,
  period: null,
  mmPerPiece: null,
  way: 'x',
  cuts: [],
};

/** The side turned so that the cuts run along x. */
function lyingFor(problem: NestProblem, way: CutWay): NestProblem {
  const { container, holes = [], rotations } = problem;
  if (way === 'x' || container.type !== 'polygon') return problem;
  return {
    ...problem,
    container: { type: 'polygon', points: turned(container.points, 90) },
    holes: holes.map((hole) => turned(hole, 90)),
    rotations: rotations === 'free' ? rotations : rotations.map((rot) => fullTurn(rot + 90)),
  };
}

/** A side with its cuts along x, and from where to where it reaches across them. */
interface Ground {
  way: CutWay;
  lines: FreeLines;
  widestMm: number;
  from: number;
  to: number;
}

function spanOf({ container }: NestProblem): { from: number; to: number } {
  const { minY, maxY } = ringBounds(container.type === 'polygon' ? [container.points] : []);
  return { from: minY, to: maxY };
}

interface Cut {
  ground: Ground;
  cell: CutCell;
  /** where the first strip would begin, at or before the side does */
  start: number;
  count: number;
}

/** Of equals the one with the widest strips: fewer cuts. */
const mostFirst = (cuts: readonly Cut[]): Cut[] =>
  [...cuts].sort((a, b) => b.count - a.count || b.cell.widthMm - a.cell.widthMm);

function bestCut(ground: Ground, cell: CutCell, tries: number): Cut {
  let best: Cut = { ground, cell, start: ground.from, count: 0 };
  for (let at = 0; at < tries; at += 1) {
    const start = tenth(ground.from - (at * cell.widthMm) / tries);
    let count = 0;
    for (const base of basesFrom(ground, cell, start))
      count += ground.lines.best(cell.cell, base).count;
    if (count > best.count) best = { ground, cell, start, count };
  }
  return best;
}

/** A cut is measured by hand: to a tenth of a millimetre. */
const tenth = (mm: number): number => Math.round(mm * 10) / 10;

/** Where the strips begin. */
function basesFrom({ to }: Ground, { widthMm }: CutCell, start: number): number[] {
  const count = Math.ceil((to - start) / widthMm);
  return Array.from({ length: count }, (_, at) => start + at * widthMm);
}

function planOf({ ground, cell, start }: Cut): SideStripsPlan {
  const { lines, way } = ground;
  const bases = basesFrom(ground, cell, start);
  const strips = bases.map((base) =>
    lines.placements(cell.cell, base, lines.best(cell.cell, base).u),
  );
  const placements = strips.flat();
  const rows = stripRows(cell.cell);
  return {
    ...nothing,
    placements: way === 'x' ? placements : placements.map(turnedBack),
    rows: way === 'x' ? rows : { ...rows, directionDeg: -90 },
    cellAreaMm2: (cell.widthMm * cell.cell.periodMm) / cell.cell.pieces.length,
    way,
    cuts: cutsBetween(ground, bases, strips),
  };
}

const turnedBack = ({ x, y, rot }: NestPlacement): NestPlacement => ({
  x: y,
  y: -x,
  rot: fullTurn(rot - 90),
});

/** Without a cut that would only part what gives nothing, where the strip beside it may be so wide. */
function cutsBetween(
  { from, to, widestMm }: Ground,
  bases: readonly number[],
  strips: readonly (readonly NestPlacement[])[],
): number[] {
  const cuts = bases.filter((base) => base > from && base < to);
  const givesNothing = (at: number) => strips.at(at)?.length === 0;
  const [first = to] = cuts.slice(1);
  if (cuts.length > 0 && first - from <= widestMm && givesNothing(0)) cuts.shift();
  const before = cuts.at(-2) ?? from;
  if (cuts.length > 0 && to - before <= widestMm && givesNothing(-1)) cuts.pop();
  return cuts;
}
