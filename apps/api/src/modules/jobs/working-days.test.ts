import fc from 'fast-check';
import { expect, it } from 'vitest';
import { addDays, countWorkingDays, daysBetween, isWorkingDay } from './working-days.ts';

it('counts across months, years and leap days', () => {
  expect(addDays('2027-12-31', 1)).toBe('2028-01-01');
  expect(addDays('2028-02-28', 1)).toBe('2028-02-29');
});

it('counts the same working days as one would on a calendar', () => {
  const start = fc.integer({ min: 0, max: 800 }).map((days) => addDays('2026-01-01', days));
  fc.assert(
    fc.property(start, fc.integer({ min: -3, max: 400 }), (first, days) => {
      const last = addDays(first, days);
      expect(countWorkingDays(first, last)).toBe(daysBetween(first, last).filter(isWorkingDay).length);
    }),
  );
});
