import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { bestBuy, type BuyOffer, priceReached } from './best-buy.ts';
import { offerFaults } from './supplier-offer.ts';

const offer = (id: number, rest: Partial<BuyOffer>): BuyOffer => ({
  id,
  leadDays: 7,
  preferred: false,
  minimum: null,
  multiple: null,
  breaks: [{ from: '1', price: '0.2' }],
  ...rest,
});

const ladder = [
  { from: '1', price: '0.20' },
  { from: '200', price: '0.15' },
];

describe('what buying really costs', () => {
  it('raises what is needed to whole packs, and says when the next break costs less', () => {
    const [best] = bestBuy({
      needed: '161',
      offers: [offer(1, { multiple: '2', breaks: ladder })],
    });
    expect(best).toMatchObject({
      plain: { quantity: '162', price: '0.2', cost: '32.40' },
      next: { quantity: '200', cost: '30.00', more: '38', dearerBy: '-2.40', worth: 'costs less' },
      best: { quantity: '200', cost: '30.00' },
    });
  });

  it.each([
    ['150', '0.00', 'little more'],
    ['145', '1.00', 'little more'],
    ['140', '2.00', 'no'],
  ])('going from %s to the next break costs %s more: %s', (needed, dearerBy, worth) => {
    const [best] = bestBuy({ needed, offers: [offer(1, { breaks: ladder })] });
    expect(best?.next).toMatchObject({ dearerBy, worth });
  });

  it.each([
    ['0', '0.2'],
    ['199', '0.2'],
    ['200', '0.15'],
    ['5000', '0.15'],
  ])('%s reach the price of %s', (quantity, price) => {
    expect(priceReached(offer(1, { minimum: '500', breaks: ladder }), quantity)).toBe(price);
  });

  it('prices leather by the ft² for an area in mm²', () => {
    const [best] = bestBuy({
      needed: '2229672.96',
      pricedAmount: '92903.04',
      offers: [offer(1, { breaks: [{ from: '0', price: '9.5' }] })],
    });
    expect(best?.plain).toEqual({ quantity: '2229672.96', price: '9.5', cost: '228.00' });
  });

  it('puts the least dear first, then the preferred, then the quicker', () => {
    const offers = [
      offer(1, { leadDays: 9 }),
      offer(2, { leadDays: 3 }),
      offer(3, { preferred: true, leadDays: 20 }),
      offer(4, { breaks: [{ from: '1', price: '0.19' }] }),
    ];
    expect(bestBuy({ needed: '10', offers }).map(({ id }) => id)).toEqual([4, 3, 2, 1]);
  });

  it('finds what trying every quantity finds', () => {
    const anOffer = fc
      .record({
        multiple: fc.option(fc.integer({ min: 1, max: 12 }), { nil: null }),
        packs: fc.option(fc.integer({ min: 1, max: 6 }), { nil: null }),
        steps: fc.array(fc.tuple(fc.integer({ min: 1, max: 30 }), fc.integer({ max: 900 })), {
          minLength: 1,
          maxLength: 4,
        }),
      })
      .map(({ multiple, packs, steps }) => {
        let [from, cents] = [1, 5000];
        const breaks = steps.map(([step, drop], at) => {
          from = at === 0 ? 1 : from + step;
          cents -= Math.abs(drop) % 900;
          return { from: String(from), price: (cents / 10000).toFixed(4) };
        });
        const minimum = packs === null ? null : String(packs * (multiple ?? 1));
        return offer(1, { multiple: multiple === null ? null : String(multiple), minimum, breaks });
      });
    fc.assert(
      fc.property(anOffer, fc.integer({ min: 1, max: 150 }), (each, needed) => {
        const [found] = bestBuy({ needed: String(needed), offers: [each] });
        expect(found?.best.cost).toBe(cheapestByTrying(each, needed));
        expect(Number(found?.plain.quantity)).toBeGreaterThanOrEqual(needed);
        expect(Number(found?.best.cost)).toBeLessThanOrEqual(Number(found?.plain.cost));
      }),
    );
  });
});

/** In whole ten-thousandths, so that nothing is lost; rounded half up to cents. */
function cheapestByTrying({ minimum, multiple, breaks }: BuyOffer, needed: number): string {
  let least = Infinity;
  const last = Number(breaks.at(-1)?.from);
  for (let q = 1; q <= Math.max(needed, Number(minimum ?? 0), last) + 24; q += 1) {
    if (q < needed || q < Number(minimum ?? 0) || q % Number(multiple ?? 1) !== 0) continue;
    const price = breaks.filter(({ from }) => Number(from) <= q).at(-1)?.price ?? '0';
    least = Math.min(least, Math.floor((q * Math.round(Number(price) * 10000) + 50) / 100));
  }
  return (least / 100).toFixed(2);
}

describe('an offer', () => {
  const faults = (rest: Partial<BuyOffer>) => offerFaults(offer(1, rest));
  const line = (from: string, price: string) => ({ from, price });

  it.each([
    ['a falling ladder', { breaks: [line('1', '3'), line('5', '2')] }],
    ['the same price twice', { breaks: [line('1', '3'), line('5', '3')] }],
    ['a first break at the minimum', { minimum: '50', breaks: [line('50', '3')] }],
    ['a minimum of whole packs', { minimum: '150', multiple: '50' }],
  ])('is sound with %s', (_what, rest) => expect(faults(rest)).toEqual([]));

  it.each([
    [{ breaks: [] }, 'breaks', 'Give at least one price.'],
    [{ breaks: [line('5', '3'), line('2', '2')] }, 'breaks.1.from', 'Line 2 begins below line 1.'],
    [{ breaks: [line('1', '3'), line('1', '2')] }, 'breaks.1.from', 'Line 2 begins where line 1'],
    [{ breaks: [line('1', '3'), line('9', '4')] }, 'breaks.1.price', 'Line 2 costs more than'],
    [{ minimum: '70', multiple: '50' }, 'minimum', 'whole packs'],
    [{ breaks: [line('9', '3')], minimum: '5' }, 'breaks.0.from', 'Line 1 begins above the least'],
  ])('%j is refused at %s', (rest, field, said) => {
    expect(faults(rest)).toMatchObject([{ field, sentence: expect.stringContaining(said) }]);
  });
});
