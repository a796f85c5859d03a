import { afterAll, afterEach, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import type { ToolForRun, ToolingAdviceReply } from '@hidewright/contract';
import { readyForTheBench, type BenchShop } from '../../testing/bench-shop.ts';
import { startTestShop } from '../../testing/test-shop.ts';

let ready: BenchShop;
const open = async () => {
  ready = await readyForTheBench(await startTestShop());
};
const close = () => ready.shop.close();

const owner = () => ready.shop.as('owner');

async function advise(query: object, customerId: number | null = ready.customer.id) {
  const asked = { pieces: '500', ...(customerId !== null && { customerId: String(customerId) }) };
  const search = new URLSearchParams({ ...asked, ...query }).toString();
  const path = `/api/patterns/${ready.patternId}/tooling-advice?${search}`;
  return (await owner().get(path).expect(200)).body as ToolingAdviceReply;
}
const about = (advice: ToolingAdviceReply, kind: ToolForRun['kind']) =>
  advice.tools.find((each) => each.kind === kind) as ToolForRun;
const offer = (metal: string, price: string, lifeUses: number) =>
  owner().post('/api/plate-offers').send({ metal, price, lifeUses }).expect(201);
const count = (id: number, uses: number) =>
  owner().post(`/api/tools/${id}/impressions`).send({ uses, reason: 'a trial' }).expect(201);

// Common practice, no source: a magnesium plate lasts some 10,000 strikes, a brass one some 100,000 at five to ten
// times the price.
async function offerTwo(): Promise<void> {
  await offer('magnesium', '46.00', 10_000);
  await offer('brass', '322.00', 100_000);
}

describe('advice on tooling', () => {
  beforeEach(open);
  afterEach(close);

  it('names the die and the plate that are there, with what they have left', async () => {
    const advice = await advise({});
    expect(about(advice, 'cutting die')).toMatchObject({
      strikes: 500,
      enough: true,
      enoughInAll: true,
      replacedAfter: null,
      tool: { number: '7', usesLeft: 50_000 },
      sentence:
        'Cutting die 7 in slot C3 has 50,000 cuts left: enough for the 500 of this run, so it need not be charged again.',
    });
    expect(about(advice, 'stamp plate').tool?.number).toBe('41');
    expect(advice.metals).toMatchObject({ left: 2_000, leastNow: null, rows: [] });
  });

  it('says that a plate is replaced in the middle of the run, after how many, and what that costs', async () => {
    await offerTwo();
    await count(ready.plateId, 1_700);
    const { metals, ...advice } = await advise({});
    expect(about({ metals, ...advice }, 'stamp plate')).toMatchObject({
      enough: false,
      replacedAfter: 300,
      newCost: '46.00',
      sentence:
        'Stamp plate 41 has 300 impressions left: it will be replaced after 300 of the 500. Order a new one before the run begins.',
    });
    expect(metals?.leastNow).toEqual({ metal: 'magnesium', cost: '46.00', plates: 1 });
    expect(metals?.rows[0]?.now).toMatchObject({ changes: 1, firstChangeAfter: 300 });
  });

  it('reckons the repeats: which metal costs least over them, and from how many impressions', async () => {
    await offerTwo();
    const advice = await advise({ pieces: '2000', runs: '40', runPieces: '2500' });
    expect(about(advice, 'stamp plate')).toMatchObject({ enough: true, enoughInAll: false });
    expect(advice.metals).toMatchObject({
      impressionsInAll: 102_000,
      leastNow: null,
      leastInAll: { metal: 'brass', cost: '322.00', plates: 1 },
      turns: [{ cheap: 'magnesium', dear: 'brass', from: 72_001 }],
    });
  });

  it('says of a tool without life left that it has none', async () => {
    await count(ready.dieId, 50_000);
    expect(about(await advise({}), 'cutting die')).toMatchObject({
      enough: false,
      replacedAfter: null,
      newCost: '90.00',
      sentence: expect.stringContaining('has no life left') as string,
    });
  });

  it('counts a strike once for all the pieces that a die cuts with it', async () => {
    const four = {
      ...{ kind: 'cutting die', name: 'Four at once', cost: '180.00', lifeUses: 60_000 },
      ...{ patternId: ready.patternId, piecesPerStrike: 4 },
    };
    await owner().post('/api/tools').send(four).expect(201);
    expect(about(await advise({ pieces: '501', runs: '2' }), 'cutting die')).toMatchObject({
      strikes: 126,
      strikesInAll: 378,
      tool: { name: 'Four at once' },
    });
  });

  it('looks at no plate of a customer before the customer is named', async () => {
    const nobody = about(await advise({}, null), 'stamp plate');
    expect(nobody.tool).toBeNull();
    expect(nobody.sentence).toContain('Name the customer');
  });

  it('chooses nothing that was scrapped or given back; one on order is named', async () => {
    await owner().post(`/api/tools/${ready.plateId}/scrappings`).send({}).expect(201);
    const own = {
      ...{ kind: 'stamp plate', name: 'Their own', metal: 'brass', cost: '0', lifeUses: 90_000 },
      ...{ patternId: ready.patternId, customerId: ready.customer.id, ownedBy: 'customer' },
    };
    const { body } = await owner().post('/api/tools').send(own).expect(201);
    expect(about(await advise({}), 'stamp plate').sentence).toContain(
      'It is Brambling Brewery’s own.',
    );
    await owner().post(`/api/tools/${body.id}/returns`).send({}).expect(201);
    expect(about(await advise({}), 'stamp plate')).toMatchObject({ tool: null, onOrder: null });
    const ordered = { ...own, name: 'New', ownedBy: 'shop', state: 'on order', number: '77' };
    await owner().post('/api/tools').send(ordered).expect(201);
    expect(about(await advise({}), 'stamp plate')).toMatchObject({ tool: null, onOrder: '77' });
  });
});

describe('what is asked', () => {
  beforeAll(open);
  afterAll(close);

  it.each([
    ['pieces', 'pieces=0'],
    ['pieces', 'pieces=1.5'],
    ['pieces', 'pieces=many'],
    ['pieces', ''],
    ['runs', 'pieces=5&runs=-1'],
    ['runPieces', 'pieces=5&runPieces=0'],
    ['customerId', 'pieces=5&customerId=x'],
  ])('refuses %s where it makes no sense (%s)', async (field, search) => {
    const path = `/api/patterns/${ready.patternId}/tooling-advice?${search}`;
    const { body } = await owner().get(path).expect(422);
    expect(body.errors).toEqual([
      { field, message: expect.stringMatching(/^(Enter|Choose)/) as string },
    ]);
  });

  it('is the owner’s, of a pattern and a customer that are there', async () => {
    const path = `/api/patterns/${ready.patternId}/tooling-advice?pieces=5`;
    await ready.shop.as('maker').get(path).expect(403);
    await owner().get('/api/patterns/987654/tooling-advice?pieces=5').expect(404);
    await owner().get(`${path}&customerId=987654`).expect(404);
  });
});
