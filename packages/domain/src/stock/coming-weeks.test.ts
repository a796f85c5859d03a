import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { comingWeeks } from './coming-weeks.ts';

describe('comingWeeks', () => {
  it('tells the days on which something comes or goes, and the day it runs out', () => {
    const changes = [
      { day: '2026-12-09', quantity: -80, what: 'O-0012 Heron tags' },
      { day: '2026-12-08', quantity: 20, what: 'P-0007' },
      { day: '2026-11-20', quantity: -10, what: 'O-0003 Bookmarks' },
    ];
    expect(comingWeeks(60, changes, '2026-12-01')).toEqual({
      days: [
        { day: '2026-12-01', comes: 0, goes: 10, left: 50, what: ['O-0003 Bookmarks'] },
        { day: '2026-12-08', comes: 20, goes: 0, left: 70, what: ['P-0007'] },
        { day: '2026-12-09', comes: 0, goes: 80, left: -10, what: ['O-0012 Heron tags'] },
      ],
      runsOutOn: '2026-12-09',
    });
    expect(comingWeeks(60, [], '2026-12-01')).toEqual({ days: [], runsOutOn: null });
  });

  it('ends with what was there, what came and what went', () => {
    const changes = fc.array(
      fc.record({
        day: fc
          .integer({ min: 1, max: 28 })
          .map((day) => `2026-12-${String(day).padStart(2, '0')}`),
        quantity: fc.integer({ min: -50, max: 50 }),
        what: fc.constant(''),
      }),
    );
    fc.assert(
      fc.property(fc.nat(200), changes, (free, all) => {
        const { days } = comingWeeks(free, all, '2026-12-01');
        const end = all.reduce((sum, { quantity }) => sum + quantity, free);
        expect(days.at(-1)?.left ?? free).toBe(end);
      }),
    );
  });
});
