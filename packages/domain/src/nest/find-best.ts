import { panelSeeds } from './best-seeds.ts';
import { nestBounds } from './bounds.ts';
import { centred } from './centred.ts';
import { discLayout } from './disc-layout.ts';
import { Surroundings } from './layout-state.ts';
import { nestFaults } from './nest-faults.ts';
import { patternsFor } from './plan-regular.ts';
import type { NestPlacement, NestProblem, RegularPlan } from './problem.ts';
import { rectangleLayout } from './rectangle-layout.ts';
import { Room } from './room.ts';
import { rowMixes, turnsToMix } from './row-mixes.ts';
import { searchMore } from './search-more.ts';
import { type Shape, shapeOf } from './shape.ts';
import { parted } from './squeeze.ts';

export interface BestSearch {
  seedPlan: RegularPlan;
  /** how long to look, in tries to bring in one more piece; never by the clock */
  budget?: number;
  onProgress?: (share: number, pieces: number) => void;
  shouldStop?: () => boolean;
}

const usualBudget = 200;
/** Layouts of more pieces are not parted as a whole. */
const mostParted = 60;

/**
 * The best layout found anyhow: never fewer pieces (for a strip: never longer) than the regular
 * plan it starts from. The same problem and budget always give the same layout.
 */
export function findBest(given: NestProblem, search: BestSearch): NestPlacement[] {
  const { container } = given;
  const { placements } = search.seedPlan;
  if (container.type === 'strip') return placements.slice(0, container.qty);
  const bound = nestBounds(given).pieces ?? Infinity;
  const packed = moreOf(placements, rectangleLayout(given), given);
  const discs = discLayout(given, packed, { ...search, bound });
  if (packed.length === 0 || discs) return moreOf(packed, discs, given);
  const { problem, asGiven, asCentred } = centred(given);
  return bestFrom(problem, packed.map(asCentred), search).map(asGiven);
}

/** Another way's layout, where it gives more and can be cut. */
function moreOf(
  placements: NestPlacement[],
  other: NestPlacement[] | null,
  problem: NestProblem,
): NestPlacement[] {
  if (other === null || other.length <= placements.length) return placements;
  return nestFaults(problem, other).length === 0 ? other : placements;
}

function bestFrom(
  problem: NestProblem,
  seed: NestPlacement[],
  search: BestSearch,
): NestPlacement[] {
  const { container, holes = [] } = problem;
  const shape = shapeOf(problem.outline, problem.gap);
  const room = new Room(problem, shape);
  const around = new Surroundings(room, shape, problem.gap);
  const rots = turnsOf(problem, shape, seed);
  const seeds =
    container.type === 'rect' && holes.length === 0
      ? panelLayouts(problem, shape, around, seed, rots)
      : [seed];
  const bound = nestBounds(problem).pieces ?? Infinity;
  const share = Math.ceil(triesFor(search, seed.length) / seeds.length);
  let best = seed;
  for (const layout of seeds) {
    const found = searchMore(layout, rots, around, { ...search, budget: share, bound });
    if (found.length > best.length && nestFaults(problem, found).length === 0) best = found;
  }
  return best;
}

/** Of very many pieces each try takes longer, so there are fewer. */
const triesFor = ({ budget = usualBudget }: BestSearch, pieces: number): number =>
  Math.ceil(budget * Math.min(1, 400 / pieces));

/** The turns that pieces are tried in. */
function turnsOf(
  { rotations }: NestProblem,
  shape: Shape,
  seed: readonly NestPlacement[],
): number[] {
  const used = [...new Set(seed.map(({ rot }) => rot))];
  const allowed =
    rotations === 'free' ? used.map((rot) => (rot + 90) % 360) : turnsToMix(rotations, shape);
  const others = allowed.filter((rot) => !shape.symmetrical || !used.includes((rot + 180) % 360));
  return [...new Set([...used, ...others])].slice(0, 8);
}

/** Where to begin on a panel: the best layouts of different kinds, with more pieces where that works. */
function panelLayouts(
  problem: NestProblem,
  shape: Shape,
  around: Surroundings,
  seed: NestPlacement[],
  rots: readonly number[],
): NestPlacement[][] {
  const { sound, sticking } = panelSeeds(problem, shape, around.room, patternsFor(problem, shape));
  const squeezed = sticking
    .filter((layout) => layout.length > seed.length && layout.length <= mostParted)
    .flatMap((layout) => {
      const inside = parted(layout, [], around);
      return inside ? [inside] : [];
    });
  const mixes = rowMixes(problem, shape, around, rots).filter(
    (layout) => nestFaults(problem, layout).length === 0,
  );
  return [...squeezed, ...mixes, seed, ...sound].sort((a, b) => b.length - a.length).slice(0, 5);
}
