import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { addDays, dayFromNumber, dayNumber, daysBetween, weekday } from './day.ts';
import { addWorkdays, isWorkday, workdaysBetween } from './workdays.ts';

const aDay = fc.integer({ min: -20_000, max: 60_000 }).map(dayFromNumber);

describe('days', { timeout: 60_000 }, () => {
  it('agree with the calendar of the language', () => {
    fc.assert(
      fc.property(fc.integer({ min: -200_000, max: 200_000 }), (number) => {
        const date = new Date(number * 86_400_000);
        fc.pre(date.getUTCFullYear() >= 1000);
        const day = date.toISOString().slice(0, 10);
        expect(dayFromNumber(number)).toBe(day);
        expect(dayNumber(day)).toBe(number);
        expect(weekday(day) % 7).toBe(date.getUTCDay());
      }),
    );
  });

  it.each([
    '2027-02-29',
    '2027-13-01',
    '2027-00-10',
    '2027-1-1',
    '27-01-01',
    '',
    '2027-01-32',
    '2027-01-01T00',
  ])('refuses %s', (day) => expect(() => dayNumber(day)).toThrow('year-month-day'));

  it('knows the leap days', () => {
    expect(addDays('2028-02-28', 1)).toBe('2028-02-29');
    expect(addDays('2100-02-28', 1)).toBe('2100-03-01');
    expect(daysBetween('2027-12-31', '2028-01-01')).toBe(1);
  });
});

describe('workdays', { timeout: 60_000 }, () => {
  it('skip weekends and days off', () => {
    expect(addWorkdays('2027-03-05', 1)).toBe('2027-03-08');
    expect(addWorkdays('2027-03-05', 1, ['2027-03-08'])).toBe('2027-03-09');
    expect(addWorkdays('2027-03-08', -1)).toBe('2027-03-05');
    expect(workdaysBetween('2027-03-05', '2027-03-08')).toBe(1);
    expect(workdaysBetween('2027-03-01', '2027-03-08')).toBe(5);
  });

  it('count back what was added', () => {
    fc.assert(
      fc.property(aDay, fc.integer({ min: 1, max: 300 }), (day, count) => {
        const later = addWorkdays(day, count);
        expect(isWorkday(later)).toBe(true);
        expect(workdaysBetween(day, later)).toBe(count);
        expect(workdaysBetween(later, day)).toBe(-count);
      }),
    );
  });
});
