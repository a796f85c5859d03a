import { diagonals, emptyCells } from './rectangles-bound.ts';
import { areaOf, type Cut, cutsOf, type Ell, isBox } from './rectangles-cuts.ts';
import type { WholeSizes } from './rectangles-instance.ts';
import { blockCount, rowCuts } from './rectangles-rows.ts';
import { cuttingPlaces, fullRows, inOrder, snugly } from './rectangles-snug.ts';

/** What is known of an L: no more than `most` fit, and `found` do, by a cut or as one block. */
export interface Known {
  ell: Ell;
  area: number;
  most: number;
  found: number;
  cut: Cut | null;
}

/** A search through Ls of an instance; what it learns is kept for the next question. */
export interface Search {
  /** Null where not one piece fits. It is kept for one of two mirror images. */
  known: (ell: Ell) => Known | null;
  /** The L as far as pieces can reach, before it is mirrored. */
  snug: (ell: Ell) => Ell | null;
  /** Whether so many pieces fit; also false where so many cuts were looked at before it was known. */
  reaches: (known: Known, pieces: number, steps: number) => boolean;
}

/** How many Ls may be known before rows are no longer cut off them. */
const mostRowStates = 20_000;

/**
 * Asks of an L whether so many pieces fit, by cutting it in two and asking the same of both. Every
 * cut must leave room for the pieces by area and by colouring, which refuses nearly all of them.
 */
export function startSearch(sizes: WholeSizes): Search {
  const { width, height, long, short } = sizes;
  const largest = Math.max(width, height);
  const row = fullRows(largest, long, short);
  const places = cuttingPlaces(row);
  const bars = [long, short].filter((n) => n > 1 && n <= 100).map(diagonals);
  const all = new Map<number, Known>();
  let stepsLeft = 0;

  function known(ell: Ell): Known | null {
    const snug = snugly(ell, row);
    return snug && knownSnug(snug);
  }

  function knownSnug(snug: Ell): Known {
    const { width: a, height: b, armWidth: c, armHeight: d } = inOrder(snug);
    const key = ((a * (largest + 1) + b) * (largest + 1) + c) * (largest + 1) + d;
    let each = all.get(key);
    if (!each) {
      each = firstKnown(inOrder(snug));
      all.set(key, each);
      if (isBox(each.ell) && all.size < mostRowStates) cutRows(each);
    }
    return each;
  }

  const countByArea = (ell: Ell | null): number =>
    ell === null ? 0 : Math.floor(areaOf(ell) / (long * short));

  function firstKnown(ell: Ell): Known {
    const area = areaOf(ell);
    const byArea = countByArea(ell);
    const empty = byArea === 0 ? 0 : Math.max(0, ...bars.map((bar) => emptyCells(ell, bar)));
    const most = Math.floor((area - empty) / (long * short));
    return { ell, area, most, found: isBox(ell) ? blockCount(ell, sizes) : 0, cut: null };
  }

  /** A row off one side and the same again with what is left: good where many pieces fit. */
  function cutRows(each: Known): void {
    for (const cut of rowCuts(each.ell, sizes)) {
      if (each.found === each.most) return;
      const found = (known(cut[0].ell)?.found ?? 0) + (known(cut[1].ell)?.found ?? 0);
      if (found > each.found) Object.assign(each, { found, cut });
    }
  }

  function reaches(each: Known, pieces: number): boolean {
    if (pieces <= each.found) return true;
    if (pieces > each.most) return false;
    for (const cut of cutsOf(each.ell, places)) {
      stepsLeft -= 1;
      if (stepsLeft < 0) return false;
      if (!together(cut, pieces)) continue;
      each.found = pieces;
      each.cut = cut;
      return true;
    }
    each.most = pieces - 1;
    return false;
  }

  function together([a, b]: Cut, pieces: number): boolean {
    // By area alone first: most cuts end here, before anything is kept of their parts.
    const [snugA, snugB] = [snugly(a.ell, row), snugly(b.ell, row)];
    if (countByArea(snugA) + countByArea(snugB) < pieces) return false;
    const [one, other] = [snugA && knownSnug(snugA), snugB && knownSnug(snugB)];
    const mostOf = (each: Known | null) => each?.most ?? 0;
    // What each has at most shrinks while it is being asked.
    for (let share = mostOf(one); share >= 0 && share >= pieces - mostOf(other); share -= 1) {
      share = Math.min(share, mostOf(one));
      if (bothReach(one, share, other, pieces - share)) return true;
      if (stepsLeft < 0) return false;
    }
    return false;
  }

  /** The smaller one first, since it is sooner known. */
  function bothReach(a: Known | null, of: number, b: Known | null, others: number): boolean {
    const does = (each: Known | null, count: number) =>
      count <= 0 || (each !== null && reaches(each, count));
    return (a?.area ?? 0) < (b?.area ?? 0)
      ? does(a, of) && does(b, others)
      : does(b, others) && does(a, of);
  }

  return {
    known,
    snug: (ell) => snugly(ell, row),
    reaches: (each, pieces, steps) => {
      stepsLeft = steps;
      return reaches(each, pieces);
    },
  };
}
