import { usableArea } from './bounds.ts';
import { readNestCase } from './case-file.ts';
import { findBest } from './find-best.ts';
import { placed } from './placed.ts';
import { planRegular } from './plan-regular.ts';
import type { NestPlacement, NestProblem, RegularPlan, StripPeriod } from './problem.ts';
import { ringBounds, signedArea } from './ring.ts';

/** One line of the benchmark: the best layout found, and the regular one. */
export interface NestAnswer {
  id: string | null;
  placements: NestPlacement[];
  regular: { placements: NestPlacement[]; period?: StripPeriod };
  mmPerPiece?: number;
  /** share of the plane that the densest pattern covers */
  density: number;
  /** share of the container that the best layout covers */
  utilisation: number;
}

/** Answers one case as the benchmark's file writes it. @throws InvalidInput · NotWorkable */
export function answerNest(value: unknown): NestAnswer {
  const { id, problem } = readNestCase(value);
  const plan = planRegular(problem);
  return nestAnswer(id, problem, plan, findBest(problem, { seedPlan: plan }));
}

export function nestAnswer(
  id: string | null,
  problem: NestProblem,
  plan: RegularPlan,
  best: NestPlacement[],
): NestAnswer {
  const { placements, period, mmPerPiece, planeDensity } = plan;
  return {
    id,
    placements: best,
    regular: { placements, ...(period && { period }) },
    ...(mmPerPiece !== null && { mmPerPiece }),
    density: planeDensity,
    utilisation: utilisation(problem, best),
  };
}

function utilisation(problem: NestProblem, placements: readonly NestPlacement[]): number {
  const area = containerArea(problem, placements);
  return area > 0 ? (placements.length * Math.abs(signedArea(problem.outline))) / area : 0;
}

/** Without flaws and trim; of a strip, as far as the last piece reaches. */
function containerArea(problem: NestProblem, placements: readonly NestPlacement[]): number {
  const { container, outline } = problem;
  if (container.type !== 'strip') {
    return usableArea({ ...problem, trim: 0, flawClearance: 0 }, 0);
  }
  if (placements.length === 0) return 0;
  return container.width * ringBounds(placements.map((each) => placed(outline, each))).maxX;
}
