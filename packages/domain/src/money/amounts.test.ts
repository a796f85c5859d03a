import { describe, expect, it } from 'vitest';
import { lineAmount, parseMoney, sumMoney } from './amounts.ts';
import { currencies, minorDigits } from './currencies.ts';

describe('parseMoney', () => {
  it('writes out all decimals of the currency', () => {
    expect(parseMoney('420', 2)).toBe('420.00');
    expect(parseMoney(' 4.2 ', 2)).toBe('4.20');
    expect(parseMoney('420', 0)).toBe('420');
    expect(parseMoney('-4.20', 2, { belowZero: true })).toBe('-4.20');
  });

  it.each(['NaN', 'Infinity', '-Infinity', '-0', '1e309', '1e2', '1.005', '', '1,000', '-1'])(
    '[S19] refuses %s',
    (text) => {
      expect(() => parseMoney(text, 2, { field: 'price' })).toThrow(
        expect.objectContaining({ field: 'price' }),
      );
    },
  );

  it('[S19] holds 2^53 - 1 minor units and not one more', () => {
    expect(parseMoney('90071992547409.91', 2)).toBe('90071992547409.91');
    expect(() => parseMoney('90071992547409.92', 2)).toThrow('larger than the books can hold');
    expect(parseMoney('9007199254740991', 0)).toBe('9007199254740991');
    expect(() => parseMoney('9007199254740992', 0)).toThrow('larger than the books can hold');
  });
});

describe('amounts of lines', () => {
  it('rounds a line once, half up', () => {
    expect(lineAmount(3, '0.335', 2)).toBe('1.01');
    expect(lineAmount('2.5', '0.01', 2)).toBe('0.03');
    expect(lineAmount(7, '12.5', 0)).toBe('88');
  });

  it('adds up exactly what floating point would not', () => {
    expect(sumMoney(['0.10', '0.20'], 2)).toBe('0.30');
    expect(sumMoney([], 2)).toBe('0.00');
  });
});

describe('currencies', () => {
  it('are in the order of their codes, each once', () => {
    const codes = currencies.map(({ code }) => code);
    expect([...new Set(codes)].sort()).toEqual(codes);
  });

  it('keep whole yen and hundredths of a forint', () => {
    expect([minorDigits('JPY'), minorDigits('HUF'), minorDigits('EUR')]).toEqual([0, 2, 2]);
    expect(() => minorDigits('XXX')).toThrow('Choose a currency from the list');
  });
});
