import { expect, it } from 'vitest';
import type { PurchaseLine, PurchaseOrder } from '@hidewright/contract';
import { purchaseOrderLetter } from './purchase-order-letter.ts';

const shop = {
  name: 'Marlpit Leather',
  address: 'The Old Maltings',
  currency: 'USD',
  areaUnit: 'ft2',
} as const;

const dyeing = {
  ...{ of: 'service', name: 'Dyeing of T-0012, Fen Veg natural', areaMm2: '2303995.392' },
  ...{ unitPrice: '1.65', fixedPrice: null, articleNumber: '', whole: null },
  service: { word: 'dyeing', changes: true, becomesName: 'Fen Veg black' },
} as PurchaseLine;
const skiving = {
  ...dyeing,
  ...{ name: 'Skiving of T-0014, Fen Veg black', unitPrice: '0.00', fixedPrice: '12.50' },
  service: { word: 'skiving', changes: false, becomesName: 'Fen Veg black' },
} as PurchaseLine;
const rivets = {
  ...{ of: 'hardware', name: 'Rivets', areaMm2: null, quantity: 1500, unit: 'piece' },
  ...{ unitPrice: '0.17', service: null, articleNumber: '' },
} as PurchaseLine;

const russet = {
  ...{ of: 'leather', name: 'Oak tan russet', areaMm2: '10219334.4', quantity: null },
  ...{ unitPrice: '8.50', service: null, articleNumber: 'OT-7', unit: null },
  whole: { count: 5, form: 'side' },
} as PurchaseLine;

const letterFor = (lines: PurchaseLine[], more: Partial<PurchaseOrder> = {}) => {
  const order = { number: 'P-0012', lines, expectedOn: null, note: '', ...more };
  return purchaseOrderLetter(order as PurchaseOrder, shop).body;
};

it('asks for the work on a lot as one would say it, with what it becomes and its price', () => {
  const body = letterFor([dyeing, skiving]);
  expect(body).toContain('Please do this work for us, on our order P-0012:');
  expect(body).toContain(
    '- Dyeing of T-0012, Fen Veg natural, 24.8 ft², to become Fen Veg black, at USD 1.65 per ft²\n' +
      '- Skiving of T-0014, Fen Veg black, 24.8 ft², at USD 12.50 for the lot',
  );
});

it('asks for goods and work in one letter', () => {
  expect(letterFor([rivets, dyeing])).toContain('Please send us, and do for us, on our order');
  expect(letterFor([rivets])).toContain('Please send us, on our order P-0012:');
});

it('names the supplier’s own article, and how many sides the leather is', () => {
  const body = letterFor([russet, { ...rivets, articleNumber: 'CR 7/1' }]);
  expect(body).toContain(
    '- 5 sides, about 110 ft² of Oak tan russet, your article OT-7, at USD 8.50 per ft²\n' +
      '- 1,500 × Rivets, your article CR 7/1, at USD 0.17 each',
  );
  expect(letterFor([{ ...russet, whole: null, articleNumber: '' }])).toContain(
    '- 110 ft² of Oak tan russet, at USD 8.50 per ft²',
  );
});

it('says the price of leather for the unit in which its area is said', () => {
  const metric = { ...shop, areaUnit: 'dm2' } as const;
  const leather = { ...russet, whole: null };
  const order = { number: 'P-0012', lines: [leather, dyeing], expectedOn: null, note: '' };
  const { body } = purchaseOrderLetter(order as unknown as PurchaseOrder, metric);
  // 8.50 / 9.290304 and 1.65 / 9.290304
  expect(body).toContain(
    '- 1,021.9 dm² of Oak tan russet, your article OT-7, at USD 0.9149 per dm²',
  );
  expect(body).toContain('230.4 dm², to become Fen Veg black, at USD 0.1776 per dm²');
});

it('asks for a price that is not known, and adds up without it', () => {
  const unpriced = { ...rivets, unitPrice: '0.00' };
  expect(letterFor([unpriced, russet], { total: '935.00' })).toMatch(
    /- 1,500 × Rivets, please tell us its price\n[^]*Together USD 935\.00, before carriage and tax, without what you are to tell us the price of\./,
  );
  expect(letterFor([unpriced], { total: '0.00' })).not.toContain('Together');
});

it('says figures and days as they are said everywhere else', () => {
  const leather = { ...russet, whole: null, areaMm2: '232257600' };
  const body = letterFor([leather, rivets], { total: '21505.00', expectedOn: '2026-12-14' });
  expect(body).toContain('- 2,500 ft² of');
  expect(body).toContain('- 1,500 × Rivets');
  expect(body).toContain('Together USD 21,505.00, before carriage and tax.');
  expect(body).toContain('We count on it by Mon 14 Dec 2026.');
});
