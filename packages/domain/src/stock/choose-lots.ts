import type { Decimal } from 'decimal.js';
import { type DecimalText, Exact, toAtMost } from '../numbers/decimal-text.ts';

export interface FreeLot {
  lotId: number;
  tag: string;
  freeAreaMm2: DecimalText;
  /** 'YYYY-MM-DD' */
  receivedOn: string;
}

export interface LotTake {
  lotId: number;
  tag: string;
  takeAreaMm2: DecimalText;
}

/**
 * Which lots to take an area from: one that holds it all, the oldest such; else as few as possible,
 * older ones first. Where all together do not hold it, all of them.
 */
export function chooseLots(lots: readonly FreeLot[], neededAreaMm2: DecimalText): LotTake[] {
  const oldestFirst = lots.filter((lot) => new Exact(lot.freeAreaMm2).gt(0)).sort(byAge);
  return takeInOrder(fewest(oldestFirst, new Exact(neededAreaMm2)), new Exact(neededAreaMm2));
}

const byAge = (a: FreeLot, b: FreeLot): number =>
  a.receivedOn.localeCompare(b.receivedOn) || a.lotId - b.lotId;

/** Takes the oldest lot with which the fewest still do, then the next oldest, and so on. */
function fewest(oldestFirst: FreeLot[], needed: Decimal): FreeLot[] {
  let left = needed;
  let count = leastCount(oldestFirst, needed);
  if (count === null) return oldestFirst;
  const chosen: FreeLot[] = [];
  oldestFirst.forEach((lot, at) => {
    if (count === null || count === 0) return;
    const rest = left.minus(lot.freeAreaMm2);
    const younger = leastCount(oldestFirst.slice(at + 1), rest);
    if (younger === null || younger > count - 1) return;
    chosen.push(lot);
    left = rest;
    count -= 1;
  });
  return chosen;
}

/** How many of the largest lots hold an area; null where all together do not. */
function leastCount(lots: readonly FreeLot[], needed: Decimal): number | null {
  const largestFirst = lots
    .map((lot) => new Exact(lot.freeAreaMm2))
    .sort((a, b) => b.comparedTo(a));
  let [left, count] = [needed, 0];
  for (const area of largestFirst) {
    if (left.lte(0)) break;
    left = left.minus(area);
    count += 1;
  }
  return left.lte(0) ? count : null;
}

function takeInOrder(lots: readonly FreeLot[], needed: Decimal): LotTake[] {
  let left = needed;
  return lots.flatMap(({ lotId, tag, freeAreaMm2 }) => {
    const take = left.lt(freeAreaMm2) ? left : new Exact(freeAreaMm2);
    left = left.minus(take);
    return take.gt(0) ? [{ lotId, tag, takeAreaMm2: toAtMost(take, 3) }] : [];
  });
}
