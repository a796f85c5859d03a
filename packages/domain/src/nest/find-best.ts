import { nestFaults } from './nest-faults.ts';
import { Surroundings } from './layout-state.ts';
import type { NestPlacement, NestProblem, RegularPlan } from './problem.ts';
import { Room } from './room.ts';
import { searchMore } from './search-more.ts';
import { shapeOf } from './shape.ts';

export interface BestSearch {
  seedPlan: RegularPlan;
  /** how long to look, in tries to bring in one more piece; never by the clock */
  budget?: number;
  onProgress?: (share: number, pieces: number) => void;
  shouldStop?: () => boolean;
}

const usualBudget = 120;

/**
 * The best layout found anyhow: never fewer pieces (for a strip: never longer) than the regular
 * plan it starts from. The same problem and budget always give the same layout.
 */
export function findBest(problem: NestProblem, search: BestSearch): NestPlacement[] {
  const { container } = problem;
  const { seedPlan, budget = usualBudget } = search;
  const seed = seedPlan.placements;
  if (container.type === 'strip') return seed.slice(0, container.qty);
  if (seed.length === 0) return seed;
  const shape = shapeOf(problem.outline, problem.gap);
  const around = new Surroundings(new Room(problem, shape), shape, problem.gap);
  const found = searchMore(seed, around, { ...search, budget });
  return nestFaults(problem, found).length === 0 ? found : seed;
}
