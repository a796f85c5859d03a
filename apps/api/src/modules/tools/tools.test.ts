import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type { Today, ToolReply } from '@hidewright/contract';
import { startTestShop } from '../../testing/test-shop.ts';
import { inTransaction, theProgram } from '../../work.ts';
import { Impression } from './impression.entity.ts';
import { addImpressions } from './tool-ledger.ts';
import { Tool } from './tool.entity.ts';

let shop: Awaited<ReturnType<typeof startTestShop>>;
beforeAll(async () => {
  shop = await startTestShop();
});
afterAll(() => shop.close());

const die = {
  kind: 'cutting die',
  name: 'Coaster 95 mm',
  cost: '84.00',
  lifeUses: 100_000,
  slot: 'A3',
};
const plate = {
  kind: 'stamp plate',
  name: 'Heron crest',
  metal: 'magnesium',
  cost: '46.50',
  lifeUses: 1000,
};

async function add(body: object): Promise<ToolReply> {
  return (await shop.as('owner').post('/api/tools').send(body).expect(201)).body as ToolReply;
}
const change = (tool: ToolReply, body: object, version = tool.version) =>
  shop.as('owner').patch(`/api/tools/${tool.id}`).set('If-Match', `"${version}"`).send(body);
const count = (tool: ToolReply, uses: number, reason = 'trial strikes') =>
  shop.as('maker').post(`/api/tools/${tool.id}/impressions`).send({ uses, reason });
const end = (tool: ToolReply, how: 'returns' | 'scrappings') =>
  shop.as('owner').post(`/api/tools/${tool.id}/${how}`).send({});
const faultsOf = (body: { errors: { field: string }[] }) => body.errors.map(({ field }) => field);

describe('a tool', () => {
  it('gets the next number of its kind, or the one that was typed', async () => {
    const first = await add(die);
    expect(first).toMatchObject({
      number: '1',
      cost: '84.00',
      used: 0,
      usesLeft: 100_000,
      state: 'on the rack',
      metal: '',
    });
    expect((await add({ ...plate, number: '41' })).number).toBe('41');
    expect((await add(plate)).number).toBe('42');
    expect((await add(die)).number).toBe('2');
    const { body } = await shop
      .as('owner')
      .post('/api/tools')
      .send({ ...die, number: '2' })
      .expect(422);
    expect(faultsOf(body)).toEqual(['number']);
  });

  it('changes only what is named', async () => {
    const tool = await add({ ...plate, slot: 'B1' });
    const { body } = await change(tool, { cost: '50' }).expect(200);
    expect(body).toEqual({ ...tool, cost: '50.00', version: tool.version + 1 });
    await change(tool, { cost: '51' }).expect(412);
    await shop.as('owner').patch(`/api/tools/${tool.id}`).send({ cost: '52' }).expect(428);
  });

  it('goes from on order to the rack to scrap, and not back', async () => {
    const tool = await add({ ...die, state: 'on order' });
    const refused = await count(tool, 5).expect(409);
    expect(refused.body.allowed).toEqual(['on the rack']);
    const onRack = (await change(tool, { state: 'on the rack' }).expect(200)).body as ToolReply;
    for (const state of ['on order', 'scrapped', 'returned']) {
      expect((await change(onRack, { state }).expect(409)).body.allowed).toEqual([]);
    }
    const scrapped = (await end(tool, 'scrappings').expect(201)).body as ToolReply;
    expect(scrapped.state).toBe('scrapped');
    expect((await change(scrapped, { state: 'on the rack' }).expect(409)).body.allowed).toEqual([]);
    expect((await end(tool, 'scrappings').expect(409)).body.detail).toContain('scrapped already');
    expect((await count(tool, 5).expect(409)).body.detail).toContain('Choose another one.');
  });

  it('is found by kind, state and words', async () => {
    const tool = await add({ ...plate, name: 'Rowing oars', slot: 'C7' });
    const list = async (query: string) =>
      (await shop.as('maker').get(`/api/tools?${query}`).expect(200)).body.items as ToolReply[];
    expect((await list('q=oars')).map(({ id }) => id)).toEqual([tool.id]);
    expect((await list('q=C7')).map(({ id }) => id)).toEqual([tool.id]);
    expect((await list('kind=cutting+die')).every(({ kind }) => kind === 'cutting die')).toBe(true);
    expect(await list('state=on+the+rack&q=oars')).toHaveLength(1);
    expect(await list('state=scrapped&q=oars')).toEqual([]);
  });
});

