import { allocate, invoiceTotals, round } from '@hidewright/domain';
import { describe, expect, it } from 'vitest';

describe('rounding', () => {
  // Half up (away from zero) and half even as in Python's decimal module (ROUND_HALF_UP,
  // ROUND_HALF_EVEN), recomputed; half even is roundTiesToEven of IEEE 754 (from memory).
  it.each([
    ['0.005', '0.01', '0.00'],
    ['0.015', '0.02', '0.02'],
    ['0.025', '0.03', '0.02'],
    ['0.035', '0.04', '0.04'],
    ['0.045', '0.05', '0.04'],
    ['1.005', '1.01', '1.00'],
    ['1.115', '1.12', '1.12'],
    ['2.675', '2.68', '2.68'],
    ['8.345', '8.35', '8.34'],
    ['10.125', '10.13', '10.12'],
    ['-0.005', '-0.01', '0.00'],
    ['-2.675', '-2.68', '-2.68'],
  ])('of %s gives %s half up and %s half even', (value, halfUp, halfEven) => {
    expect(round(value, 2, 'halfUp').toFixed(2)).toBe(halfUp);
    expect(round(value, 2, 'halfEven').toFixed(2)).toBe(halfEven);
  });
});

describe('allocation by largest remainder', () => {
  // Largest remainder (Hare quota), the usual textbook example of ten seats; from memory, recomputed.
  it('shares out ten seats', () => {
    const votes = [47_000, 16_000, 15_800, 12_000, 6_100, 3_100];
    expect(allocate('10', votes, 0)).toEqual(['5', '2', '1', '1', '1', '0']);
  });

  // Recomputed in exact fractions of a cent.
  it('shares out money to the cent', () => {
    expect(allocate('100.00', [1, 1, 1])).toEqual(['33.34', '33.33', '33.33']);
    expect(allocate('10.00', [3, 2, 2])).toEqual(['4.28', '2.86', '2.86']);
  });
});

describe('tax by rate', () => {
  // Example 8 of the EN 16931 examples in UBL (ConnectingEurope, eInvoicing-EN16931, v1.3.16, 2026):
  // ten lines at 21 %; tax rounded line by line would come to 190.88.
  it('is that of the official example with ten lines', () => {
    const amounts = [
      '140.80',
      '16.16',
      '167.64',
      '88.74',
      '36.75',
      '56.50',
      '83.34',
      '190.31',
      '64.21',
      '64.46',
    ];
    const lines = amounts.map((amount) => ({ amount, taxRatePercent: '21' }));
    expect(invoiceTotals(lines)).toEqual({
      net: '908.91',
      taxes: [{ ratePercent: '21', net: '908.91', tax: '190.87' }],
      tax: '190.87',
      total: '1099.78',
    });
    const lineByLine = lines.reduce((sum, line) => sum + Number(invoiceTotals([line]).tax), 0);
    expect(lineByLine).toBeCloseTo(190.88, 9);
  });

  // Example 1 of the same: 183.23 at 6 % and 46.37 at 21 %. The two rates' sums stand for its lines.
  it('is that of the official example with two rates', () => {
    const lines = [
      { amount: '46.37', taxRatePercent: '21' },
      { amount: '183.23', taxRatePercent: '6' },
    ];
    expect(invoiceTotals(lines)).toMatchObject({ net: '229.60', tax: '20.73', total: '250.33' });
    expect(invoiceTotals(lines).taxes.map(({ tax }) => tax)).toEqual(['10.99', '9.74']);
  });

  // Recomputed: the cent or two by which tax per line and tax per rate differ.
  it.each([
    [10, '0.33', '20', '0.66'],
    [7, '1.02', '19', '1.36'],
    [3, '9.99', '21', '6.29'],
    [25, '0.12', '6', '0.18'],
  ])('of %i lines of %s at %s %% is %s', (count, amount, taxRatePercent, tax) => {
    const lines = Array.from({ length: count }, () => ({ amount, taxRatePercent }));
    expect(invoiceTotals(lines).tax).toBe(tax);
  });
});
