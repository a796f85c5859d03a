import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import { ft2, orderMore, stockUp } from '../../testing/stockroom.ts';
import { startTestShop } from '../../testing/test-shop.ts';
import { OutgoingMail } from '../mail/outgoing-mail.entity.ts';

let shop: Awaited<ReturnType<typeof startTestShop>>;
let things: Awaited<ReturnType<typeof stockUp>>;
let order: Awaited<ReturnType<typeof orderMore>>;

beforeAll(async () => {
  shop = await startTestShop({ SMTP_URL: 'smtp://127.0.0.1:9' });
});
afterAll(() => shop.close());
beforeEach(async () => {
  things = await stockUp(shop);
  order = await orderMore(shop, things);
});

const owner = () => shop.as('owner');
const side = (marked: number | null, measured: number) => ({
  leatherId: things.leatherId,
  purchaseLineId: order.leatherLine,
  form: 'side',
  markedAreaMm2: marked === null ? null : ft2(marked),
  measuredAreaMm2: ft2(measured),
});

async function receive(...lots: object[]) {
  const sent = shop.as('maker').post('/api/receipts').send({ purchaseOrderId: order.id, lots });
  const { body } = await sent.expect(201);
  return body.receipt as { id: number; lines: { lotTag: string; marked: object | null }[] };
}

const claim = (receiptId: number, body: object = { by: 'hand', text: 'It is short.' }) =>
  owner().post(`/api/receipts/${receiptId}/claims`).send(body);
const close = (id: number, version: number, body: object) =>
  owner().patch(`/api/supplier-claims/${id}`).set('If-Match', `"${version}"`).send(body);

describe('a side measured against its mark', () => {
  it('is paid for as marked, put on the rack as measured, and said to be short beyond the tolerance', async () => {
    const receipt = await receive(side(25, 24), side(25, 24.5), side(null, 20));
    const [short, within, unmarked] = receipt.lines.map(({ marked }) => marked);
    expect(short).toEqual({
      areaMm2: '2322576',
      differenceMm2: '-92903.04',
      differencePercent: '-4',
      short: true,
    });
    expect(within).toMatchObject({ differencePercent: '-2', short: false });
    expect(unmarked).toBeNull();
    const read = await owner().get(`/api/receipts/${receipt.id}`).expect(200);
    expect(read.body.lines[0]).toMatchObject({ goods: '212.50' });
    const lot = await owner().get(`/api/lots/${read.body.lines[0].lotId}`).expect(200);
    expect(lot.body).toMatchObject({ cost: '212.50', onHandAreaMm2: '2229672.96' });
    const ordered = await owner().get(`/api/purchase-orders/${order.id}`).expect(200);
    expect(ordered.body.lines[0]).toMatchObject({ priceDifference: '0.00' });
  });

  it('is judged by the tolerance that the shop set, as it was when it came', async () => {
    const before = await receive(side(25, 24));
    const { body: workshop } = await owner().get('/api/workshop').expect(200);
    expect(workshop.areaTolerancePercent).toBe('3');
    const tolerate = (percent: string, version: number) =>
      owner()
        .patch('/api/workshop')
        .set('If-Match', `"${version}"`)
        .send({ areaTolerancePercent: percent });
    await tolerate('101', workshop.version).expect(422);
    const { body: wider } = await tolerate('5', workshop.version).expect(200);
    const after = await receive(side(25, 24));
    expect(after.lines[0]?.marked).toMatchObject({ short: false });
    const read = await owner().get(`/api/receipts/${before.id}`).expect(200);
    expect(read.body).toMatchObject({
      tolerancePercent: '3',
      lines: [{ marked: { short: true } }],
    });
    await tolerate('3', wider.version).expect(200);
  });
});