describe('a customer’s own tool', () => {
  let customerId: number;
  beforeAll(async () => {
    const customer = {
      ...{ name: 'Brambling Brewery', contactName: 'The bar' },
      ...{ email: 'bar@example.com', address: 'Maltings Lane' },
    };
    const { body } = await shop.as('owner').post('/api/customers').send(customer).expect(201);
    customerId = body.id;
  });

  async function customersOwn(keptUntil: string | null): Promise<ToolReply> {
    return add({ ...plate, ownedBy: 'customer', customerId, keptUntil });
  }
  const toDos = async (role: 'owner' | 'maker') =>
    ((await shop.as(role).get('/api/today').expect(200)).body as Today).now.filter(
      ({ kind }) => kind === 'give back',
    );

  it('is kept for its term, shows on the owner’s Today from the last day on, and is given back', async () => {
    const tool = await customersOwn('2026-12-01');
    const later = await customersOwn('2026-12-02');
    expect([tool.termOver, later.termOver]).toEqual([true, false]);
    expect(await toDos('owner')).toEqual([
      expect.objectContaining({
        title: 'Give back or scrap',
        detail: `Brambling Brewery’s own stamp plate ${tool.number}`,
        when: { word: 'kept until', day: '2026-12-01' },
        late: false,
        to: `/pattern-room/tooling/${tool.id}`,
      }),
    ]);
    expect(await toDos('maker')).toEqual([]);
    const back = (await end(tool, 'returns').expect(201)).body as ToolReply;
    expect(back).toMatchObject({ state: 'returned', termOver: false });
    expect(await toDos('owner')).toEqual([]);
    const { body: log } = await shop.as('owner').get('/api/activities').expect(200);
    expect(log.items[0]).toMatchObject({
      action: `gave stamp plate ${tool.number}, Heron crest back to Brambling Brewery`,
      actorName: 'The owner',
    });
    await end(tool, 'returns').expect(409);
    const { body } = await change(back, { ownedBy: 'shop', keptUntil: null }).expect(422);
    expect(faultsOf(body)).toEqual(['ownedBy']);
    await change(back, { state: 'on the rack', keptUntil: null }).expect(200);
    await end(later, 'scrappings').expect(201);
  });

  it('is given back by nobody but the owner, and the shop’s own by nobody', async () => {
    const tool = await customersOwn(null);
    await shop.as('maker').post(`/api/tools/${tool.id}/returns`).send({}).expect(403);
    await shop.as('maker').post(`/api/tools/${tool.id}/scrappings`).send({}).expect(403);
    const { body } = await end(await add(die), 'returns').expect(409);
    expect(body.detail).toContain('is the shop’s own');
    await shop.as('owner').post('/api/tools/987654/returns').send({}).expect(404);
  });

  it('becomes the shop’s own only without its term', async () => {
    const tool = await customersOwn('2027-03-31');
    expect(faultsOf((await change(tool, { ownedBy: 'shop' }).expect(422)).body)).toEqual([
      'keptUntil',
    ]);
    await change(tool, { ownedBy: 'shop', keptUntil: null }).expect(200);
  });
});

