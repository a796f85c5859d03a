import { centred } from './centred.ts';
import { checkNestProblem, fitsNowhere } from './check-problem.ts';
import { areaPerPiece, type Crystal } from './crystal.ts';
import { densePatterns, type Pattern } from './dense-patterns.ts';
import { Surroundings } from './layout-state.ts';
import { nestFaults } from './nest-faults.ts';
import { panelCandidates } from './plan-panel.ts';
import { sideCandidates } from './plan-side.ts';
import { bestStripCell, repeated, stripRows } from './plan-strip.ts';
import type { NestProblem, RegularPlan, RowNumbers } from './problem.ts';
import { Room } from './room.ts';
import { mixNumbers, rowMixes, turnsToMix } from './row-mixes.ts';
import { basesOf, type Shape, shapeOf } from './shape.ts';

const nothing: RegularPlan = {
  placements: [],
  rows: null,
  planeDensity: 0,
  cellAreaMm2: null,
  period: null,
  mmPerPiece: null,
};

/**
 * The best layout in rows that a person can repeat by hand: on a panel or a side the most pieces,
 * of a strip the least length per piece. The same problem always gives the same plan; what does
 * not fit gives none. Every plan has been looked over by `nestFaults`.
 * @throws InvalidInput naming what makes no sense · NotWorkable beyond 20,000 pieces
 */
export function planRegular(given: NestProblem): RegularPlan {
  checkNestProblem(given);
  const { problem, asGiven } = centred(given);
  const plan = planCentred(problem);
  return { ...plan, placements: plan.placements.map(asGiven) };
}

function planCentred(problem: NestProblem): RegularPlan {
  const shape = shapeOf(problem.outline, problem.gap);
  if (fitsNowhere(problem, shape)) return nothing;
  const patterns = patternsFor(problem, shape);
  const planeDensity = densityOf(shape, patterns);
  if (problem.container.type === 'strip') {
    return { ...planStrip(problem, shape, patterns), planeDensity };
  }
  const patterned = bestPattern(problem, shape, patterns);
  return { ...nothing, ...mixedRows(problem, shape, patterned), planeDensity };
}

type Laid = Pick<RegularPlan, 'placements' | 'rows' | 'cellAreaMm2'>;

/** The best repeating pattern that passes a second look. */
function bestPattern(problem: NestProblem, shape: Shape, patterns: readonly Pattern[]): Laid {
  const isPanel = problem.container.type === 'rect' && !problem.holes?.length;
  const plan = isPanel ? panelCandidates : sideCandidates;
  const candidates = plan(problem, shape, new Room(problem, shape), patterns);
  for (const candidate of candidates.kept) {
    const placements = candidates.placements(candidate);
    if (nestFaults(problem, placements).length > 0) continue;
    const { crystal, rot } = candidate;
    return { placements, rows: rowNumbers(crystal, rot), cellAreaMm2: areaPerPiece(crystal) };
  }
  return { placements: [], rows: null, cellAreaMm2: null };
}

/** Rows of different kinds one above the other, where a panel gets more from them. */
function mixedRows(problem: NestProblem, shape: Shape, patterned: Laid): Laid {
  const { container, rotations, holes = [], gap } = problem;
  if (container.type !== 'rect' || rotations === 'free' || holes.length > 0) return patterned;
  const around = new Surroundings(new Room(problem, shape), shape, gap);
  const most = patterned.placements.length;
  const mix = rowMixes(problem, shape, around, turnsToMix(rotations, shape)).find(
    (layout) => layout.length > most && nestFaults(problem, layout).length === 0,
  );
  return mix ? { placements: mix, rows: mixNumbers(mix), cellAreaMm2: null } : patterned;
}

const effort = { seeds: 48, kept: 12 };
/** Strips use the dense patterns for their density alone. */
const stripEffort = { seeds: 40, kept: 5 };

/** Dense patterns of what may be turned how. */
export function patternsFor({ rotations, container }: NestProblem, shape: Shape): Pattern[] {
  const bases = basesOf(rotations, shape.symmetrical);
  const halfTurns = bases === null || bases.some((base) => base.halfTurns);
  const looked = container.type === 'strip' ? stripEffort : effort;
  return densePatterns(halfTurns ? shape.noFit : { ...shape.noFit, turned: null }, looked);
}

function planStrip(problem: NestProblem, shape: Shape, patterns: readonly Pattern[]): RegularPlan {
  const cell = bestStripCell(problem, shape, patterns);
  if (!cell) return nothing;
  const { container } = problem;
  const least = 2 * cell.pieces.length;
  const asked = container.type === 'strip' ? (container.qty ?? least) : least;
  const period = { mm: cell.periodMm, pieces: cell.pieces.length };
  return {
    placements: repeated(cell, problem, Math.max(asked, least)),
    rows: stripRows(cell),
    planeDensity: 0,
    cellAreaMm2: null,
    period,
    mmPerPiece: period.mm / period.pieces,
  };
}

const densityOf = ({ areaMm2 }: Shape, patterns: readonly Pattern[]): number =>
  patterns[0] ? areaMm2 / patterns[0].areaMm2 : 0;

function rowNumbers({ along, across, members }: Crystal, rot: number): RowNumbers {
  const pitchMm = Math.hypot(along.x, along.y);
  const second = members[1]?.at;
  const cross = (along.x * across.y - along.y * across.x) / pitchMm;
  const shift = second ?? across;
  return {
    pitchMm,
    rowStepMm: Math.abs(cross) / members.length,
    shiftMm: (along.x * shift.x + along.y * shift.y) / pitchMm,
    directionDeg: (Math.atan2(along.y, along.x) * 180) / Math.PI,
    rowTurns: members.map(({ turn }) => (rot + turn) % 360),
  };
}
