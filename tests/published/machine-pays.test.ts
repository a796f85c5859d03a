import { machinePays } from '@hidewright/domain';
import { describe, expect, it } from 'vitest';

/** 100 minutes saved once a month, at so much an hour: 20 hours a year. */
const bought = (price: string, hourWorth: string, years: number, interestPercent: string) =>
  machinePays({
    price,
    hourWorth,
    years,
    interestPercent,
    minutesSavedPerRun: '100',
    runsPerMonth: '1',
    upkeepPerYear: '0',
  });

describe('whether a machine pays', () => {
  // OpenStax, Principles of Accounting 2, §11.4: the book's own answers come from four-digit tables
  // (68,400; 7,860; 16,640); these are exact, recomputed.
  it.each([
    ['200000', '2000', 10, '8', '68403.26'],
    ['50000', '500', 7, '5', '7863.73'],
    ['135000', '2000', 5, '10', '16631.47'],
  ])(
    'for %s that save 20 h a year at %s for %i years at %s %%',
    (price, hour, years, rate, worth) => {
      expect(bought(price, hour, years, rate).presentValue).toBe(worth);
    },
  );

  // The same, §11.2: 150,000 that bring 20,000 a year are back after 7.5 years.
  it('is back after 7.5 years', () => {
    expect(bought('150000', '1000', 10, '0').paybackMonths).toBe(90);
  });
});
