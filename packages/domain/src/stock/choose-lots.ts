/** A lot on the rack, and how many pieces of a pattern it still gives. */
export interface LotOffer {
  lotId: number;
  /** as it was noted; '' where nobody noted it */
  shade: string;
  /** 'YYYY-MM-DD' */
  receivedOn: string;
  pieces: number;
}

export interface LotChoice {
  lotId: number;
  pieces: number;
}

/**
 * Which lots to cut pieces from. On a reorder, those of the earlier lot's shade where they hold all of it; else one
 * lot that holds it all, the oldest such; else lots of one shade; else as few as possible, older ones first. Where
 * all together do not hold it, all of them.
 * @param likeShade the shade of the earlier lot; null where there is none
 */
export function chooseLots(
  lots: readonly LotOffer[],
  needed: number,
  likeShade: string | null = null,
): LotChoice[] {
  const oldestFirst = lots.filter(({ pieces }) => pieces > 0).sort(byAge);
  const chosen =
    fewest(ofShade(oldestFirst, likeShade), needed) ??
    oneLot(oldestFirst, needed) ??
    oneShade(oldestFirst, needed) ??
    fewest(oldestFirst, needed) ??
    oldestFirst;
  return takeInOrder(chosen, needed);
}

/** The shades that lie side by side in a choice, unnoted ones as ''; one or none where they do not mix. */
export function shadesOf(lots: readonly LotOffer[], chosen: readonly LotChoice[]): string[] {
  const taken = lots.filter(({ lotId }) => chosen.some((each) => each.lotId === lotId));
  return [...new Set(taken.map(({ shade }) => shade))];
}

const byAge = (a: LotOffer, b: LotOffer): number =>
  a.receivedOn.localeCompare(b.receivedOn) || a.lotId - b.lotId;

const ofShade = (lots: LotOffer[], shade: string | null): LotOffer[] =>
  shade === null || shade === '' ? [] : lots.filter((lot) => lot.shade === shade);

function oneLot(oldestFirst: LotOffer[], needed: number): LotOffer[] | null {
  const lot = oldestFirst.find(({ pieces }) => pieces >= needed);
  return lot === undefined ? null : [lot];
}

/** Lots whose shade nobody noted are not known to agree. */
function oneShade(oldestFirst: LotOffer[], needed: number): LotOffer[] | null {
  const shades = [...new Set(oldestFirst.map(({ shade }) => shade).filter(Boolean))];
  const ways = shades.flatMap((shade) => {
    const way = fewest(ofShade(oldestFirst, shade), needed);
    return way === null ? [] : [way];
  });
  return ways.sort((a, b) => a.length - b.length)[0] ?? null;
}

/** The oldest lot with which the fewest still do, then the next oldest, and so on; null where all do not hold it. */
function fewest(oldestFirst: LotOffer[], needed: number): LotOffer[] | null {
  let [left, count] = [needed, leastCount(oldestFirst, needed)];
  if (count === null || oldestFirst.length === 0) return null;
  const chosen: LotOffer[] = [];
  for (const [at, lot] of oldestFirst.entries()) {
    if (count === 0) break;
    const rest = left - lot.pieces;
    const younger = leastCount(oldestFirst.slice(at + 1), rest);
    if (younger === null || younger > count - 1) continue;
    chosen.push(lot);
    left = rest;
    count -= 1;
  }
  return chosen;
}

/** How many of the largest lots hold so many pieces; null where all together do not. */
function leastCount(lots: readonly LotOffer[], needed: number): number | null {
  const largestFirst = lots.map(({ pieces }) => pieces).sort((a, b) => b - a);
  let [left, count] = [needed, 0];
  for (const pieces of largestFirst) {
    if (left <= 0) break;
    left -= pieces;
    count += 1;
  }
  return left <= 0 ? count : null;
}

function takeInOrder(lots: readonly LotOffer[], needed: number): LotChoice[] {
  let left = needed;
  return lots.flatMap(({ lotId, pieces }) => {
    const take = Math.min(left, pieces);
    left -= take;
    return take > 0 ? [{ lotId, pieces: take }] : [];
  });
}
