import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { writeBareJob } from '../../testing/bare-job.ts';
import { ft2, orderMore, stockUp } from '../../testing/stockroom.ts';
import { startTestShop } from '../../testing/test-shop.ts';

let shop: Awaited<ReturnType<typeof startTestShop>>;
let things: Awaited<ReturnType<typeof stockUp>>;
let lot: { id: number; tag: string };

beforeAll(async () => {
  shop = await startTestShop();
  things = await stockUp(shop);
  const { body } = await shop
    .as('owner')
    .post('/api/receipts')
    .send({ lots: [{ leatherId: things.leatherId, form: 'side', measuredAreaMm2: ft2(22) }] })
    .expect(201);
  lot = body.lots[0];
});
afterAll(() => shop.close());

const scan = (code: string) => shop.as('maker').get(`/api/scans/${encodeURIComponent(code)}`);

describe('a scan', () => {
  it('opens the lot whose tag it is, bare, in small letters or as an address', async () => {
    const address = `https://shop.example.com/t/${lot.tag}`;
    for (const code of [lot.tag, lot.tag.toLowerCase(), address, `${lot.tag}\r`]) {
      const { body } = await scan(code).expect(200);
      expect(body).toMatchObject({ kind: 'lot', id: lot.id, to: `/stockroom/lots/${lot.id}` });
    }
  });

  it('opens a bin and an order to a supplier', async () => {
    const bin = `B-${String(things.hardwareId).padStart(4, '0')}`;
    const { body } = await scan(bin).expect(200);
    expect(body).toMatchObject({ kind: 'hardware', id: things.hardwareId, tag: bin });
    const order = await orderMore(shop, things);
    const { body: found } = await scan('P-0001').expect(200);
    expect(found).toMatchObject({ kind: 'purchase order', id: order.id });
  });

  it('opens a customer’s order', async () => {
    const id = await writeBareJob(shop.context, 1);
    const { body } = await scan('o-91').expect(200);
    expect(body).toMatchObject({ kind: 'order', id, tag: 'O-91', to: `/counter/orders/${id}` });
  });

  it('that is no tag says what was read and what to do', async () => {
    for (const code of ['4006381333931', 'B-9999', '%', 'x'.repeat(100)]) {
      const { body } = await scan(code).expect(404);
      expect(body.detail).toContain(`“${code.slice(0, 60)}”`);
      expect(body.detail).toContain('Scan it again');
    }
  });

  it.each(['b-0007', 'P-0001', 'p-0900', 'J-0012', 'O-0003', 'Q-0241', 'I-1'])(
    'never lets a lot hang by %s, which a bin or a paper goes by',
    async (tag) => {
      const change = shop.as('owner').patch(`/api/lots/${lot.id}`).set('If-Match', '"1"');
      const { body } = await change.send({ tag }).expect(422);
      expect(body.errors).toMatchObject([{ field: 'tag' }]);
      const side = { leatherId: things.leatherId, form: 'side', measuredAreaMm2: ft2(22) };
      const lots = [{ ...side, tag }];
      const came = await shop.as('owner').post('/api/receipts').send({ lots }).expect(422);
      expect(came.body.errors).toMatchObject([{ field: 'lots.0.tag' }]);
    },
  );

  it('never has to choose between two lots that differ in capitals alone', async () => {
    const side = { leatherId: things.leatherId, form: 'side', measuredAreaMm2: ft2(22) };
    const hang = (...tags: string[]) =>
      shop
        .as('owner')
        .post('/api/receipts')
        .send({ lots: tags.map((tag) => ({ ...side, tag })) });
    await hang(lot.tag.toLowerCase()).expect(422);
    await hang('Loft 1', 'LOFT 1').expect(422);
    const { body } = await hang('t-0002', '').expect(201);
    expect(body.lots).toMatchObject([{ tag: 't-0002' }, { tag: 'T-0003' }]);
    const own = shop.as('owner').patch(`/api/lots/${body.lots[0].id}`).set('If-Match', '"1"');
    await own.send({ tag: 'T-0002' }).expect(200);
  });
});
