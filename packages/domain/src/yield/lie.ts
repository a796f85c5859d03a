import type { Decimal } from 'decimal.js';
import { nestBounds, nestWastes } from '../nest/bounds.ts';
import { findBest } from '../nest/find-best.ts';
import { placed } from '../nest/placed.ts';
import { planRegular } from '../nest/plan-regular.ts';
import type { NestPlacement, NestProblem, RegularPlan } from '../nest/problem.ts';
import type { Ring } from '../outline/ring.ts';
import { outlineArea } from '../outline/measure.ts';
import { arrangement, inCuttingOrder } from './arrangement.ts';
import type { LayRules, Lie } from './layout.ts';
import { intoCorner } from './into-corner.ts';
import { largestOffcut, type Offcut } from './offcut.ts';
import { sharesOf } from './shares.ts';

/** Told now and then while the best is looked for, so that a person can watch and stop it. */
export interface Watch {
  onProgress?: (done: number, pieces: number) => void;
  shouldStop?: () => boolean;
}

interface Found {
  rows: RegularPlan;
  placements: readonly NestPlacement[];
  /** not in rows */
  anyhow: boolean;
}

/** Lays out in rows, and anyhow where that is asked for and gives more. */
export function layIn(rules: LayRules, area: Decimal, problem: NestProblem, watch: Watch): Lie {
  const rows = planRegular(problem);
  const best = rules.search === 'best' ? findBest(problem, { seedPlan: rows, ...watch }) : [];
  const anyhow = best.length > rows.placements.length;
  const placements = intoCorner(problem, anyhow ? best : rows.placements);
  return lieOf(rules, area, problem, { rows, placements, anyhow });
}

export function lieOf(
  { outline }: Pick<LayRules, 'outline'>,
  area: Decimal,
  problem: NestProblem,
  { rows, placements, anyhow }: Found,
): Lie {
  const numbers = anyhow ? null : rows.rows;
  const ordered = inCuttingOrder(placements, numbers?.directionDeg ?? 0);
  const wastes = anyhow ? null : nestWastes(problem, rows);
  return {
    by: anyhow ? 'best found' : 'rows',
    pieces: ordered.length,
    placements: ordered,
    ...arrangement(numbers, ordered),
    ...sharesOf(area, outlineArea(outline), ordered.length, wastes),
    offcut: offcutOf(problem, ordered),
    boundPieces: nestBounds(problem).pieces,
    piecesInRows: anyhow ? rows.placements.length : null,
  };
}

/** Smaller than this on a side, in mm, an offcut is not worth a place on the rack. Common practice, no source. */
const worthKeepingMm = 40;

function offcutOf(problem: NestProblem, placements: readonly NestPlacement[]): Offcut | null {
  const { container, outline, holes = [] } = problem;
  if (container.type === 'strip' || placements.length === 0) return null;
  const taken = placements.map((placement) => placed(outline, placement));
  return largestOffcut(edgeOf(container), [...taken, ...holes], worthKeepingMm);
}

function edgeOf(container: Exclude<NestProblem['container'], { type: 'strip' }>): Ring {
  if (container.type === 'polygon') return container.points;
  const { w, h } = container;
  return [
    { x: 0, y: 0 },
    { x: w, y: 0 },
    { x: w, y: h },
    { x: 0, y: h },
  ];
}
