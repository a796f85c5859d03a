import type { startTestShop } from './test-shop.ts';

type Shop = Awaited<ReturnType<typeof startTestShop>>;

/** 1 ft² in mm². */
export const ft2 = (feet: number) => String((feet * 9_290_304) / 100);

let made = 0;

/** A leather at 9.00 per ft², a kind of rivet at 0.17, and who sells both. */
export async function stockUp(shop: Shop) {
  const owner = shop.as('owner');
  const number = ++made;
  const supplier = await owner
    .post('/api/suppliers')
    .send({ name: `Oldbeck Tannery ${number}`, email: 'orders@example.com', leadDays: 10 })
    .expect(201);
  const leather = await owner
    .post('/api/leathers')
    .send({ name: `Oak tan russet ${number}`, pricePerFt2: '9.00', supplierId: supplier.body.id })
    .expect(201);
  const rivet = await owner
    .post('/api/hardware')
    .send({ name: `Copper rivet ${number}`, unitPrice: '0.17', packSize: 100, reorderAt: 500 })
    .expect(201);
  return {
    supplierId: supplier.body.id as number,
    leatherId: leather.body.id as number,
    hardwareId: rivet.body.id as number,
  };
}

/** An order for 40 ft² of that leather and 1,000 of that rivet, sent. */
export async function orderMore(shop: Shop, things: Awaited<ReturnType<typeof stockUp>>) {
  const { supplierId, leatherId, hardwareId } = things;
  const lines = [
    { of: 'leather', leatherId, areaMm2: ft2(40), unitPrice: '8.50' },
    { of: 'hardware', hardwareId, quantity: 1000, unitPrice: '0.1625' },
  ];
  const owner = shop.as('owner');
  const draft = await owner.post('/api/purchase-orders').send({ supplierId, lines }).expect(201);
  const sent = await owner
    .post(`/api/purchase-orders/${draft.body.id}/sendings`)
    .send({ by: 'hand' })
    .expect(201);
  const [ofLeather, ofRivets] = sent.body.lines as { id: number }[];
  return {
    id: sent.body.id as number,
    leatherLine: ofLeather?.id as number,
    rivetLine: ofRivets?.id as number,
  };
}
