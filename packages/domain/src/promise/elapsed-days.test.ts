import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { earliestDay, shortByPromise } from './bench-plan.ts';
import type { Bench, WorkPart } from './bench-time.ts';
import { doneBy, doneOn } from './elapsed-days.ts';
import { planDays } from './plan-days.ts';

/** Tuesday; 6 hours a day. */
const bench: Bench = { today: '2026-12-01', perDay: 36_000, loggedToday: 0 };
const hours = (count: number) => count * 6_000;
const part = (work: number, wait = 0): WorkPart => ({
  minutes: hours(work),
  waitAfter: hours(wait),
});

describe('doneOn', () => {
  it('lets a short wait pass within the day', () => {
    expect(doneOn(bench, [part(2, 1), part(3)], '2026-12-01')).toBe('2026-12-01');
    expect(doneOn(bench, [part(2, 1), part(4)], '2026-12-01')).toBe('2026-12-02');
  });

  it('lets a long wait pass through the night, and through a weekend', () => {
    expect(doneOn(bench, [part(5, 16), part(1)], '2026-12-01')).toBe('2026-12-02');
    expect(doneOn(bench, [part(1, 72), part(1)], '2026-12-01')).toBe('2026-12-04');
    expect(doneOn(bench, [part(5, 24), part(1)], '2026-12-04')).toBe('2026-12-07');
    expect(doneOn(bench, [part(1), part(1, 24)], '2026-12-04')).toBe('2026-12-07');
  });

  it('begins on the first day with hours, not before the bench stands', () => {
    expect(doneOn(bench, [part(1)], '2026-12-05')).toBe('2026-12-07');
    expect(doneOn(bench, [part(1)], '2026-11-01')).toBe('2026-12-01');
    expect(doneOn({ ...bench, perDay: 0 }, [part(1)], '2026-12-01')).toBeNull();
  });

  it('takes at least the bench minutes and the waits, and a longer wait never ends sooner', () => {
    const parts = fc.array(
      fc.record({
        minutes: fc.integer({ min: 0, max: 60_000 }),
        waitAfter: fc.integer({ min: 0, max: 300_000 }),
      }),
      { minLength: 1, maxLength: 5 },
    );
    fc.assert(
      fc.property(parts, fc.integer({ min: 0, max: 300_000 }), (all, more) => {
        const end = doneOn(bench, all, bench.today) as string;
        const elapsed = all.reduce((sum, each) => sum + each.minutes + each.waitAfter, 0);
        const days = (Date.parse(end) - Date.parse(bench.today)) / 86_400_000 + 1;
        expect(days * 144_000).toBeGreaterThanOrEqual(elapsed);
        const longer = all.map((each, at) =>
          at === 0 ? { ...each, waitAfter: each.waitAfter + more } : each,
        );
        expect((doneOn(bench, longer, bench.today) as string) >= end).toBe(true);
      }),
    );
  });
});

describe('promises with waits', () => {
  const dyed = [part(2, 72), part(1)];
  const held = { jobId: 1, remaining: hours(3), parts: dyed };

  it('are not given for a day before the pieces are dry', () => {
    expect(earliestDay(bench, [], hours(3))).toBe('2026-12-01');
    expect(earliestDay(bench, [], hours(3), { parts: dyed })).toBe('2026-12-04');
    expect(earliestDay(bench, [], hours(3), { parts: dyed, from: '2026-12-02' })).toBe(
      '2026-12-07',
    );
  });

  it('name the job that its waits make late, and what is left undone', () => {
    expect(shortByPromise(bench, [{ ...held, promisedOn: '2026-12-03' }])).toEqual([
      { jobId: 1, short: hours(1) },
    ]);
    expect(shortByPromise(bench, [{ ...held, promisedOn: '2026-12-04' }])).toEqual([]);
    const drying = { jobId: 1, remaining: hours(1), parts: [part(1, 24)] };
    expect(shortByPromise(bench, [{ ...drying, promisedOn: '2026-12-01' }])).toEqual([
      { jobId: 1, short: 0 },
    ]);
    expect(doneBy(bench, dyed, '2026-12-03')).toBe(hours(2));
  });

  it('let other work go on while pieces lie, and come back to the earlier promise', () => {
    const days = planDays(
      bench,
      [
        { jobId: 1, promisedOn: '2026-12-02', remaining: hours(3), parts: [part(2, 1), part(1)] },
        { jobId: 2, promisedOn: '2026-12-09', remaining: hours(4) },
      ],
      '2026-12-02',
    );
    expect(days.map(({ shares }) => shares)).toEqual([
      [
        { jobId: 1, minutes: hours(3) },
        { jobId: 2, minutes: hours(3) },
      ],
      [{ jobId: 2, minutes: hours(1) }],
    ]);
  });

  it('leave the bench idle rather than take up what is not dry', () => {
    const days = planDays(bench, [{ ...held, promisedOn: '2026-12-04' }], '2026-12-04');
    expect(days.map(({ shares }) => shares.map(({ minutes }) => minutes))).toEqual([
      [hours(2)],
      [],
      [],
      [hours(1)],
    ]);
  });
});