describe('the ledger of impressions', () => {
  it('sums to what the tool shows, and takes back no more than was counted', async () => {
    const tool = await add(plate);
    await count(tool, 900).expect(201);
    const worn = (await count(tool, 150).expect(201)).body as ToolReply;
    expect(worn).toMatchObject({ used: 1050, usesLeft: 0 });
    const { body } = await count(tool, -1051, 'counted twice').expect(422);
    expect(faultsOf(body)).toEqual(['uses']);
    expect((await count(tool, -150, 'counted twice').expect(201)).body).toMatchObject({
      used: 900,
      usesLeft: 100,
    });
    const { body: rows } = await shop
      .as('maker')
      .get(`/api/tools/${tool.id}/impressions`)
      .expect(200);
    expect(rows.items.map((row: { uses: number }) => row.uses)).toEqual([-150, 150, 900]);
    expect(rows.items[0]).toMatchObject({
      reason: 'counted twice',
      actorName: 'The maker',
      jobNumber: null,
    });
  });

  it('does not make the owner’s open edit stale', async () => {
    const tool = await add(plate);
    await count(tool, 10).expect(201);
    const { body } = await change(tool, { slot: 'D4' }).expect(200);
    expect(body).toMatchObject({ slot: 'D4', used: 10 });
  });

  it('takes nothing half: what fails later in the same use case leaves no count', async () => {
    const tool = await add(plate);
    const failing = inTransaction(shop.context, theProgram, async (work) => {
      await addImpressions(work, { toolId: tool.id, uses: 7, jobId: null });
      throw new Error('the power went');
    });
    await expect(failing).rejects.toThrow('the power went');
    const em = shop.context.orm.em.fork();
    expect((await em.findOneOrFail(Tool, tool.id)).used).toBe(0);
    expect(await em.count(Impression, { toolId: tool.id })).toBe(0);
  });

  it('counts every one of several at once', async () => {
    const tool = await add(plate);
    await Promise.all(Array.from({ length: 8 }, () => count(tool, 3).expect(201)));
    expect((await shop.as('maker').get(`/api/tools/${tool.id}`)).body.used).toBe(24);
  });
});

describe('a tool is refused', () => {
  it.each([
    ['a negative cost', { ...die, cost: '-1' }, 'cost'],
    ['a cost with three decimals', { ...die, cost: '1.005' }, 'cost'],
    ['a life of nothing', { ...die, lifeUses: 0 }, 'lifeUses'],
    ['a life of NaN', { ...die, lifeUses: Number.NaN }, 'lifeUses'],
    ['a customer’s own of nobody', { ...die, ownedBy: 'customer' }, 'customerId'],
    ['a term for the shop’s own', { ...die, keptUntil: '2027-01-31' }, 'keptUntil'],
    ['a term that is no day', { ...die, keptUntil: 'spring' }, 'keptUntil'],
    ['an owner of another sort', { ...die, ownedBy: 'a friend' }, 'ownedBy'],
    ['a plate without a metal', { ...plate, metal: '' }, 'metal'],
    ['a die of magnesium', { ...die, metal: 'magnesium' }, 'metal'],
    ['a plate of gold', { ...plate, metal: 'gold' }, 'metal'],
    ['no name', { ...die, name: '' }, 'name'],
    ['another kind', { ...die, kind: 'hammer' }, 'kind'],
    ['a pattern that is not there', { ...die, patternId: 999_999 }, 'patternId'],
    ['a customer who is not there', { ...plate, customerId: 999_999 }, 'customerId'],
    ['uses that no ledger knows', { ...die, used: 5 }, 'used'],
  ])('for %s', async (_what, body, field) => {
    const reply = await shop.as('owner').post('/api/tools').send(body).expect(422);
    expect(faultsOf(reply.body)).toEqual([field]);
  });

  it('for counts that are none', async () => {
    const tool = await add(die);
    for (const uses of [0, 1.5, 'many']) {
      const { body } = await shop
        .as('maker')
        .post(`/api/tools/${tool.id}/impressions`)
        .send({ uses, reason: 'x' })
        .expect(422);
      expect(faultsOf(body)).toEqual(['uses']);
    }
    expect(faultsOf((await count(tool, 5, ' ').expect(422)).body)).toEqual(['reason']);
  });

  it('to whom it is not open; the maker reads no cost', async () => {
    const tool = await add(die);
    await shop.as('maker').post('/api/tools').send(die).expect(403);
    await shop
      .as('maker')
      .patch(`/api/tools/${tool.id}`)
      .set('If-Match', '"1"')
      .send({ slot: 'Z' })
      .expect(403);
    await shop.as('bookkeeper').get('/api/tools').expect(403);
    await shop.nobody().get('/api/tools').expect(401);
    const { body } = await shop.as('maker').get(`/api/tools/${tool.id}`).expect(200);
    expect(body).not.toHaveProperty('cost');
    expect((await shop.as('owner').get(`/api/tools/${tool.id}`)).body.cost).toBe('84.00');
  });
});
