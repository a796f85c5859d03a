import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { itemUse } from './item-use.ts';
import { orderSuggestion, type OrderInput } from './order-suggestion.ts';

const unused = itemUse([]);
const steady = itemUse(Array.from({ length: 52 }, () => 70));

const rivets: OrderInput = {
  ...{ free: 250, promised: 0, onOrder: 0, drafted: 0, minimum: 300 },
  use: unused,
  lead: { meanDays: 7, sdDays: 0, deliveries: 0 },
  service: 0.95,
  orderCost: '10',
  holdingRate: 0.2,
  pricedAmount: '1',
  terms: { minimum: null, multiple: '100', breaks: [{ from: '0', price: '0.11' }] },
  byHand: { point: null, quantity: null },
};
const suggest = (change: Partial<OrderInput> = {}) => orderSuggestion({ ...rivets, ...change });

describe('what to order', () => {
  it('fills up to the minimum in whole packs where nothing is known of its use', () => {
    expect(suggest()).toMatchObject({
      ...{ state: 'now', position: 250, point: 300, pointBy: 'minimum', quantity: '100' },
      ...{ usualBy: 'need', workedOut: null, economic: null, dueInDays: null },
    });
    expect(suggest({ free: 20, promised: 60 })).toMatchObject({ position: -40, quantity: '400' });
  });

  it('is nothing at the minimum, and nothing where a draft has it', () => {
    expect(suggest({ free: 300 })).toMatchObject({ state: 'fine', quantity: '0' });
    expect(suggest({ onOrder: 50 })).toMatchObject({ state: 'fine', quantity: '0' });
    expect(suggest({ drafted: 50 })).toMatchObject({ state: 'drafted', quantity: '0' });
    expect(suggest({ drafted: 40 })).toMatchObject({ state: 'now', quantity: '100' });
  });

  it('leaves a break out of the reckoning that nobody reaches, as older offers may hold', () => {
    const terms = { ...rivets.terms, breaks: [{ from: '0', price: '0.11' }] };
    const far = { ...terms, breaks: [...terms.breaks, { from: '1021933440', price: '0.05' }] };
    const only = { ...terms, minimum: '1021933440', multiple: null, breaks: far.breaks.slice(1) };
    const asked = { use: steady, minimum: 20, free: 60 };
    expect(suggest({ ...asked, terms: far })).toEqual(suggest({ ...asked, terms }));
    expect(suggest({ ...asked, terms: only })).toMatchObject({ economic: null });
  });

  it('goes by use where that asks for more than the minimum', () => {
    // 70 a week without spread, a week's lead: the point is 70; a year is 3,650.
    const { point, pointBy, economic, quantity } = suggest({ use: steady, minimum: 20, free: 60 });
    expect([point, pointBy]).toEqual([70, 'use']);
    // √(2 × 3,650 × 10 / (0.2 × 0.11))
    expect(economic).toBeCloseTo(1821.59, 2);
    expect(quantity).toBe('1900');
  });

  it('is one pack at least where nothing asks for more', () => {
    expect(suggest({ minimum: 0 })).toMatchObject({ state: 'fine', quantity: '0', usual: '100' });
  });

  it('says what is due within two weeks', () => {
    expect(suggest({ use: steady, minimum: 0, free: 200 })).toMatchObject({
      ...{ state: 'soon', dueInDays: 14, quantity: '0', usual: '1900', usualBy: 'year' },
    });
    expect(suggest({ use: steady, minimum: 0, free: 210 })).toMatchObject({ state: 'fine' });
  });

  it('keeps what the owner set, in whole packs and never too little', () => {
    const byHand = { point: 500, quantity: '250' };
    expect(suggest({ byHand })).toMatchObject({ point: 500, pointBy: 'hand', quantity: '300' });
    expect(suggest({ byHand }).usualBy).toBe('hand');
    expect(suggest({ byHand, free: 0 })).toMatchObject({ quantity: '500', usualBy: 'need' });
  });

  it('buys at most for a year, and goes on to a break that costs less', () => {
    const rare = itemUse(Array.from({ length: 52 }, (_, at) => (at % 26 === 25 ? 1 : 0)));
    const terms = { minimum: null, multiple: null, breaks: [{ from: '0', price: '0.01' }] };
    expect(suggest({ use: rare, terms, minimum: 0, free: 0 }).economic).toBeLessThan(3);
    const breaks = [
      { from: '0', price: '0.20' },
      { from: '200', price: '0.10' },
    ];
    const ladder = { minimum: null, multiple: '10', breaks };
    expect(suggest({ terms: ladder, free: 150 }).quantity).toBe('200');
  });

  it('reckons leather in whole sides by the price of a foot', () => {
    const side = '2043866.88';
    const terms = { minimum: null, multiple: side, breaks: [{ from: '0', price: '9.5' }] };
    const use = itemUse(Array.from({ length: 52 }, () => 929030.4));
    const leather = { terms, use, pricedAmount: '92903.04', minimum: 0, free: 100 };
    const { quantity, economic } = suggest(leather);
    // 10 ft² a week: √(2 × 521.43 × 10 / (0.2 × 9.5)) = 74.09 ft², four sides of 22.
    expect((economic ?? 0) / 92903.04).toBeCloseTo(74.09, 2);
    expect(quantity).toBe('8175467.52');
  });
});

