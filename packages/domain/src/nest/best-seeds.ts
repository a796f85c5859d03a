import { Candidates, fullTurn } from './candidates.ts';
import type { Pattern } from './dense-patterns.ts';
import { nearMisses } from './fit-more.ts';
import { panelPool } from './plan-panel.ts';
import type { NestPlacement, NestProblem } from './problem.ts';
import type { Room } from './room.ts';
import type { Shape } from './shape.ts';

/** Layouts of a panel to begin a search from. */
export interface PanelSeeds {
  /** sound, with as many pieces as the best regular layout or all but */
  sound: NestPlacement[][];
  /** with more pieces, some of which stick out of the panel by little */
  sticking: NestPlacement[][];
}

const [mostSound, mostSticking] = [6, 12];

export function panelSeeds(
  problem: NestProblem,
  shape: Shape,
  room: Room,
  patterns: readonly Pattern[],
): PanelSeeds {
  const candidates = new Candidates(room, shape.noFit, 2);
  const pool = panelPool(candidates, problem, shape, patterns);
  const sticking = nearMisses(candidates.most, shape, room, pool).map(
    ({ crystal, rot, search, phase }) => {
      const turns = crystal.members.map(({ turn }) => fullTurn(rot + turn));
      return search.placements(phase, turns);
    },
  );
  return {
    sound: candidates.runnersUp(mostSound).map((candidate) => candidates.placements(candidate)),
    sticking: sticking.slice(0, mostSticking),
  };
}
