import type { OrderSuggestionReply } from '@hidewright/contract';
import { expect, it } from 'vitest';
import {
  amountText,
  heldNote,
  leadDaysText,
  leadWords,
  methodWords,
  priceWords,
  soldWords,
  wholeWords,
} from './to-order-words.ts';

const workshop = { areaUnit: 'ft2' } as never;
const item = (change: object) =>
  ({
    of: 'hardware',
    unit: 'piece',
    least: null,
    multiple: '100',
    whole: null,
    ...change,
  }) as never;
const side = { areaMm2: '2043866.88', form: 'side' };

it('says quantities in their unit', () => {
  expect(amountText('1250', { unit: 'piece' }, workshop)).toBe('1,250');
  expect(amountText('2.54', { unit: 'm' }, workshop)).toBe('2.5 m');
  expect(amountText('12', { unit: 'pair' }, workshop)).toBe('12 pairs');
  expect(amountText('1', { unit: 'bottle' }, workshop)).toBe('1 bottle');
  expect(amountText('2043866.88', { unit: 'mm2' }, workshop)).toBe('22.0 ft²');
});

it('says what of it is held, and what of that is missing', () => {
  const note = (onHand: string, reserved: string) => heldNote({ onHand, reserved }, String);
  expect(note('100', '0')).toBeUndefined();
  expect(note('100', '90')).toBe('90 of it held');
  expect(note('20', '90')).toBe('90 held, 70 of it missing');
});

it('says how it is sold, and how many sides that is', () => {
  expect(soldWords(item({ least: '500' }), workshop)).toBe('packs of 100, at least 500');
  expect(soldWords(item({ multiple: '1' }), workshop)).toBe('');
  const leather = { unit: 'mm2', multiple: side.areaMm2, whole: side };
  expect(soldWords(item(leather), workshop)).toBe('whole sides of about 22.0 ft²');
  const belly = { ...side, form: 'belly' };
  expect(soldWords(item({ ...leather, whole: belly }), workshop)).toContain('whole bellies of');
  expect(wholeWords('6131600.64', { whole: belly } as never)).toBe('3 bellies');
  expect(wholeWords('6131600.64', { whole: side })).toBe('3 sides');
  expect(wholeWords('2043866.88', { whole: side })).toBe('1 side');
});

it('says what an order would cost, or that nobody knows', () => {
  const words = (price: object) => priceWords(item(price), { currency: 'USD' });
  expect(words({ amount: '85.00', unitPrice: '0.17' })).toBe('85.00 USD, 0.17 each');
  expect(words({ of: 'leather', amount: '1200.00', unitPrice: '6.00' })).toBe(
    '1,200.00 USD, 6.00 a ft²',
  );
  expect(words({ amount: '0.00', unitPrice: '0.00' })).toBe('price not known');
  expect(words({})).toBe('');
});

it('says by which method use is expected, and why', () => {
  const usage = { periodDays: 28, series: [], idlePercent: '62.5', size: '120', interval: '3' };
  const words = (method: string) =>
    methodWords(
      { usage: { ...usage, method } } as unknown as OrderSuggestionReply,
      (value) => value,
    );
  expect(words('croston')).toContain('63 % of the periods are without any');
  expect(words('croston')).toContain('at a time (120)');
  expect(words('smoothing')).toContain('Its use is steady');
  expect(words('too little')).toContain('not used in the last twelve months');
});

it('says who tells how long a delivery takes', () => {
  const lead = { meanDays: '7', sdDays: '0', deliveries: 0 };
  expect(leadWords(item({ lead, supplierName: 'Fennbridge Fittings' }))).toContain('says 7 days');
  expect(leadDaysText(item({ lead, supplierName: 'Fennbridge Fittings' }))).toBe('7 days');
  expect(leadDaysText(item({ lead, supplierName: null }))).toBe('not known');
  const took = { meanDays: '6.4', sdDays: '1.2', deliveries: 5 };
  expect(leadWords(item({ lead: took, supplierName: 'Fennbridge Fittings' }))).toContain(
    'The last 5 deliveries of Fennbridge Fittings took 6.4 days on average, give or take 1.2.',
  );
});
