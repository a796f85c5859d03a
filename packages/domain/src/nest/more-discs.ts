import { type DiscBox, type Middles, pushApart, within } from './disc-box.ts';

/** Spots looked at for the next disc. */
const spots = 200;
/** By so much of their distance discs are shaken at most. */
const jitter = 0.12;
/** After so many tries in vain it begins again. */
const patience = 40;
/** Up to so many discs find their way from anywhere. */
const fewEnough = 40;

/**
 * Brings more equal discs into a box: one is put where it is least in the way, all are pushed apart,
 * and where they do not come free the most crowded one is tried elsewhere. Never fewer than before.
 * @param tries how often, for all discs together · @param shouldStop is told how many there are
 */
export function moreDiscs(
  start: Middles,
  box: DiscBox,
  tries: number,
  chance: () => number,
  shouldStop: (count: number) => boolean,
): Middles {
  let best = start;
  let crowded: Middles | null = null;
  let crowding = Infinity;
  let inVain = 0;
  for (let turn = 0; turn < tries && !shouldStop(best.x.length); turn += 1) {
    if (inVain === patience) [crowded, crowding, inVain] = [null, Infinity, 0];
    const tried: Middles = crowded
      ? shaken(crowded, box, chance, 1)
      : begun(best, box, chance, turn >= patience);
    const left = pushApart(tried, box);
    if (left === 0) {
      best = tried;
      [crowded, crowding, inVain] = [null, Infinity, 0];
      continue;
    }
    inVain = left < crowding ? 0 : inVain + 1;
    if (left < crowding || chance() < 0.05) [crowded, crowding] = [tried, left];
  }
  return best;
}

/** One disc more than there are: among them, or all of them anew where few enough may still find a way. */
function begun(best: Middles, box: DiscBox, chance: () => number, again: boolean): Middles {
  if (again && best.x.length < fewEnough) return scattered(best.x.length + 1, box, chance);
  return shaken(withDisc(best, emptiest(best, box, chance)), box, chance, 0);
}

function scattered(count: number, box: DiscBox, chance: () => number): Middles {
  return {
    x: Float64Array.from({ length: count }, () => box.width * chance()),
    y: Float64Array.from({ length: count }, () => box.height * chance()),
  };
}

function withDisc({ x, y }: Middles, at: { x: number; y: number }): Middles {
  return { x: Float64Array.of(...x, at.x), y: Float64Array.of(...y, at.y) };
}

/** All a little elsewhere, and so many of the most crowded ones somewhere quite else. */
function shaken(discs: Middles, box: DiscBox, chance: () => number, moved: number): Middles {
  const by = jitter * box.apart * chance();
  const shake = (value: number, most: number) => within(value + by * (2 * chance() - 1), most);
  const tried = {
    x: discs.x.map((value) => shake(value, box.width)),
    y: discs.y.map((value) => shake(value, box.height)),
  };
  for (let count = 0; count < moved; count += 1) {
    const at = mostCrowded(tried, box, chance);
    const to = emptiest(tried, box, chance, at);
    tried.x[at] = to.x;
    tried.y[at] = to.y;
  }
  return tried;
}

function mostCrowded(discs: Middles, box: DiscBox, chance: () => number): number {
  let [found, most] = [0, -1];
  for (let at = 0; at < discs.x.length; at += 1) {
    const here = { x: discs.x[at] as number, y: discs.y[at] as number };
    const crowd = crowdAt(discs, box, here, at) + 1e-3 * box.apart * chance();
    if (crowd > most) [found, most] = [at, crowd];
  }
  return found;
}

/** The spot of many where a disc is least in the way. */
function emptiest(
  discs: Middles,
  box: DiscBox,
  chance: () => number,
  except = -1,
): { x: number; y: number } {
  let best = { x: 0, y: 0 };
  let least = Infinity;
  for (let spot = 0; spot < spots; spot += 1) {
    const here = { x: box.width * chance(), y: box.height * chance() };
    const crowd = crowdAt(discs, box, here, except);
    if (crowd < least) [best, least] = [here, crowd];
  }
  return best;
}

/** By how much a disc here comes too close to the others. */
function crowdAt(
  { x, y }: Middles,
  { apart }: DiscBox,
  here: { x: number; y: number },
  except: number,
): number {
  let crowd = 0;
  for (let at = 0; at < x.length; at += 1) {
    if (at === except) continue;
    const dx = (x[at] as number) - here.x;
    const dy = (y[at] as number) - here.y;
    const square = dx * dx + dy * dy;
    if (square < apart * apart) crowd += apart - Math.sqrt(square);
  }
  return crowd;
}
