import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type { PlateOfferReply } from '@hidewright/contract';
import { startTestShop } from '../../testing/test-shop.ts';

let shop: Awaited<ReturnType<typeof startTestShop>>;
beforeAll(async () => {
  shop = await startTestShop();
});
afterAll(() => shop.close());

const magnesium = { metal: 'magnesium', price: '46.00', lifeUses: 10_000 };
const add = (body: object) => shop.as('owner').post('/api/plate-offers').send(body);
const change = ({ id }: PlateOfferReply, version: number, body: object) =>
  shop.as('owner').patch(`/api/plate-offers/${id}`).set('If-Match', `"${version}"`).send(body);
const list = async () =>
  (await shop.as('owner').get('/api/plate-offers').expect(200)).body.items as PlateOfferReply[];

describe('what a new plate costs and lasts', () => {
  it('is kept once for each metal, changed and taken off the list', async () => {
    const brass = (await add({ metal: 'brass', price: '310', lifeUses: 100_000 }).expect(201))
      .body as PlateOfferReply;
    const cheap = (await add(magnesium).expect(201)).body as PlateOfferReply;
    expect((await list()).map(({ metal }) => metal)).toEqual(['magnesium', 'brass']);
    const { body } = await add(magnesium).expect(422);
    expect(body.errors).toEqual([
      { field: 'metal', message: expect.stringContaining('already') as string },
    ]);
    const dearer = await change(cheap, 1, { price: '52.5' }).expect(200);
    expect(dearer.body).toMatchObject({ price: '52.50', lifeUses: 10_000, version: 2 });
    await change(cheap, 1, { price: '60' }).expect(412);
    await shop.as('owner').delete(`/api/plate-offers/${brass.id}`).expect(200);
    await shop.as('owner').delete(`/api/plate-offers/${brass.id}`).expect(404);
    expect((await list()).map(({ metal }) => metal)).toEqual(['magnesium']);
  });

  it.each([
    ['a price below nothing', { price: '-1' }, 'price'],
    ['a price of nothing', { price: '0' }, 'price'],
    ['a price that is none', { price: 'dear' }, 'price'],
    ['a life of nothing', { lifeUses: 0 }, 'lifeUses'],
    ['half an impression', { lifeUses: 0.5 }, 'lifeUses'],
    ['a metal that no plate is of', { metal: 'gold' }, 'metal'],
  ])('is refused with %s, at the field', async (_what, wrong, field) => {
    const { body } = await add({ ...magnesium, metal: 'copper', ...wrong }).expect(422);
    expect(body.errors.map((fault: { field: string }) => fault.field)).toEqual([field]);
    expect(body.errors[0].message).toMatch(/^(Enter|Choose)/);
  });

  it('is the owner’s', async () => {
    await shop.as('maker').get('/api/plate-offers').expect(403);
    await shop.as('bookkeeper').post('/api/plate-offers').send(magnesium).expect(403);
  });
});
