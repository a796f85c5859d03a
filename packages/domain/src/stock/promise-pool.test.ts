import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import {
  type Dated,
  drawFor,
  enoughFrom,
  freeBy,
  overPromisedBy,
  type PromisePool,
  servePromises,
} from './promise-pool.ts';

const dayAt = (days: number) => `2026-12-${String(days).padStart(2, '0')}`;
const dated = fc.array(
  fc.record({
    day: fc.integer({ min: 1, max: 20 }).map(dayAt),
    quantity: fc.integer({ min: 1, max: 60 }),
  }),
  { maxLength: 5 },
);
const pools = fc.record({
  free: fc.integer({ min: 0, max: 90 }),
  receipts: dated,
  promised: dated,
});
const days = fc.integer({ min: 1, max: 20 }).map(dayAt);

/** What is there at the end of a day when everything goes as promised. */
const thereOn = ({ free, receipts, promised }: PromisePool, day: string) => {
  const upTo = (all: readonly Dated[]) =>
    all.reduce((sum, each) => (each.day <= day ? sum + each.quantity : sum), 0);
  return free + upTo(receipts) - upTo(promised);
};
const allDays = Array.from({ length: 20 }, (_, at) => dayAt(at + 1));

describe('freeBy', () => {
  it('is the least that will be there from that day on', () => {
    fc.assert(
      fc.property(pools, days, (pool, day) => {
        const least = Math.min(
          ...allDays.filter((each) => each >= day).map((each) => thereOn(pool, each)),
        );
        expect(freeBy(pool, day)).toBe(Math.max(0, least));
      }),
    );
  });

  it('counts nothing that is yet to come as free now', () => {
    const pool = { free: 5, receipts: [{ day: dayAt(1), quantity: 40 }], promised: [] };
    expect(freeBy(pool, null)).toBe(5);
    expect(freeBy(pool, dayAt(1))).toBe(45);
  });

  it('keeps what a later promise needs', () => {
    const pool = {
      free: 50,
      receipts: [{ day: dayAt(8), quantity: 20 }],
      promised: [{ day: dayAt(10), quantity: 60 }],
    };
    expect([freeBy(pool, null), freeBy(pool, dayAt(8))]).toEqual([10, 10]);
    expect(enoughFrom(pool, 10, dayAt(1))).toBe(dayAt(1));
    expect(enoughFrom(pool, 11, dayAt(1))).toBeNull();
  });
});

describe('overPromisedBy', () => {
  it('is what must come by that day before anything is free, and nothing more', () => {
    fc.assert(
      fc.property(pools, days, fc.integer({ min: 1, max: 60 }), (pool, day, quantity) => {
        const over = overPromisedBy(pool, day);
        fc.pre(over > 0);
        const bought = (more: number) => ({
          ...pool,
          receipts: [...pool.receipts, { day, quantity: more }],
        });
        expect(freeBy(bought(over + quantity), day)).toBe(quantity);
        expect(freeBy(servePromises(pool, over), day)).toBe(0);
        expect(overPromisedBy(servePromises(pool, over), day)).toBe(0);
      }),
    );
  });

  it('counts everything on order where no day is known', () => {
    const pool = {
      free: 10,
      receipts: [{ day: dayAt(9), quantity: 20 }],
      promised: [{ day: dayAt(2), quantity: 45 }],
    };
    expect([overPromisedBy(pool, dayAt(2)), overPromisedBy(pool, null)]).toEqual([35, 15]);
  });
});

describe('drawFor', () => {
  it('takes what is free, then what comes later, and names what is lacking', () => {
    const pool = {
      free: 30,
      receipts: [
        { day: dayAt(4), quantity: 20 },
        { day: dayAt(12), quantity: 25 },
      ],
      promised: [],
    };
    expect(drawFor(pool, dayAt(7), 90)).toMatchObject({
      now: 30,
      inTime: 50,
      later: [{ day: dayAt(12), quantity: 25 }],
      lacking: 15,
    });
  });

  it('gives nothing out twice: all promises together stay within what is there and comes', () => {
    fc.assert(
      fc.property(
        pools,
        fc.array(fc.tuple(days, fc.integer({ min: 0, max: 80 })), { maxLength: 5 }),
        (pool, asked) => {
          fc.pre(allDays.every((day) => thereOn(pool, day) >= 0));
          let left: PromisePool = pool;
          for (const [day, quantity] of asked) {
            const drawn = drawFor(left, day, quantity);
            const later = drawn.later.reduce((sum, each) => sum + each.quantity, 0);
            expect(drawn.inTime + later + drawn.lacking).toBe(quantity);
            left = drawn.left;
            expect(allDays.every((each) => thereOn(left, each) >= 0)).toBe(true);
          }
        },
      ),
    );
  });

  it('never gives less when more is there', () => {
    fc.assert(
      fc.property(pools, days, fc.nat(100), fc.nat(50), (pool, day, quantity, more) => {
        const before = drawFor(pool, day, quantity);
        const after = drawFor({ ...pool, free: pool.free + more }, day, quantity);
        expect(after.inTime).toBeGreaterThanOrEqual(before.inTime);
        expect(after.lacking).toBeLessThanOrEqual(before.lacking);
      }),
    );
  });
});
