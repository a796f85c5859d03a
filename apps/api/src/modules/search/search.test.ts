import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { startTestShop } from '../../testing/test-shop.ts';

let shop: Awaited<ReturnType<typeof startTestShop>>;
let orderId: number;

beforeAll(async () => {
  shop = await startTestShop();
  const make = async (path: string, body: object) =>
    (await shop.as('owner').post(`/api${path}`).send(body).expect(201)).body as { id: number };
  const supplier = await make('/suppliers', { name: 'Oldbeck Tannery' });
  const leather = await make('/leathers', { name: 'Oak tan 100%', pricePerFt2: '9.50' });
  const line = { of: 'leather', leatherId: leather.id, areaMm2: '929030.4', unitPrice: '9.50' };
  orderId = (await make('/purchase-orders', { supplierId: supplier.id, lines: [line] })).id;
});
afterAll(() => shop.close());

const found = async (role: 'owner' | 'maker' | 'bookkeeper', q: string) =>
  (await shop.as(role).get('/api/search').query({ q }).expect(200)).body as {
    items: { kind: string; label: string; detail: string; to: string }[];
  };

describe('search', () => {
  it.each(['owner', 'maker', 'bookkeeper'] as const)(
    'finds an order to a supplier by its number or theirs for the %s, without a price',
    async (role) => {
      const order = {
        kind: 'purchase order',
        label: 'P-0001',
        detail: 'Oldbeck Tannery · draft',
        to: `/stockroom/purchase-orders/${orderId}`,
      };
      expect((await found(role, 'p-0001')).items).toEqual([order]);
      expect((await found(role, 'oldbeck')).items).toEqual([order]);
    },
  );

  it('takes what is typed as it stands', async () => {
    expect((await found('owner', '%')).items).toEqual([]);
    expect((await found('owner', '_-0001')).items).toEqual([]);
  });
});
