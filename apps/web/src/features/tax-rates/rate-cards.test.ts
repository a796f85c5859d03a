import { expect, it } from 'vitest';
import { rateCards, usualRate } from './rate-cards.ts';

const rate = (id: number, active = true) => ({
  ...{ id, name: `Rate ${id}`, percent: '8.25', active, version: 1 },
});
const items = [rate(1), rate(2, false)];

it('offers the rates in use, and begins with what the last invoice used', () => {
  expect(rateCards({ items, usual: null }).map(({ value }) => value)).toEqual([1]);
  expect(usualRate({ items, usual: { taxRateId: 1 } })).toBe(1);
  expect(usualRate({ items, usual: { taxRateId: null } })).toBeNull();
});

it('begins with nothing at the first invoice, or where the last rate is retired', () => {
  expect(usualRate({ items, usual: null })).toBeUndefined();
  expect(usualRate({ items, usual: { taxRateId: 2 } })).toBeUndefined();
});
