import { describe, expect, it } from 'vitest';
import { readMixedNumber } from './mixed-number.ts';

describe('readMixedNumber', () => {
  it.each([
    ['24.75', '24.75'],
    ['24 3/4', '24.75'],
    ['24  3/4', '24.75'],
    ['24-3/4', '24.75'],
    ['24¾', '24.75'],
    ['24 ½', '24.5'],
    ['¾', '0.75'],
    ['5/8', '0.625'],
    [' 11 ', '11'],
    ['0', '0'],
  ])('reads %s as %s', (text, figure) => {
    expect(readMixedNumber(text)?.toFixed()).toBe(figure);
  });

  it.each([
    ...[
      '',
      '-1',
      '1/0',
      '0/0',
      '24 5/4',
      '24 4/4',
      '11/8',
      '24/3',
      '24.',
      '.5',
      '24³',
      '24,75',
      '4 3',
      '3/',
    ],
    ...['NaN', '1e3', '24 ¾ ¾', '4 3/8/2', 'eleven', '0x10', 'Infinity', '12345678'],
  ])('finds no number in "%s"', (text) => {
    expect(readMixedNumber(text)).toBeUndefined();
  });
});
