import { describe, expect, it } from 'vitest';
import { readWhole, unclearComma, withPoint } from './comma.ts';

describe('a comma', () => {
  it.each([
    ['1250', '1250'],
    [' 1,250 ', '1250'],
    ['12,345,678', '12345678'],
    ['12,5', undefined],
    ['1,2500', undefined],
    ['1250,000', undefined],
    ['1,25,000', undefined],
    ['1,', undefined],
    ['', undefined],
    ['-3', undefined],
  ])('in the count %j reads as %j', (text, whole) => {
    expect(readWhole(text)).toBe(whole);
  });

  it.each([
    ['24,75', '24.75'],
    ['0,125', '0.125'],
    ['1250,125', '1250.125'],
    ['1,2500', '1.2500'],
    ['1,250', '1,250'],
    ['999,000', '999,000'],
    ['1,250 mm', '1,250 mm'],
    ['24,75 mm', '24.75 mm'],
  ])('in the measure %j reads as %j', (text, plain) => {
    expect(withPoint(text)).toBe(plain);
  });

  it('that may mean either is said with both', () => {
    expect(unclearComma(' 1,250 ')).toBe('Write 1250 or 1.25: 1,250 may mean either.');
    expect(unclearComma('1,250 mm')).toBe('Write 1250 or 1.25: 1,250 may mean either.');
    expect(unclearComma('20,000')).toBe('Write 20000 or 20: 20,000 may mean either.');
    for (const clear of ['24,75', '0,125', '1250', '']) expect(unclearComma(clear)).toBeUndefined();
  });
});
