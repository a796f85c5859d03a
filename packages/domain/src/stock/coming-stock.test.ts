import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { addDays } from '../promise/day.ts';
import { comingStock } from './coming-stock.ts';

const today = '2026-12-01';
const still = {
  ...{ free: 100, reserved: 0, receipts: [], promised: [], daily: 0, minimum: 0, today },
};

describe('how an item goes on', () => {
  it('runs out on the day on which the usual use is more than there is', () => {
    const { runsOutOn, belowMinimumOn, days } = comingStock({ ...still, daily: 10, minimum: 50 });
    expect(runsOutOn).toBe('2026-12-12');
    expect(belowMinimumOn).toBe('2026-12-07');
    expect(days[0]).toMatchObject({ day: '2026-12-07', goes: 60, left: 40 });
  });

  it('takes what is usually used from what is held and promised first', () => {
    const promised = [{ day: '2026-12-10', quantity: 30, paper: 'J-0001' }];
    const held = comingStock({ ...still, daily: 10, reserved: 40, promised });
    // 140 on hand, at 10 a day with what is promised in it, last 14 days.
    expect(held.runsOutOn).toBe(addDays(today, 15));
    expect(held.days.find(({ what }) => what.includes('J-0001'))).toBeDefined();
  });

  it('begins below its minimum where it is already', () => {
    expect(comingStock({ ...still, minimum: 101 }).belowMinimumOn).toBe(today);
    expect(comingStock(still)).toMatchObject({ runsOutOn: null, belowMinimumOn: null });
  });

  it('loses nothing between the rows', () => {
    const dated = fc.array(
      fc.record({
        day: fc.integer({ min: 0, max: 80 }).map((days) => addDays(today, days)),
        quantity: fc.integer({ min: 1, max: 500 }),
        paper: fc.constantFrom('P-1', 'P-2'),
      }),
      { maxLength: 5 },
    );
    const inputs = fc.record({
      free: fc.nat(900),
      reserved: fc.nat(200),
      daily: fc.double({ min: 0, max: 30, noNaN: true }),
      receipts: dated,
      promised: dated,
    });
    fc.assert(
      fc.property(inputs, (input) => {
        let left = input.free;
        for (const row of comingStock({ ...input, minimum: 0, today }).days) {
          left += row.comes - row.goes;
          expect(row.left).toBe(left);
        }
      }),
    );
  });
});
