import type { SupplierOfferReply } from '@hidewright/contract';
import { bestBuy } from '@hidewright/domain';
import { expect, it } from 'vitest';
import { buyMoreText, leftOutText, neededFault } from './offer-words.ts';

const workshop = { areaUnit: 'ft2' } as Parameters<typeof buyMoreText>[2];
const offer = {
  ...{ id: 1, leadDays: 3, preferred: true, minimum: null, multiple: null },
  breaks: [
    { from: '1', price: '0.2' },
    { from: '200', price: '0.15' },
    { from: '1000', price: '0.149' },
  ],
};

it.each([
  ['162', '38 more pieces cost 2.40 less: take 200 for 30.00.'],
  ['150', '50 more pieces cost nothing more: 200 for 30.00.'],
  ['146', '54 more pieces cost only 0.80 more: 200 for 30.00.'],
  ['20', ''],
])('for %s it says “%s”', (needed, said) => {
  const [buy] = bestBuy({ needed, offers: [offer] });
  expect(buy && buyMoreText(buy, 'piece', workshop)).toBe(said);
});

it.each([
  ['1.5', 'Enter how many are needed, as a whole number.'],
  ['abc', 'Enter how many are needed, as a whole number.'],
  ['0', 'Enter how many are needed, above 0.'],
  ['999999999', 'That is too many: enter at most 99,999,999.'],
])('says what is wrong with %s pieces', (typed, said) => {
  expect(neededFault(typed, 'piece', 'ft2')).toBe(said);
});

it('says what is wrong with an area', () => {
  expect(neededFault('abc', 'mm2', 'ft2')).toMatch(/^Enter the area in ft²/);
  expect(neededFault('0', 'mm2', 'ft2')).toBe('Enter how much is needed, above 0.');
});

it('names those whose price is not known, and does not compare them', () => {
  const by = (supplierName: string, price: string) =>
    ({ supplierName, breaks: [{ from: '1', price }] }) as SupplierOfferReply;
  const [dear, unknown] = [by('Oldbeck Tannery', '0.2'), by('Fennbridge Fittings', '0')];
  expect(leftOutText([dear, unknown])).toBe(
    'Without Fennbridge Fittings: ask what it costs there, and enter it.',
  );
  expect(leftOutText([dear])).toBe('');
});
