import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { choosePlate, dearerPaysFrom } from './plate-choice.ts';

const cheap = { metal: 'magnesium', price: '40.00', life: 10_000 };
const dear = { metal: 'brass', price: '300.00', life: 100_000 };

describe('choosePlate', () => {
  it('wears out the one in the slot first, for nothing', () => {
    const slot = { ...cheap, used: 9_500 };
    expect(choosePlate(500, [slot, dear])).toEqual({ metal: 'magnesium', cost: '0.00', plates: 0 });
    expect(choosePlate(501, [slot])).toEqual({ metal: 'magnesium', cost: '40.00', plates: 1 });
    expect(choosePlate(10_501, [slot])).toMatchObject({ plates: 2 });
  });

  it('prefers fewer plates at the same cost, then the one named first', () => {
    const twice = { metal: 'copper', price: '80.00', life: 20_000 };
    expect(choosePlate(20_000, [cheap, twice])).toMatchObject({ metal: 'copper', plates: 1 });
    expect(choosePlate(10, [{ ...cheap, metal: 'zinc' }, cheap])).toMatchObject({ metal: 'zinc' });
  });

  it('never costs more than any of the plates, nor less for more impressions', () => {
    const offer = fc.record({
      metal: fc.constantFrom('magnesium', 'copper', 'brass'),
      price: fc.integer({ min: 0, max: 90_000 }).map((cents) => (cents / 100).toFixed(2)),
      life: fc.integer({ min: 100, max: 100_000 }),
    });
    fc.assert(
      fc.property(
        fc.array(offer, { minLength: 1, maxLength: 5 }),
        fc.integer({ min: 1, max: 300_000 }),
        (plates, impressions) => {
          const cost = Number(choosePlate(impressions, plates).cost);
          for (const { price, life } of plates) {
            expect(cost).toBeLessThanOrEqual(Number(price) * Math.ceil(impressions / life) + 1e-6);
          }
          expect(Number(choosePlate(impressions + 500, plates).cost)).toBeGreaterThanOrEqual(cost);
        },
      ),
    );
  });

  it.each([
    ['impressions', 0, [cheap]],
    ['plates', 10, []],
    ['plates.0.life', 10, [{ ...cheap, life: 0 }]],
    ['plates.1.used', 10, [dear, { ...cheap, used: 10_000 }]],
    ['plates.0.price', 10, [{ ...cheap, price: '-1' }]],
  ])('refuses %s where it makes no sense', (field, impressions, plates) => {
    expect(() => choosePlate(impressions, plates)).toThrow(expect.objectContaining({ field }));
  });
});

describe('dearerPaysFrom', () => {
  it('is the first count at which the choice turns', () => {
    expect(dearerPaysFrom(cheap, dear)).toBe(70_001);
    expect(choosePlate(70_001, [cheap, dear]).metal).toBe('brass');
    expect(choosePlate(70_000, [cheap, dear]).metal).toBe('magnesium');
  });

  it('is never where the dearer one wears out before', () => {
    expect(dearerPaysFrom(cheap, { ...dear, life: 60_000 })).toBeNull();
  });
});
