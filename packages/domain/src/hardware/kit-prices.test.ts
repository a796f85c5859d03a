import { Decimal } from 'decimal.js';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { kitPrice, pricesInKit } from './kit-prices.ts';

const cap = { quantity: 1, unitPrice: '0.06' };
const post = { quantity: 1, unitPrice: '0.05' };

describe('the price of a kit', () => {
  it('is that of its parts', () => {
    expect(kitPrice([cap, post])).toBe('0.11');
    expect(kitPrice([cap, { quantity: 3, unitPrice: '0.0125' }])).toBe('0.0975');
  });

  it('is shared out where another was typed', () => {
    expect(pricesInKit('0.1', [cap, post])).toEqual(['0.0545', '0.0455']);
    const free = { quantity: 1, unitPrice: '0' };
    expect(pricesInKit('0.1', [free, free, free])).toEqual(['0.0334', '0.0333', '0.0333']);
    expect(pricesInKit('0', [cap, post])).toEqual(['0', '0']);
  });

  it('loses nothing where there is one of some part', () => {
    const part = fc.record({
      quantity: fc.integer({ min: 1, max: 4 }),
      unitPrice: fc.integer({ min: 1, max: 9999 }).map((n) => (n / 10000).toFixed(4)),
    });
    fc.assert(
      fc.property(
        fc.array(part, { minLength: 1, maxLength: 5 }),
        fc.integer({ min: 1000, max: 99999 }),
        (others, typed) => {
          const parts = [...others, { quantity: 1, unitPrice: '0.5' }];
          const text = (typed / 10000).toFixed(4);
          const sum = pricesInKit(text, parts).reduce(
            (total, price, at) => total.plus(new Decimal(price).times(parts[at]?.quantity ?? 0)),
            new Decimal(0),
          );
          expect(sum.toFixed(4)).toBe(text);
        },
      ),
    );
  });
});