describe('every suggestion', () => {
  const breaks = fc
    .tuple(fc.integer({ min: 1, max: 90 }), fc.integer({ min: 1, max: 90 }))
    .map(([high, off]) => [
      { from: '0', price: `0.${String(high + 9).padStart(2, '0')}` },
      { from: '600', price: `0.${String(Math.max(1, high + 9 - off)).padStart(2, '0')}` },
    ]);
  const inputs = fc
    .record({
      free: fc.nat(2000),
      promised: fc.nat(500),
      onOrder: fc.nat(1000),
      drafted: fc.nat(300),
      minimum: fc.nat(1500),
      pack: fc.integer({ min: 1, max: 250 }),
      packs: fc.integer({ min: 1, max: 5 }),
      weeks: fc.array(fc.nat(300), { maxLength: 52 }),
      leadDays: fc.nat(60),
      leadSd: fc.nat(10),
      breaks,
      point: fc.option(fc.nat(2000)),
      hand: fc.option(fc.integer({ min: 1, max: 3000 })),
    })
    .map(({ pack, packs, weeks, leadDays, leadSd, breaks: ladder, point, hand, ...rest }) => ({
      ...rivets,
      ...rest,
      use: itemUse(weeks),
      lead: { meanDays: leadDays, sdDays: leadSd, deliveries: 3 },
      terms: { minimum: String(pack * packs), multiple: String(pack), breaks: ladder },
      byHand: { point, quantity: hand === null ? null : String(hand) },
    }));
  const total = (input: OrderInput) => orderSuggestion(input).position + input.drafted;

  it('orders exactly when too little is left', () => {
    fc.assert(
      fc.property(inputs, (input) => {
        const { quantity, point, state } = orderSuggestion(input);
        expect(Number(quantity) > 0).toBe(total(input) < point);
        expect(state === 'now').toBe(total(input) < point);
      }),
    );
  });

  it('is sold so: whole packs, at least the least', () => {
    fc.assert(
      fc.property(inputs, (input) => {
        const usual = Number(orderSuggestion(input).usual);
        expect(usual % Number(input.terms.multiple)).toBe(0);
        expect(usual).toBeGreaterThanOrEqual(Number(input.terms.minimum));
        expect(usual).toBeGreaterThan(0);
      }),
    );
  });

  it('reaches the point, and is never suggested anew once it is on order', () => {
    fc.assert(
      fc.property(inputs, (input) => {
        const { quantity, point } = orderSuggestion(input);
        if (quantity === '0') return;
        expect(total(input) + Number(quantity)).toBeGreaterThanOrEqual(point);
        const then = { ...input, onOrder: input.onOrder + Number(quantity) };
        expect(orderSuggestion(then).quantity).toBe('0');
      }),
    );
  });

  it('never rises with what is on order', () => {
    fc.assert(
      fc.property(inputs, fc.nat(2000), (input, more) => {
        const then = orderSuggestion({ ...input, onOrder: input.onOrder + more });
        expect(Number(then.quantity)).toBeLessThanOrEqual(Number(orderSuggestion(input).quantity));
      }),
    );
  });
});
