import type { Day } from '../promise/day.ts';
import type { HardwareNeed, ItemStock, Sourcing } from './check-stock.ts';
import {
  type Dated,
  type Drawn,
  drawFor,
  enoughFrom,
  freeBy,
  overPromisedBy,
  type PromisePool,
  servePromises,
} from './promise-pool.ts';

/** How one need stands; quantities in pieces, or in thousandths of mm². */
export interface Standing {
  needed: number;
  /** of what is needed, free now */
  now: number;
  /** free by the day on which it is needed */
  free: number;
  short: number;
  /** the first day on which all of it can be there; null where nobody can tell */
  enoughOn: Day | null;
  /** what must be bought for that day, beside what is on order */
  buy: number;
  /** of that, what work promised before still lacks: it comes first, whoever buys */
  forOthers: number;
  /** of what must be bought, what a draft holds already */
  drafted: number;
  /** what comes from suppliers and is counted on */
  coming: Dated[];
}

export interface ItemFacts extends Standing {
  item: ItemStock;
  /** of what is needed, what is counted for pieces that fail and hardware that is spoiled */
  forLosses: number;
  /** what could be taken for the pieces that are short, and is offered for nothing else; nobody has decided it */
  couldStandIn: { name: string; quantity: number }[];
}

interface Asked {
  pool: PromisePool;
  buying: Sourcing;
  needed: number;
  /** when it is needed */
  day: Day;
  today: Day;
}

/**
 * Draws what is needed by a day. Where that is too little, waiting for what is on order is weighed against buying
 * more: whichever is here sooner, and nothing is bought that comes in time anyhow. What is bought serves promises made
 * before first, so it has to do for them as well.
 */
export function drawOrMend(asked: Asked): { standing: Standing; left: PromisePool } {
  const { pool, buying, needed, day, today } = asked;
  const comesOn = enoughFrom(pool, needed, today);
  const waits = comesOn !== null && (buying.arrivesOn === null || comesOn <= buying.arrivesOn);
  const drawn = drawFor(pool, day, needed, waits ? null : buying.arrivesOn);
  const inTime = drawn.inTime === needed;
  const forOthers = drawn.lacking === 0 ? 0 : overPromisedBy(pool, here(day, buying.arrivesOn));
  const buy = drawn.lacking + forOthers;
  const standing = {
    needed,
    now: drawn.now,
    free: freeBy(pool, day),
    short: needed - drawn.inTime,
    enoughOn: inTime || waits ? comesOn : buying.arrivesOn,
    buy,
    forOthers,
    drafted: Math.min(buy, buying.drafted),
    coming: comingWith(pool, drawn, day),
  };
  return { standing, left: servePromises(drawn.left, forOthers) };
}

/** When what is needed by a day and bought now can be had; null where nobody can tell. */
const here = (day: Day, arrivesOn: Day | null): Day | null =>
  arrivesOn !== null && arrivesOn < day ? day : arrivesOn;

/** The papers that bring what is drawn beyond what is free now. */
function comingWith({ receipts }: PromisePool, { now, inTime, later }: Drawn, day: Day): Dated[] {
  const until = later.at(-1)?.day ?? day;
  return inTime === now && later.length === 0 ? [] : receipts.filter((each) => each.day <= until);
}

export function drawItem(
  item: ItemStock,
  { quantity, ordered = quantity }: HardwareNeed,
  { day, today }: Pick<Asked, 'day' | 'today'>,
): { facts: ItemFacts; left: ItemStock } {
  const { pool, buying } = item;
  const { standing, left } = drawOrMend({ pool, buying, needed: quantity, day, today });
  const bought = item.fromCustomer ? { ...standing, buy: 0, forOthers: 0, drafted: 0 } : standing;
  return {
    facts: { ...bought, item, forLosses: quantity - ordered, couldStandIn: [] },
    left: { ...item, pool: left, buying: lessDrafted(buying, bought.drafted) },
  };
}

export const lessDrafted = (buying: Sourcing, used: number): Sourcing => ({
  ...buying,
  drafted: buying.drafted - used,
});
