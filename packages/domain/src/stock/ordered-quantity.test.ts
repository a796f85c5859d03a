import { describe, expect, it } from 'vitest';
import { judgeQuantity } from './ordered-quantity.ts';
import type { OfferTerms } from './supplier-offer.ts';

const rivets = (rest: Partial<OfferTerms> = {}): OfferTerms => ({
  minimum: null,
  multiple: '100',
  breaks: [
    { from: '1', price: '0.17' },
    { from: '1000', price: '0.14' },
  ],
  ...rest,
});

describe('a quantity held against what a supplier sells', () => {
  it('is left as it is where so much is sold and no break is near', () => {
    expect(judgeQuantity(rivets(), '300')).toEqual({ instead: null, nextBreak: null });
  });

  it.each([
    ['between two packs', rivets(), '320', { less: '300', more: '400', belowMinimum: false }],
    ['within the first pack', rivets(), '20', { less: null, more: '100', belowMinimum: false }],
    [
      'below the minimum',
      rivets({ minimum: '500' }),
      '320',
      { less: null, more: '500', belowMinimum: true },
    ],
    [
      'within the pack above the minimum',
      rivets({ minimum: '500' }),
      '520',
      { less: '500', more: '600', belowMinimum: false },
    ],
  ])('is sold otherwise %s', (_where, terms, quantity, instead) => {
    expect(judgeQuantity(terms, quantity).instead).toEqual(instead);
  });

  it('is held against the break from the pack that covers it', () => {
    const { instead, nextBreak } = judgeQuantity(rivets({ multiple: '50' }), '920');
    expect(instead).toMatchObject({ less: '900', more: '950' });
    expect(nextBreak).toMatchObject({
      plain: { quantity: '950', cost: '161.50' },
      more: { quantity: '1000', cost: '140.00' },
    });
  });

  it('is held against the break from the pack below where the pack above reaches it', () => {
    expect(judgeQuantity(rivets(), '950').nextBreak).toMatchObject({
      plain: { quantity: '900', cost: '153.00' },
      more: { quantity: '1000', cost: '140.00' },
    });
  });

  it('hears of no break where nobody said what it costs', () => {
    const breaks = ['1', '1000'].map((from) => ({ from, price: '0' }));
    expect(judgeQuantity(rivets({ breaks }), '950').nextBreak).toBeNull();
  });
});
