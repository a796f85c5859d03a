import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type { PressReply } from '@hidewright/contract';
import { startTestShop } from '../../testing/test-shop.ts';

let shop: Awaited<ReturnType<typeof startTestShop>>;
beforeAll(async () => {
  shop = await startTestShop();
});
afterAll(() => shop.close());

const clicker = {
  name: 'Clicker',
  bedWidthMm: '610',
  bedDepthMm: '330.2',
  throatMm: '300',
  shutHeightMm: null,
  ruleMm: '900',
  reliefAreaMm2: null,
};

const add = (body: object) => shop.as('owner').post('/api/presses').send(body);
const faultsOf = (body: { errors: { field: string }[] }) => body.errors.map(({ field }) => field);

describe('a press', () => {
  it('is added, read by the maker, and changed by who saw its latest version', async () => {
    const made = (await add(clicker).expect(201)).body as PressReply;
    expect(made).toMatchObject({ ...clicker, active: true, version: 1 });
    const read = await shop.as('maker').get(`/api/presses/${made.id}`).expect(200);
    expect(read.body).toEqual(made);
    const change = (version: number, body: object) =>
      shop.as('owner').patch(`/api/presses/${made.id}`).set('If-Match', `"${version}"`).send(body);
    const changed = await change(1, { throatMm: null, reliefAreaMm2: '1600' }).expect(200);
    expect(changed.body).toMatchObject({
      name: 'Clicker',
      throatMm: null,
      ruleMm: '900',
      reliefAreaMm2: '1600',
      version: 2,
    });
    await change(1, { active: false }).expect(412);
    expect((await shop.as('maker').get('/api/presses').expect(200)).body.items).toEqual([
      changed.body,
    ]);
  });

  it.each([
    ['a bed of nothing', { bedWidthMm: '0' }, 'bedWidthMm'],
    ['a negative throat', { throatMm: '-3' }, 'throatMm'],
    ['NaN', { ruleMm: 'NaN' }, 'ruleMm'],
    ['relief of nothing', { reliefAreaMm2: '0' }, 'reliefAreaMm2'],
    ['no name', { name: ' ' }, 'name'],
    ['an unknown field', { force: '10' }, 'force'],
  ])('is refused with %s, at the field', async (_what, change, field) => {
    const { body } = await add({ ...clicker, ...change }).expect(422);
    expect(faultsOf(body)).toEqual([field]);
  });

  it('is the owner’s to add, and not the bookkeeper’s to see', async () => {
    await shop.as('maker').post('/api/presses').send(clicker).expect(403);
    await shop.as('bookkeeper').get('/api/presses').expect(403);
    await shop.as('owner').get('/api/presses/999999').expect(404);
  });
});

it('a die and a plate keep what meets the press', async () => {
  const die = {
    kind: 'cutting die',
    name: 'Coaster, two at once',
    cost: '120.00',
    lifeUses: 40_000,
    piecesPerStrike: 2,
    ruleThicknessMm: '1.05',
  };
  const { body } = await shop.as('owner').post('/api/tools').send(die).expect(201);
  expect(body).toMatchObject({ piecesPerStrike: 2, ruleThicknessMm: '1.05', borderMm: null });
  const changed = await shop
    .as('owner')
    .patch(`/api/tools/${body.id}`)
    .set('If-Match', `"${body.version}"`)
    .send({ ruleThicknessMm: null })
    .expect(200);
  expect(changed.body).toMatchObject({ piecesPerStrike: 2, ruleThicknessMm: null, cost: '120.00' });
});
