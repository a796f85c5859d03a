import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { earliestDay, freeUntil, latestStart, shortByPromise } from './bench-plan.ts';
import type { Bench } from './bench-time.ts';
import { addDays } from './day.ts';
import type { HeldWork } from './held-work.ts';
import { planDays } from './plan-days.ts';

/** Tuesday; 6 hours a day. */
const bench: Bench = { today: '2026-12-01', perDay: 36_000, loggedToday: 0 };
const held = (jobId: number, promisedOn: string, remaining: number): HeldWork => ({
  jobId,
  promisedOn,
  remaining,
});

describe('planDays', () => {
  it('fills each day with the earliest promise and rests at the weekend', () => {
    const days = planDays(
      bench,
      [held(2, '2026-12-09', 50_000), held(1, '2026-12-03', 40_000)],
      '2026-12-07',
    );
    expect(days.map(({ day, shares }) => [day, shares])).toEqual([
      ['2026-12-01', [{ jobId: 1, minutes: 36_000 }]],
      [
        '2026-12-02',
        [
          { jobId: 1, minutes: 4_000 },
          { jobId: 2, minutes: 32_000 },
        ],
      ],
      ['2026-12-03', [{ jobId: 2, minutes: 18_000 }]],
      ['2026-12-04', []],
      ['2026-12-05', []],
      ['2026-12-06', []],
      ['2026-12-07', []],
    ]);
    expect(days.map(({ capacity }) => capacity > 0)).toEqual([
      true,
      true,
      true,
      true,
      false,
      false,
      true,
    ]);
  });
});

describe('freeUntil', () => {
  it('gives what the days have less what is promised', () => {
    expect(freeUntil(bench, [], '2026-12-02')).toBe(72_000);
    expect(freeUntil(bench, [held(1, '2026-12-02', 30_000)], '2026-12-02')).toBe(42_000);
  });

  it('leaves room for a later promise that needs the days before', () => {
    expect(freeUntil(bench, [held(1, '2026-12-03', 100_000)], '2026-12-01')).toBe(8_000);
  });

  it('has nothing where the promises made already take more than there is', () => {
    expect(freeUntil(bench, [held(1, '2026-11-30', 40_000)], '2026-12-01')).toBe(0);
  });

  it('counts what was worked today', () => {
    expect(freeUntil({ ...bench, loggedToday: 36_500 }, [], '2026-12-01')).toBe(0);
  });
});

describe('shortByPromise', () => {
  it('names the work that cannot be done in time, and by how much', () => {
    const work = [
      held(1, '2026-12-01', 30_000),
      held(2, '2026-12-01', 10_000),
      held(3, '2026-12-04', 5_000),
    ];
    expect(shortByPromise(bench, work)).toEqual([{ jobId: 2, short: 4_000 }]);
  });
});

describe('earliestDay', () => {
  it('is the first working day by which it can be done', () => {
    expect(earliestDay(bench, [], 36_001)).toBe('2026-12-02');
    expect(earliestDay(bench, [held(1, '2026-12-04', 144_000)], 1)).toBe('2026-12-07');
  });

  it('is none where the shop has no hours', () =>
    expect(earliestDay({ ...bench, perDay: 0 }, [], 1)).toBeNull());
});

describe('a run that can begin only later', () => {
  it('has its own days alone, and what is promised before them is done before them', () => {
    expect(freeUntil(bench, [], '2026-12-04', '2026-12-03')).toBe(72_000);
    expect(freeUntil(bench, [held(1, '2026-12-04', 72_000)], '2026-12-04', '2026-12-03')).toBe(
      72_000,
    );
    expect(freeUntil(bench, [held(1, '2026-12-04', 80_000)], '2026-12-04', '2026-12-03')).toBe(
      64_000,
    );
    expect(earliestDay(bench, [], 36_001, { from: '2026-12-04' })).toBe('2026-12-07');
  });

  it('knows the last day on which it may begin', () => {
    const run = { minutes: 36_001, parts: [{ minutes: 36_001, waitAfter: 0 }], by: '2026-12-07' };
    expect(latestStart(bench, [], run)).toBe('2026-12-04');
    expect(latestStart(bench, [held(1, '2026-12-07', 150_000)], run)).toBeNull();
  });

  it('is in time on the last day, and not a day later', () => {
    const parts = fc.array(
      fc.record({
        minutes: fc.integer({ min: 1, max: 50_000 }),
        waitAfter: fc.constantFrom(0, 6_000, 200_000),
      }),
      { minLength: 1, maxLength: 4 },
    );
    fc.assert(
      fc.property(parts, fc.integer({ min: 0, max: 40 }), (all, days) => {
        const minutes = all.reduce((sum, part) => sum + part.minutes, 0);
        const by = addDays(bench.today, days);
        const start = latestStart(bench, [], { minutes, parts: all, by });
        const endOf = (from: string) =>
          earliestDay(bench, [], minutes, { from, parts: all }) ?? '9';
        if (start === null) expect(endOf(bench.today) > by).toBe(true);
        else {
          expect(freeUntil(bench, [], by, start)).toBeGreaterThanOrEqual(minutes);
          expect(endOf(addDays(start, 1)) > by || start === by).toBe(true);
        }
      }),
    );
  });
});

describe('promises', () => {
  const work = fc.array(
    fc.record({
      days: fc.integer({ min: 0, max: 20 }),
      remaining: fc.integer({ min: 0, max: 80_000 }),
    }),
    { maxLength: 8 },
  );
  const asHeld = (all: { days: number; remaining: number }[]) =>
    all.map(({ days, remaining }, at) => held(at + 1, addDays(bench.today, days), remaining));

  it('are all kept when a run takes no more than what is free, and one is broken when it takes more', () => {
    fc.assert(
      fc.property(work, fc.integer({ min: 0, max: 20 }), (all, days) => {
        const before = asHeld(all);
        fc.pre(shortByPromise(bench, before).length === 0);
        const by = addDays(bench.today, days);
        const free = freeUntil(bench, before, by);
        expect(shortByPromise(bench, [...before, held(99, by, free)])).toEqual([]);
        expect(shortByPromise(bench, [...before, held(99, by, free + 1)])).not.toEqual([]);
      }),
    );
  });

  it('lose no minute of the work laid over the days', () => {
    fc.assert(
      fc.property(work, (all) => {
        const laid = planDays(bench, asHeld(all), addDays(bench.today, 60)).flatMap(
          ({ shares }) => shares,
        );
        const sum = (numbers: number[]) => numbers.reduce((total, each) => total + each, 0);
        expect(sum(laid.map(({ minutes }) => minutes))).toBe(
          sum(all.map(({ remaining }) => remaining)),
        );
      }),
    );
  });
});
