import type { Day } from '../promise/day.ts';
import { availableToPromise } from './available-to-promise.ts';

export interface Dated {
  day: Day;
  /** a whole number above 0 */
  quantity: number;
  /** the paper it comes with, such as P-0007 */
  paper?: string;
}

/** What of an item may still be promised: pieces, or thousandths of mm². */
export interface PromisePool {
  /** on hand and held for nobody, 0 or more */
  free: number;
  /** expected from suppliers */
  receipts: readonly Dated[];
  /** promised to other work and not held for it yet */
  promised: readonly Dated[];
}

/**
 * How much may be promised for a day without breaking a promise made before: the discrete
 * available-to-promise of now and of every receipt up to that day, together.
 * @param day null for now, before anything else comes
 */
export function freeBy(pool: PromisePool, day: Day | null): number {
  return Math.max(0, netBy(pool, day));
}

/**
 * How much more is promised than will be there from a day on: whatever is bought for that day goes to those promises
 * first. 0 where all of them can be kept.
 * @param day null for when everything on order has come
 */
export function overPromisedBy(pool: PromisePool, day: Day | null): number {
  return Math.max(0, -netBy(pool, day ?? lastDay(pool)));
}

const lastDay = ({ receipts, promised }: PromisePool): Day | null =>
  [...receipts, ...promised].reduce<Day | null>(
    (last, { day }) => (last === null || day > last ? day : last),
    null,
  );

/** Those who were promised first get so much of what is bought, and wait for nothing more of it. */
export function servePromises(pool: PromisePool, quantity: number): PromisePool {
  let left = quantity;
  const promised = [...pool.promised]
    .sort((a, b) => (a.day < b.day ? -1 : Number(a.day > b.day)))
    .map((each) => {
      const served = Math.min(left, each.quantity);
      left -= served;
      return { ...each, quantity: each.quantity - served };
    });
  return { ...pool, promised: promised.filter((each) => each.quantity > 0) };
}

/** The least that will be there from a day on, below 0 where more is promised. */
function netBy(pool: PromisePool, day: Day | null): number {
  const days = [...pool.receipts, ...pool.promised].map((each) => each.day);
  const periods = [null, ...[...new Set(days)].sort()];
  const available = availableToPromise({
    onHand: pool.free,
    receipts: periods.map((each) => sumOn(pool.receipts, each)),
    orders: periods.map((each) => sumOn(pool.promised, each)),
  });
  return periods.reduce(
    (sum, each, at) =>
      each === null || (day !== null && each <= day) ? sum + (available[at] ?? 0) : sum,
    0,
  );
}

const sumOn = (all: readonly Dated[], day: Day | null): number =>
  all.reduce((sum, each) => (each.day === day ? sum + each.quantity : sum), 0);

/** The first day on which so much may be promised, today where it may be now; null where it never may. */
export function enoughFrom(pool: PromisePool, quantity: number, today: Day): Day | null {
  if (freeBy(pool, null) >= quantity) return today;
  const days = [...new Set(pool.receipts.map(({ day }) => day))].sort();
  return days.find((day) => freeBy(pool, day) >= quantity) ?? null;
}

export interface Drawn {
  /** of what is wanted, free by the day */
  inTime: number;
  /** of that, free now */
  now: number;
  /** of what is wanted, to be had only on later days */
  later: Dated[];
  /** of what is wanted, neither on hand nor on order */
  lacking: number;
  /** what is left for others */
  left: PromisePool;
}

/**
 * Promises a quantity for a day, as far as there is any, and the rest from what comes later.
 * @param until nothing is drawn from what comes after this day; null for no such day
 */
export function drawFor(
  pool: PromisePool,
  day: Day,
  quantity: number,
  until: Day | null = null,
): Drawn {
  const inTime = Math.min(quantity, freeBy(pool, day));
  const now = Math.min(inTime, freeBy(pool, null));
  // What is on the shelf is held at once, so that nobody else counts on it.
  let left = promised({ ...pool, free: pool.free - now }, { day, quantity: inTime - now });
  let lacking = quantity - inTime;
  const later: Dated[] = [];
  for (const receipt of laterReceipts(pool, day, until)) {
    const more = { day: receipt, quantity: Math.min(lacking, freeBy(left, receipt)) };
    if (more.quantity === 0) continue;
    later.push(more);
    left = promised(left, more);
    lacking -= more.quantity;
  }
  return { inTime, now, later, lacking, left };
}

const laterReceipts = ({ receipts }: PromisePool, after: Day, until: Day | null): Day[] =>
  [...new Set(receipts.map(({ day }) => day))]
    .filter((day) => day > after && (until === null || day <= until))
    .sort();

function promised(pool: PromisePool, more: Dated): PromisePool {
  return more.quantity === 0 ? pool : { ...pool, promised: [...pool.promised, more] };
}