describe('a claim', () => {
  it('is drafted with the lots, the missing area and what it was paid for, and mailed', async () => {
    const receipt = await receive(side(25, 24), side(20, 20), side(20, 19));
    const [first, , third] = receipt.lines;
    const { body: draft } = await owner()
      .get(`/api/receipts/${receipt.id}/claim-draft`)
      .expect(200);
    expect(draft).toMatchObject({ missingAreaMm2: '185806.08', worth: '17.00' });
    expect(draft.text).toContain(`- ${first?.lotTag}, Oak tan russet`);
    expect(draft.text).toContain('marked 25 ft², measured 24 ft²');
    expect(draft.lots.map((lot: { lotTag: string }) => lot.lotTag)).toEqual([
      first?.lotTag,
      third?.lotTag,
    ]);
    const { body } = await claim(receipt.id, { by: 'mail', text: draft.text }).expect(201);
    expect(body).toMatchObject({ state: 'open', worth: '17.00', sentBy: 'mail', credited: null });
    const mail = await shop.context.orm.em
      .fork()
      .findOneOrFail(
        OutgoingMail,
        { subjectKind: 'purchase order', subjectId: order.id },
        { orderBy: { id: 'desc' } },
      );
    expect(mail).toMatchObject({ recipient: 'orders@example.com', body: draft.text });
    const list = await owner().get(`/api/purchase-orders/${order.id}/claims`).expect(200);
    expect(list.body.items).toMatchObject([
      { id: body.id, short: { lots: [{}, {}], missingAreaMm2: '185806.08' }, sentBack: null },
    ]);
  });

  it('is made once for a lot', async () => {
    const receipt = await receive(side(25, 24));
    await claim(receipt.id).expect(201);
    const again = await claim(receipt.id).expect(409);
    expect(again.body.detail).toMatch(/claimed already/);
    const fine = await receive(side(25, 24.9));
    expect((await claim(fine.id).expect(409)).body.detail).toMatch(/more than 3 %/);
  });

  it('ends credited or given up, and only once', async () => {
    const opened = await claim((await receive(side(25, 24))).id).expect(201);
    const { id, version } = opened.body;
    const nothing = await close(id, version, { state: 'credited', credited: '0' }).expect(422);
    expect(nothing.body.errors).toMatchObject([{ field: 'credited' }]);
    const done = await close(id, version, { state: 'credited', credited: '8.00' }).expect(200);
    expect(done.body).toMatchObject({ state: 'credited', credited: '8.00' });
    await close(id, done.body.version, { state: 'given up', note: 'No answer' }).expect(409);
    await close(id, version, { state: 'given up', note: 'No answer' }).expect(412);
    const other = await claim((await receive(side(25, 24))).id).expect(201);
    const givenUp = await close(other.body.id, 1, { state: 'given up', note: 'No answer' });
    expect(givenUp.body).toMatchObject({ state: 'given up', note: 'No answer' });
  });

  it('takes more than was claimed only where somebody says so', async () => {
    const { body } = await claim((await receive(side(25, 24))).id).expect(201);
    const credit = (more: object) =>
      close(body.id, 1, { state: 'credited', credited: '85', ...more });
    const refused = await credit({}).expect(422);
    expect(refused.body.errors).toMatchObject([
      { field: 'credited', message: expect.stringContaining('8.50 was claimed') },
    ]);
    const done = await credit({ moreThanClaimed: true }).expect(200);
    expect(done.body).toMatchObject({ state: 'credited', credited: '85.00' });
  });

  it('has a credit put right with its reason, and opens again where there was none', async () => {
    const { body } = await claim((await receive(side(25, 24))).id).expect(201);
    const correct = (version: number, more: object) =>
      owner()
        .patch(`/api/supplier-claims/${body.id}/credit`)
        .set('If-Match', `"${version}"`)
        .send({ reason: 'A digit too few', ...more });
    const early = await correct(1, { credited: '8.50' }).expect(409);
    expect(early.body.detail).toMatch(/no credit is noted/);
    await close(body.id, 1, { state: 'credited', credited: '8.00' }).expect(200);
    await correct(1, { credited: '8.50' }).expect(412);
    await correct(2, { credited: '85.00' }).expect(422);
    const right = await correct(2, { credited: '8.50' }).expect(200);
    expect(right.body).toMatchObject({
      credited: '8.50',
      credits: [
        { credited: '8.00', reason: '' },
        { credited: '8.50', reason: 'A digit too few' },
      ],
    });
    const none = await correct(3, { credited: '0', reason: 'Another claim’s' }).expect(200);
    expect(none.body).toMatchObject({ state: 'open', credited: null, closedAt: null });
    const log = await owner().get('/api/activities').expect(200);
    expect(log.body.items[0].action).toBe('put right what a claim was credited');
    await shop
      .as('bookkeeper')
      .patch(`/api/supplier-claims/${body.id}/credit`)
      .send({})
      .expect(403);
  });

  it('is the owner’s, and needs a supplier and words', async () => {
    const receipt = await receive(side(25, 24));
    await shop.as('maker').get(`/api/receipts/${receipt.id}/claim-draft`).expect(403);
    await shop.as('bookkeeper').post(`/api/receipts/${receipt.id}/claims`).send({}).expect(403);
    const empty = await claim(receipt.id, { by: 'hand', text: '  ' }).expect(422);
    expect(empty.body.errors).toMatchObject([{ field: 'text' }]);
    const { body } = await owner()
      .post('/api/receipts')
      .send({ lots: [{ ...side(25, 24), purchaseLineId: null }] })
      .expect(201);
    expect((await claim(body.receipt.id).expect(409)).body.detail).toMatch(/without an order/);
  });
});
