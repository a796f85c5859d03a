import {
  amountToBuy,
  type HardwareUnit,
  leatherToBuy,
  type Sourcing,
  type Standing,
  type ToBuy,
} from '@hidewright/domain';
import type { CheckedRun, CheckedRuns } from './checked-runs.ts';

/** What is lacking of one thing over all runs. */
export interface Lacking {
  of: 'leather' | 'hardware';
  id: number;
  name: string;
  unit: 'mm2' | HardwareUnit;
  buying: Sourcing;
  /** Beyond what is drafted already. */
  missing: number;
  drafted: number;
  runs: CheckedRun[];
  /** As its supplier sells it; null where nothing is missing. */
  toBuy: ToBuy | null;
}

/** Everything that runs were checked for, and what is lacking of it. */
export function lackingOf({ shop, runs }: CheckedRuns): Lacking[] {
  const leathers = shop.leathers.map((leather): Lacking => {
    const { leatherId: id, name, buying } = leather;
    const standings = runs.flatMap((run) => {
      const { leather: facts } = run.facts;
      return facts.leather.leatherId === id ? [{ run, standing: facts.standing }] : [];
    });
    const short = sumUp(standings);
    const toBuy = short.missing > 0 ? leatherToBuy(leather, short.missing) : null;
    return { of: 'leather', id, name, unit: 'mm2', buying, ...short, toBuy };
  });
  const items = shop.items.map((item): Lacking => {
    const { hardwareId: id, name, unit = 'piece', buying } = item;
    const standings = runs.flatMap((run) =>
      run.facts.items
        .filter((each) => each.item.hardwareId === id)
        .map((standing) => ({ run, standing })),
    );
    const short = sumUp(standings);
    const toBuy = short.missing > 0 ? amountToBuy(buying.terms, String(short.missing)) : null;
    return { of: 'hardware', id, name, unit, buying, ...short, toBuy };
  });
  return [...leathers, ...items];
}

function sumUp(all: readonly { run: CheckedRun; standing: Standing }[]) {
  const short = all.filter(({ standing }) => standing.buy > 0);
  const sum = (part: 'buy' | 'drafted') =>
    short.reduce((total, { standing }) => total + standing[part], 0);
  const drafted = sum('drafted');
  return {
    missing: sum('buy') - drafted,
    drafted,
    runs: [...new Set(short.map(({ run }) => run))],
  };
}
