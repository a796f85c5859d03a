import { Decimal } from 'decimal.js';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { boughtVariances } from './bought-variances.ts';
import { timeVariances } from './time-variances.ts';

const sumOf = (parts: readonly string[]): string =>
  parts.reduce((sum, part) => sum.plus(part), new Decimal(0)).toFixed(2);
const hundredths = (most: number) =>
  fc.integer({ min: 0, max: most }).map((whole) => (whole / 100).toFixed(2));

describe('boughtVariances', () => {
  it('tells a dearer lot from leather that was wasted and pieces made beyond the order', () => {
    const said = { saidQuantity: 10, saidForMade: 11, wasQuantity: 12, saidPrice: 9.5 };
    const exact = Object.fromEntries(
      Object.entries(said).map(([name, value]) => [name, new Decimal(value)]),
    ) as Record<keyof typeof said, Decimal>;
    expect(boughtVariances({ ...exact, saidCost: '95.00', wasCost: '120.00' }, 2)).toEqual({
      price: '6.00',
      usage: '9.50',
      made: '9.50',
      other: '0.00',
      sum: '25.00',
    });
  });

  it('loses no cent', () => {
    const area = fc
      .integer({ min: 0, max: 10_000_000 })
      .map((mm2) => new Decimal(mm2).div('929.03'));
    const price = fc
      .integer({ min: 0, max: 300_000 })
      .map((whole) => new Decimal(whole).div(10_000));
    fc.assert(
      fc.property(
        area,
        area,
        area,
        price,
        hundredths(1_000_000),
        hundredths(1_000_000),
        (saidQuantity, saidForMade, wasQuantity, saidPrice, saidCost, wasCost) => {
          const bought = { saidQuantity, saidForMade, wasQuantity, saidPrice, saidCost, wasCost };
          const { sum, ...parts } = boughtVariances(bought, 2);
          expect(sumOf(Object.values(parts))).toBe(sum);
          expect(sum).toBe(new Decimal(wasCost).minus(saidCost).toFixed(2));
        },
      ),
    );
  });
});

describe('timeVariances', () => {
  it('tells slow work from more pieces and a higher wage', () => {
    const steps = [
      { said: '30', saidForMade: '33', was: '40' },
      { said: '60', saidForMade: '60', was: '54' },
    ];
    const wages = { saidWagePerHour: '20', wasWagePerHour: '21', saidCost: '30.00', places: 2 };
    expect(timeVariances({ steps, ...wages })).toEqual({
      steps: [
        { time: '2.33', made: '1.00', wage: '0.67' },
        { time: '-2.00', made: '0.00', wage: '0.90' },
      ],
      other: '0.00',
      sum: '2.90',
    });
  });

  it('rounds half a cent up where the wage per minute does not end', () => {
    const steps = [{ said: '0', saidForMade: '0', was: '3952.65' }];
    const wages = { saidWagePerHour: '0', wasWagePerHour: '74', saidCost: '0.00', places: 2 };
    expect(timeVariances({ steps, ...wages }).sum).toBe('4874.94');
  });

  it('loses no cent, and its sum is the wages that were less those that were said', () => {
    const step = fc.record({
      said: hundredths(100_000),
      saidForMade: hundredths(100_000),
      was: hundredths(100_000),
    });
    fc.assert(
      fc.property(
        fc.array(step, { minLength: 1, maxLength: 8 }),
        hundredths(10_000),
        hundredths(10_000),
        hundredths(1_000_000),
        (steps, saidWagePerHour, wasWagePerHour, saidCost) => {
          const input = { steps, saidWagePerHour, wasWagePerHour, saidCost, places: 2 };
          const found = timeVariances(input);
          const parts = found.steps.flatMap(({ time, made, wage }) => [time, made, wage]);
          expect(sumOf([...parts, found.other])).toBe(found.sum);
          const minutes = steps.reduce((sum, { was }) => sum.plus(was), new Decimal(0));
          const paid = minutes.times(wasWagePerHour).div(60).toFixed(2, Decimal.ROUND_HALF_UP);
          expect(found.sum).toBe(new Decimal(paid).minus(saidCost).toFixed(2));
        },
      ),
    );
  });
});
