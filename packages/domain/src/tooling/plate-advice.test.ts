import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { advisePlate, type PlateAdviceAsked } from './plate-advice.ts';

// Common practice, no source: a magnesium plate lasts some 10,000 strikes, a brass one some 100,000 at five to ten
// times the price.
const magnesium = { metal: 'magnesium', price: '46.00', life: 10_000 };
const brass = { metal: 'brass', price: '322.00', life: 100_000 };
const offers = [magnesium, brass];

const advise = (asked: Partial<PlateAdviceAsked>) =>
  advisePlate({ now: 500, repeats: 0, perRepeat: 0, left: 0, offers, ...asked });

describe('advisePlate', () => {
  it('takes the metal with the lowest price for a run of the usual size', () => {
    for (const now of [20, 500, 2000]) {
      const { leastNow, metals, lastsNow } = advise({ now });
      expect(leastNow).toEqual({ metal: 'magnesium', cost: '46.00', plates: 1 });
      expect(metals[0]?.now).toMatchObject({ changes: 0, firstChangeAfter: null });
      expect(lastsNow).toBe(false);
    }
  });

  it('buys nothing while the plate in the slot lasts', () => {
    const { leastNow, leastInAll, lastsNow, lastsInAll } = advise({
      left: 500,
      repeats: 1,
      perRepeat: 1,
    });
    expect([lastsNow, lastsInAll]).toEqual([true, false]);
    expect(leastNow).toBeNull();
    expect(leastInAll).toEqual({ metal: 'magnesium', cost: '46.00', plates: 1 });
  });

  it('says after how many strikes the one in the slot is replaced, and what that costs', () => {
    const { metals } = advise({ now: 12_000, left: 1_500 });
    expect(metals[0]?.now).toEqual({
      plates: 2,
      cost: '92.00',
      changes: 2,
      firstChangeAfter: 1_500,
    });
    expect(metals[1]?.now).toEqual({
      plates: 1,
      cost: '322.00',
      changes: 1,
      firstChangeAfter: 1_500,
    });
    expect(advise({ now: 25_000 }).metals[0]?.now).toMatchObject({
      changes: 2,
      firstChangeAfter: 10_000,
    });
  });

  it('turns to the dearer metal with the repeats, from the quantity it names', () => {
    const repeated = advise({ now: 2000, repeats: 40, perRepeat: 2000 });
    expect(repeated.leastNow?.metal).toBe('magnesium');
    expect(repeated.leastInAll).toEqual({ metal: 'brass', cost: '322.00', plates: 1 });
    expect(repeated.turns).toEqual([{ cheap: 'magnesium', dear: 'brass', from: 70_001 }]);
    expect(advise({ left: 1_500 }).turns[0]?.from).toBe(71_501);
    expect(advise({ offers: [brass, { ...magnesium, life: 20_000 }] }).turns).toEqual([
      { cheap: 'magnesium', dear: 'brass', from: null },
    ]);
  });

  it('has no metal to name where none is offered', () => {
    expect(advise({ offers: [] })).toMatchObject({ metals: [], leastNow: null, turns: [] });
  });

  it('buys as many as last and no more, and more life left never costs more', () => {
    const offer = fc.record({
      metal: fc.constantFrom('magnesium', 'copper', 'brass'),
      price: fc.integer({ min: 1, max: 90_000 }).map((cents) => (cents / 100).toFixed(2)),
      life: fc.integer({ min: 100, max: 100_000 }),
    });
    const run = fc.record({
      now: fc.integer({ min: 1, max: 50_000 }),
      repeats: fc.integer({ min: 0, max: 20 }),
      perRepeat: fc.integer({ min: 1, max: 20_000 }),
      left: fc.integer({ min: 0, max: 60_000 }),
      offers: fc.array(offer, { minLength: 1, maxLength: 4 }),
    });
    fc.assert(
      fc.property(run, (asked) => {
        const advice = advisePlate(asked);
        asked.offers.forEach(({ life }, at) => {
          for (const [impressions, when] of [
            [asked.now, 'now'],
            [advice.impressionsInAll, 'inAll'],
          ] as const) {
            const { plates, cost } = advice.metals[at]?.[when] ?? { plates: 0, cost: '0' };
            expect(asked.left + plates * life).toBeGreaterThanOrEqual(impressions);
            if (plates > 0) expect(asked.left + (plates - 1) * life).toBeLessThan(impressions);
            const chosen = when === 'now' ? advice.leastNow : advice.leastInAll;
            expect(Number(chosen?.cost ?? '0')).toBeLessThanOrEqual(Number(cost));
          }
        });
        const fresher = advisePlate({ ...asked, left: asked.left + 500 });
        expect(Number(fresher.leastInAll?.cost ?? '0')).toBeLessThanOrEqual(
          Number(advice.leastInAll?.cost ?? '0'),
        );
      }),
    );
  });

  it.each([
    ['now', { now: 0 }],
    ['now', { now: 1.5 }],
    ['repeats', { repeats: -1 }],
    ['perRepeat', { repeats: 2, perRepeat: 0 }],
    ['left', { left: Number.NaN }],
    ['offers.1.life', { offers: [magnesium, { ...brass, life: 0 }] }],
    ['offers.0.price', { offers: [{ ...magnesium, price: '-1' }] }],
  ])('refuses %s where it makes no sense', (field, asked) => {
    expect(() => advise(asked)).toThrow(expect.objectContaining({ field }));
  });
});
