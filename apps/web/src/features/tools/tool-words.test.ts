import { expect, it } from 'vitest';
import { ownerText, statesFor } from './tool-words.ts';

it('offers only the states that can follow', () => {
  expect(statesFor(undefined)).toEqual(['on the rack', 'on order']);
  expect(statesFor('on order')).toEqual(['on order', 'on the rack']);
  expect(statesFor('on the rack')).toEqual(['on the rack']);
  expect(statesFor('returned')).toEqual(['returned', 'on the rack']);
  expect(statesFor('scrapped')).toEqual(['scrapped']);
});

it('says whose a tool is, and until when it is kept', () => {
  const own = { ownedBy: 'customer', keptUntil: '2027-02-01' } as const;
  expect(ownerText(own, '2026-12-01')).toBe('the customer’s own, kept until Mon 1 Feb 2027');
  expect(ownerText({ ...own, keptUntil: null }, '2026-12-01')).toBe('the customer’s own');
  expect(ownerText({ ownedBy: 'shop', keptUntil: null }, '2026-12-01')).toBe('the shop’s');
});
