import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { sumMoney } from './amounts.ts';
import { invoiceTotals } from './invoice-totals.ts';

const aLine = fc.record({
  amount: fc.integer({ min: -100_000, max: 1_000_000 }).map((cents) => sumMoney([text(cents)], 2)),
  taxRatePercent: fc.constantFrom(null, '0', '5', '5.0', '19', '21.00'),
});

function text(cents: number): string {
  const digits = String(Math.abs(cents)).padStart(3, '0');
  return `${cents < 0 ? '-' : ''}${digits.slice(0, -2)}.${digits.slice(-2)}`;
}

describe('invoiceTotals', () => {
  it('[I3] makes net, tax and total add up', () => {
    fc.assert(
      fc.property(fc.array(aLine), (lines) => {
        const totals = invoiceTotals(lines);
        expect(totals.net).toBe(
          sumMoney(
            lines.map(({ amount }) => amount),
            2,
          ),
        );
        expect(totals.tax).toBe(
          sumMoney(
            totals.taxes.map(({ tax }) => tax),
            2,
          ),
        );
        expect(totals.total).toBe(sumMoney([totals.net, totals.tax], 2));
      }),
    );
  });

  it('puts the same rate together however it is written, and leaves untaxed lines out of the tax', () => {
    const lines = [
      { amount: '10.00', taxRatePercent: '20' },
      { amount: '5.00', taxRatePercent: '20.0' },
      { amount: '3.00', taxRatePercent: '5' },
      { amount: '7.00', taxRatePercent: null },
    ];
    expect(invoiceTotals(lines)).toEqual({
      net: '25.00',
      taxes: [
        { ratePercent: '5', net: '3.00', tax: '0.15' },
        { ratePercent: '20', net: '15.00', tax: '3.00' },
      ],
      tax: '3.15',
      total: '28.15',
    });
  });

  it('gives a credit note the same totals with the other sign', () => {
    const line = (amount: string) => [{ amount, taxRatePercent: '19' }];
    expect(invoiceTotals(line('-0.50')).tax).toBe('-0.10');
    expect(invoiceTotals(line('0.50')).tax).toBe('0.10');
  });

  it('refuses an amount with too many decimals and a rate below zero', () => {
    expect(() => invoiceTotals([{ amount: '1.005', taxRatePercent: null }])).toThrow(
      'lines.0.amount',
    );
    expect(() => invoiceTotals([{ amount: '1.00', taxRatePercent: '-1' }])).toThrow('0 or more');
  });
});
