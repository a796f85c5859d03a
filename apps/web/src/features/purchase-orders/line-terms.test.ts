import { MM2_PER_FT2 } from '@hidewright/domain';
import { Decimal } from 'decimal.js';
import { describe, expect, it } from 'vitest';
import { offeredPrice, priceToFill, termsText, type LineTerms } from './line-terms.ts';

const rivets: LineTerms = {
  ...{ unit: 'piece', minimum: '100', multiple: '50' },
  breaks: [
    { from: '100', price: '0.17' },
    { from: '500', price: '0.14' },
  ],
};
const loose: LineTerms = {
  ...{ unit: 'piece', minimum: null, multiple: null },
  breaks: [
    { from: '1', price: '0.17' },
    { from: '500', price: '0.14' },
  ],
};
const habit = { areaUnit: 'ft2' } as const;

describe('the price of a line', () => {
  it.each([
    ['', '0.17'],
    ['ten', '0.17'],
    [-5, '0.17'],
    [450, '0.17'],
    [500, '0.14'],
  ])('at “%s” is %s', (quantity, price) => expect(offeredPrice(rivets, quantity)).toBe(price));

  it.each([
    ['while the field is empty', { typed: '', before: undefined, offered: '0.14' }, '0.14'],
    [
      'in place of what was offered before',
      { typed: '0.170', before: '0.17', offered: '0.14' },
      '0.14',
    ],
    [
      'not over a price that was typed',
      { typed: '0.15', before: '0.17', offered: '0.14' },
      undefined,
    ],
    [
      'not over what a draft came with',
      { typed: '0.17', before: undefined, offered: '0.14' },
      undefined,
    ],
    ['not again', { typed: '0.14', before: '0.14', offered: '0.14' }, undefined],
  ])('is filled in %s', (_when, field, filled) => expect(priceToFill(field)).toBe(filled));
});

describe('what is said under a line', () => {
  it.each<[string, LineTerms, unknown, string]>([
    ['too few', rivets, 30, 'Sold from 100 in packs of 50: order 100.'],
    [
      'too few where there is no pack',
      { ...rivets, multiple: null },
      99,
      'Sold from 100: order 100.',
    ],
    ['no whole packs', rivets, 320, 'Sold in packs of 50: order 300 or 350.'],
    ['less than a pack', { ...loose, multiple: '50' }, 20, 'Sold in packs of 50: order 50.'],
    [
      'a break that costs less',
      rivets,
      450,
      'From 500 they cost 0.14 each: 500 cost 6.50 less than 450.',
    ],
    [
      'one that costs the same',
      {
        ...loose,
        breaks: [
          { from: '1', price: '0.2' },
          { from: '200', price: '0.15' },
        ],
      },
      150,
      'From 200 they cost 0.15 each: 200 cost the same as 150.',
    ],
    [
      'one that costs little more',
      loose,
      405,
      'From 500 they cost 0.14 each: 500 cost only 1.15 more than 405.',
    ],
    [
      'no whole packs, and a break that costs less',
      rivets,
      420,
      'Sold in packs of 50: order 400 or 450. From 500 they cost 0.14 each: 500 cost 6.50 less than 450.',
    ],
    [
      'a pack that reaches a break',
      { ...rivets, multiple: '100' },
      450,
      'Sold in packs of 100: order 400 or 500. From 500 they cost 0.14 each: 500 cost only 2.00 more than 400.',
    ],
    ['one that is far', rivets, 200, ''],
    ['the last one', rivets, 600, ''],
    ['nothing typed', rivets, '', ''],
    ['no number', rivets, 'some', ''],
  ])('of %s', (_what, terms, quantity, said) => {
    expect(termsText(terms, quantity, '', habit)).toBe(said);
  });

  it('is silent on breaks beside a price of their own, not on what is sold', () => {
    expect(termsText(rivets, 450, '0.17', habit)).not.toBe('');
    expect(termsText(rivets, 450, '0.16', habit)).toBe('');
    expect(termsText(rivets, 30, '0.16', habit)).not.toBe('');
  });

  it('speaks of leather by area and price per ft²', () => {
    const ft2 = (count: number) => new Decimal(MM2_PER_FT2).times(count).toFixed();
    const hides: LineTerms = {
      ...{ unit: 'mm2', minimum: ft2(20), multiple: null },
      breaks: [
        { from: '0', price: '9' },
        { from: ft2(250), price: '8.1' },
      ],
    };
    expect(termsText(hides, ft2(12.5), '9', habit)).toBe('Sold from 20 ft²: order 20 ft².');
    expect(termsText(hides, ft2(240), '9.00', habit)).toBe(
      'From 250 ft² it costs 8.10 per ft²: 250 ft² cost 135.00 less than 240 ft².',
    );
  });
});
