import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { freeUntil, shortByPromise } from './bench-plan.ts';
import type { Bench } from './bench-time.ts';
import { addDays } from './day.ts';
import type { HeldWork } from './held-work.ts';
import { movedPromise } from './moved-promise.ts';

/** Tuesday; 6 hours a day. */
const bench: Bench = { today: '2026-12-01', perDay: 36_000, loggedToday: 0 };
const held = (jobId: number, promisedOn: string, remaining: number): HeldWork => ({
  jobId,
  promisedOn,
  remaining,
});

describe('movedPromise', () => {
  it('says what of the job is left over on the new day, and by when all of it can be done', () => {
    const work = [held(1, '2026-12-02', 50_000), held(2, '2026-12-09', 40_000)];
    expect(movedPromise(bench, work, { jobId: 2, to: '2026-12-02' })).toEqual({
      short: 18_000,
      earliest: '2026-12-03',
      pushed: [],
    });
    expect(movedPromise(bench, work, { jobId: 2, to: '2026-12-03' }).short).toBeNull();
  });

  it('names another job that an earlier day makes late, and how much of it', () => {
    const work = [held(1, '2026-12-02', 50_000), held(2, '2026-12-09', 40_000)];
    expect(movedPromise(bench, work, { jobId: 2, to: '2026-12-01' })).toEqual({
      short: 4_000,
      earliest: '2026-12-03',
      pushed: [{ jobId: 1, short: 18_000 }],
    });
  });

  it('leaves out what was late before and is no later', () => {
    const work = [held(1, '2026-12-01', 50_000), held(2, '2026-12-09', 10_000)];
    expect(movedPromise(bench, work, { jobId: 2, to: '2026-12-08' }).pushed).toEqual([]);
  });

  it('keeps the waits of the job itself', () => {
    const parts = [
      { minutes: 6_000, waitAfter: 24 * 60 * 100 },
      { minutes: 6_000, waitAfter: 0 },
    ];
    const work = [{ ...held(1, '2026-12-09', 12_000), parts }];
    expect(movedPromise(bench, work, { jobId: 1, to: '2026-12-01' })).toMatchObject({
      short: 6_000,
      earliest: '2026-12-02',
    });
  });

  it('can keep any day where nothing is left to do', () =>
    expect(movedPromise(bench, [], { jobId: 7, to: '2026-12-01' })).toEqual({
      short: null,
      earliest: '2026-12-01',
      pushed: [],
    }));
});

describe('a moved promise', () => {
  const work = fc
    .array(
      fc.record({
        days: fc.integer({ min: 0, max: 20 }),
        remaining: fc.integer({ min: 1, max: 80_000 }),
      }),
      { minLength: 1, maxLength: 7 },
    )
    .map((all) =>
      all.map((each, at) => held(at + 1, addDays(bench.today, each.days), each.remaining)),
    );

  it('pushes nobody when it goes to a later day', () => {
    fc.assert(
      fc.property(work, fc.integer({ min: 0, max: 30 }), (all, later) => {
        const to = addDays(all[0]?.promisedOn ?? bench.today, later);
        expect(movedPromise(bench, all, { jobId: 1, to }).pushed).toEqual([]);
      }),
    );
  });

  it('breaks none where what is free by the new day holds it, and one where it does not', () => {
    fc.assert(
      fc.property(work, fc.integer({ min: 0, max: 20 }), (all, days) => {
        const [moved, ...others] = all;
        if (moved === undefined) return;
        fc.pre(shortByPromise(bench, others).length === 0);
        const to = addDays(bench.today, days);
        const answer = movedPromise(bench, all, { jobId: 1, to });
        const kept = answer.short === null && answer.pushed.length === 0;
        // What the day it has now breaks already is not the move's doing.
        fc.pre(shortByPromise(bench, all).length === 0);
        expect(kept).toBe(freeUntil(bench, others, to) >= moved.remaining);
      }),
    );
  });

  it('can be kept on the earliest day that it names', () => {
    fc.assert(
      fc.property(work, (all) => {
        const { earliest } = movedPromise(bench, all, { jobId: 1, to: bench.today });
        fc.pre(earliest !== null && shortByPromise(bench, all.slice(1)).length === 0);
        const answer = movedPromise(bench, all, { jobId: 1, to: earliest ?? '' });
        expect([answer.short, answer.pushed]).toEqual([null, []]);
      }),
    );
  });
});
