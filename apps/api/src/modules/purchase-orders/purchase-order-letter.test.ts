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
  ...{ unitPrice: '1.65', fixedPrice: null },
  service: { word: 'dyeing', changes: true, becomesName: 'Fen Veg black' },
} as PurchaseLine;
const skiving = {
  ...dyeing,
  ...{ name: 'Skiving of T-0014, Fen Veg black', unitPrice: '0.00', fixedPrice: '12.50' },
  service: { word: 'skiving', changes: false, becomesName: 'Fen Veg black' },
} as PurchaseLine;
const rivets = {
  ...{ of: 'hardware', name: 'Rivets', areaMm2: null, quantity: 100 },
  ...{ unitPrice: '0.17', service: null },
} as PurchaseLine;

const letterFor = (lines: PurchaseLine[]) =>
  purchaseOrderLetter(
    { number: 'P-0012', lines, expectedOn: null, note: '' } as unknown as PurchaseOrder,
    shop,
  ).body;

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
