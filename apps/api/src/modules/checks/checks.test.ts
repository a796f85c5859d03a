import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import type { PurchaseOrder, RunsCheck } from '@hidewright/contract';
import {
  agreedQuote,
  readyForTheBench,
  takenOn,
  type BenchShop,
} from '../../testing/bench-shop.ts';
import { draftQuote } from '../../testing/example-quote.ts';
import { startTestShop } from '../../testing/test-shop.ts';

let ready: BenchShop;

beforeEach(async () => {
  ready = await readyForTheBench(await startTestShop());
});
afterEach(() => ready.shop.close());

const as = (role: 'owner' | 'maker' | 'bookkeeper') => ready.shop.as(role);
const post = (runs: object[], role: 'owner' | 'maker' | 'bookkeeper' = 'maker') =>
  as(role).post('/api/checks').send({ runs });
const check = async (runs: object[]) => (await post(runs).expect(200)).body as RunsCheck;
const draft = async (runs: object[]) =>
  (await as('owner').post('/api/checks/purchase-orders').send({ runs }).expect(201)).body as {
    orders: PurchaseOrder[];
    notes: string[];
  };
const rivetsOf = ({ runs }: RunsCheck, at: number) =>
  runs[at]?.answers.find(({ about }) => about === 'hardware');

/** Who sells the rivets and the leather, and how long they take. */
async function nameSuppliers(): Promise<void> {
  const sells = async (name: string, leadDays: number) =>
    (await as('owner').post('/api/suppliers').send({ name, leadDays }).expect(201)).body as {
      id: number;
    };
  const fittings = await sells('Fennbridge Fittings', 3);
  const tannery = await sells('Oldbeck Tannery', 9);
  await change(`hardware/${ready.hardwareId}`, { supplierId: fittings.id });
  await change(`leathers/${ready.leatherId}`, {
    supplierId: tannery.id,
    wholeForm: 'side',
    wholeAreaMm2: '2043866.88',
  });
}

async function change(path: string, body: object): Promise<void> {
  const { version } = (await as('owner').get(`/api/${path}`).expect(200)).body as {
    version: number;
  };
  await as('owner').patch(`/api/${path}`).set('If-Match', `"${version}"`).send(body).expect(200);
}

async function orderRivets(quantity: number, expectedOn: string): Promise<string> {
  const { hardwareId } = ready;
  const supplier = await as('owner')
    .post('/api/suppliers')
    .send({ name: 'Kettlewell' })
    .expect(201);
  const lines = [{ of: 'hardware', hardwareId, quantity, unitPrice: '0.17' }];
  const order = await as('owner')
    .post('/api/purchase-orders')
    .send({ supplierId: supplier.body.id, expectedOn, lines })
    .expect(201);
  await as('owner')
    .post(`/api/purchase-orders/${order.body.id}/sendings`)
    .send({ by: 'hand' })
    .expect(201);
  return order.body.number as string;
}

describe('Can we make them?', () => {
  it('gives the second run what the first leaves, by its day and not by its place', async () => {
    const { patternId } = ready;
    const late = { patternId, quantity: 60, by: '2026-12-16' };
    const early = { patternId, quantity: 100, by: '2026-12-11' };
    const found = await check([late, early]);
    expect(found.runs.map(({ turn, name }) => [turn, name])).toEqual([
      [2, 'Round coaster'],
      [1, 'Round coaster'],
    ]);
    expect([rivetsOf(found, 0)?.free, rivetsOf(found, 1)?.free]).toEqual(['100', '300']);
    expect([rivetsOf(found, 0)?.short, rivetsOf(found, 1)?.short]).toEqual(['20', '0']);
    expect(found.yes).toBe(false);
    expect((await check([late])).runs[0]?.yes).toBe(true);
    expect(found.runs[0]?.notes).toContain(
      'A stamp plate is cut for each design: allow for its days.',
    );
    expect((await as('owner').get('/api/reservations')).body).toMatchObject({ items: [] });
  });

  it('pictures leather by whole panels, and says what lies in ends', async () => {
    const [{ patternId }, by] = [ready, '2026-12-16'];
    const found = await check([
      { patternId, quantity: 61, by },
      { patternId, quantity: 90, by },
    ]);
    const [leather] = found.short.filter(({ of }) => of === 'leather');
    const answers = found.runs.map((run) => run.answers[0]);
    const sum = (part: 'freeNow' | 'short') =>
      answers.reduce((total, answer) => total + Number(answer?.[part]), 0);
    expect(sum('short')).toBeGreaterThan(0);
    expect(Number(leather?.onHand)).toBe(sum('freeNow'));
    expect(Number(leather?.ends)).toBeGreaterThan(0);
    expect(Number(leather?.days.at(-1)?.left)).toBe(-sum('short'));
  });

  it('counts on what is on order in time, and names the day by which the rest can be mended', async () => {
    await nameSuppliers();
    const number = await orderRivets(100, '2026-12-08');
    const quote = await agreedQuote(ready, 50);
    const others = { patternId: ready.patternId, quantity: 150, by: '2026-12-03' };
    const found = await check([{ quoteId: quote.id, by: '2026-12-16' }, others]);
    expect(rivetsOf(found, 0)).toMatchObject({ freeNow: '0', free: '100', short: '0' });
    expect(rivetsOf(found, 0)?.sentence).toBe(
      `Rivet 9 mm: 0 of 100 are free now. The rest comes with ${number} by Tue 8 Dec 2026, in time.`,
    );
    const leather = found.short.find(({ of }) => of === 'leather');
    expect(leather).toMatchObject({ supplierName: 'Oldbeck Tannery', arrivesOn: '2026-12-10' });
    expect(leather?.runsOutOn).not.toBeNull();
    expect(Number(leather?.days.at(-1)?.left)).toBeLessThan(0);
    const [, second] = found.runs;
    expect(second?.answers[0]?.sentence).toMatch(
      /short\. Buy 1 more side, or receive it if it is here\. Ordered from Oldbeck Tannery today, it is here by Thu 10 Dec 2026\.$/,
    );
    expect(second?.earliestDay).toBe('2026-12-10');
    expect(JSON.stringify(found)).not.toMatch(/price|cost|total|9\.5|0\.17/i);
  });

  it('keeps what a job taken on still needs, and holds no more than is free of that', async () => {
    await nameSuppliers();
    const big = await agreedQuote(ready, 250);
    const order = { quoteId: big.id, promisedOn: '2026-12-16', evenIfShort: true };
    await as('owner').post('/api/orders').send(order).expect(201);
    const receipt = { hardware: [{ hardwareId: ready.hardwareId, quantity: 250, cost: '42.00' }] };
    await as('owner').post('/api/receipts').send(receipt).expect(201);
    const found = await check([{ patternId: ready.patternId, quantity: 50, by: '2026-12-18' }]);
    // 250 came, 200 of them are owed to the job that holds only 300 of 500.
    expect(rivetsOf(found, 0)).toMatchObject({ needed: '100', freeNow: '50', short: '50' });
    const rivets = found.short.find(({ of }) => of === 'hardware');
    expect(rivets).toMatchObject({ onHand: '550', reserved: '300', needed: '100', buy: '50' });
    expect(rivets?.days.map(({ what, goes }) => [what[0], goes])).toContainEqual([
      'J-0001 Coasters with a bramble',
      '200',
    ]);
  });

  it('owes a job no more of what it has something else in place of', async () => {
    const brass = await as('owner')
      .post('/api/hardware')
      .send({ name: 'Rivet 9 mm, brass', unitPrice: '0.20' })
      .expect(201);
    const { hardwareId } = ready;
    const standIns = [{ hardwareId: brass.body.id, bothWays: true }];
    await change(`hardware/${hardwareId}`, { standIns });
    const big = await agreedQuote(ready, 250);
    const order = { quoteId: big.id, promisedOn: '2026-12-16', evenIfShort: true };
    const taken = await as('owner').post('/api/orders').send(order).expect(201);
    const job = `/api/jobs/${taken.body.job.id}`;
    const hardware = [
      { hardwareId, quantity: 250, cost: '42.00' },
      { hardwareId: brass.body.id, quantity: 12, cost: '2.40' },
    ];
    await as('owner').post('/api/receipts').send({ hardware }).expect(201);
    const ticket = await as('maker').get(job).expect(200);
    expect(ticket.body.hardware).toHaveLength(1);
    expect(ticket.body.standIns).toMatchObject([
      {
        hardwareId: brass.body.id,
        needed: 0,
        free: 12,
        standsInFor: [{ name: 'Rivet 9 mm', inKit: null }],
      },
    ]);
    const other = { patternId: ready.patternId, quantity: 50, by: '2026-12-18' };
    const freeNow = async () => rivetsOf(await check([other]), 0)?.freeNow;
    expect(await freeNow()).toBe('50');
    const some = { hardwareId: brass.body.id, quantity: 7 };
    const held = await as('maker').post(`${job}/reservations`).send(some).expect(201);
    expect(held.body.standIns).toEqual([]);
    expect(held.body.hardware).toContainEqual(
      expect.objectContaining({ ...{ hardwareId: brass.body.id, held: 7, needed: 0 } }),
    );
    expect(await freeNow()).toBe('57');
    await as('maker')
      .post(`${job}/takings`)
      .send({ hardwareId: brass.body.id, quantity: 12 })
      .expect(201);
    expect(await freeNow()).toBe('62');
  });

  it('takes a layout on the lot as drawn at its word, flaws and all', async () => {
    const side = [
      { x: 0, y: 0 },
      { x: 1200, y: 0 },
      { x: 1200, y: 900 },
      { x: 0, y: 900 },
    ];
    const flaw = [
      { x: 100, y: 100 },
      { x: 1100, y: 100 },
      { x: 1100, y: 700 },
      { x: 100, y: 700 },
    ];
    const drawing = { outline: side, flaws: [flaw], usablePercent: '85' };
    const { version } = (await as('owner').get(`/api/lots/${ready.lotId}`).expect(200)).body as {
      version: number;
    };
    await as('maker')
      .put(`/api/lots/${ready.lotId}/drawing`)
      .set('If-Match', `"${version}"`)
      .send(drawing)
      .expect(200);
    const run = { patternId: ready.patternId, quantity: 10, by: '2026-12-16' };
    const [unlaid] = (await check([run])).runs;
    // 480,000 of 1,080,000 mm² are sound: five panels, though 85 % would be ten.
    expect(unlaid?.lots[0]?.sentence).toMatch(/by its usable share/);
    expect((await check([{ ...run, quantity: 60 }])).runs[0]?.answers[0]).toMatchObject({
      free: String(5 * 92257.88),
    });
    const laid = await as('maker')
      .post(`/api/lots/${ready.lotId}/layouts`)
      .send({ patternId: ready.patternId });
    expect(laid.status, JSON.stringify(laid.body)).toBeLessThan(300);
    const [byLayout] = (await check([run])).runs;
    expect(byLayout?.lots[0]).toMatchObject({ by: 'layout' });
    const { cutCount = 0 } = byLayout ?? {};
    expect(byLayout?.lots[0]?.sentence).toBe(
      `${cutCount} pieces by its layout; ${laid.body.pieces - cutCount} more fit`,
    );
  });
});

describe('offcuts and ready panels on the rack', () => {
  const run = (quantity: number) => ({ patternId: ready.patternId, quantity, by: '2026-12-16' });
  const hang = async (...lots: object[]) => {
    const asked = lots.map((lot) => ({ leatherId: ready.leatherId, cost: '10.00', ...lot }));
    await as('owner').post('/api/receipts').send({ lots: asked }).expect(201);
  };

  /** Nothing but offcuts and panels is on the rack. */
  beforeEach(async () => {
    const gone = { of: 'lot', lotId: ready.lotId, areaMm2: '0', reason: 'sold whole' };
    await as('owner').post('/api/adjustments').send(gone).expect(201);
  });

  it('cut from an offcut what lies within its sides, and nothing from one that is too narrow', async () => {
    const narrow = { tag: 'OC-1', form: 'offcut', widthMm: '3000', heightMm: '100' };
    const wide = { tag: 'OC-2', form: 'offcut', widthMm: '600', heightMm: '340' };
    await hang({ ...narrow, measuredAreaMm2: '300000' }, { ...wide, measuredAreaMm2: '204000' });
    const [small] = (await check([run(5)])).runs;
    expect(small?.lots).toMatchObject([{ tag: 'OC-2', by: 'panels', takesAreaMm2: '102000' }]);
    expect(small?.lots[0]?.sentence).toMatch(/^1 panel for \d pieces; 1 more fits$/);
    const [large] = (await check([run(50)])).runs;
    expect(large?.lots).toMatchObject([{ tag: 'OC-2', pieces: 16 }]);
    expect(large?.answers[0]).toMatchObject({ freeNow: '204000', enough: false });
  });

  it('say what is short in plain words where none of them is large enough', async () => {
    const small = { tag: 'PN-1', form: 'panel', widthMm: '250', heightMm: '300', pieces: 40 };
    await hang({ ...small, measuredAreaMm2: '3000000' });
    const [found] = (await check([run(5)])).runs;
    expect(found?.lots).toEqual([]);
    expect(found?.answers[0]).toMatchObject({ freeNow: '0', free: '0', enough: false });
    expect(found?.answers[0]?.sentence).toBe(
      'Oak tan 5–6 oz: 0.99 ft² needed, 0 ft² free in whole panels, 0.99 ft² short. Too small for its panels: PN-1. Buy about 1.2 ft² more, or receive it if it is here. Say who sells it, and the day can be told.',
    );
  });
});

describe('hardware that something else could do for, or the customer brings', () => {
  const run = () => ({ patternId: ready.patternId, quantity: 200, by: '2026-12-21' });

  it('says what can stand in, for one of the runs only', async () => {
    const { hardwareId } = ready;
    const brass = await as('owner')
      .post('/api/hardware')
      .send({ name: 'Rivet 9 mm, brass', unitPrice: '0.20' })
      .expect(201);
    const hardware = [{ hardwareId: brass.body.id, quantity: 12, cost: '2.40' }];
    await as('owner').post('/api/receipts').send({ hardware }).expect(201);
    const standIns = [{ hardwareId: brass.body.id, bothWays: false }];
    await change(`hardware/${hardwareId}`, { standIns });
    const found = await check([run(), run()]);
    expect(rivetsOf(found, 0)).toMatchObject({ short: '100', enough: false });
    expect(rivetsOf(found, 0)?.sentence).toMatch(
      / 12 of Rivet 9 mm, brass can stand in for 12 of the 100 that are short, if you choose so\.$/,
    );
    expect(rivetsOf(found, 1)?.sentence).not.toContain('stand in');
  });

  it('asks for what the customer brings, and drafts none of it', async () => {
    await nameSuppliers();
    await change(`hardware/${ready.hardwareId}`, { fromCustomer: true });
    const found = await check([run()]);
    expect(rivetsOf(found, 0)?.sentence).toBe(
      'Rivet 9 mm, from the customer: 400 needed, 300 here, 100 missing. Ask the customer for them, and receive them here.',
    );
    const short = found.short.find(({ of }) => of === 'hardware');
    expect(short).toMatchObject({ fromCustomer: true, buy: '0', supplierName: null });
    const { orders, notes } = await draft([run()]);
    expect(orders.map(({ supplierName }) => supplierName)).toEqual(['Oldbeck Tannery']);
    expect(notes).toEqual(['Rivet 9 mm comes from the customer: ask for it.']);
  });
});

describe('drafting what is short', () => {
  it('drafts one order for each supplier in full packs, and nothing twice', async () => {
    await nameSuppliers();
    const runs = [
      { patternId: ready.patternId, quantity: 200, by: '2026-12-21' },
      { quoteId: (await draftQuote(ready)).id, quantity: 100, by: '2026-12-18' },
    ];
    const first = await draft(runs);
    expect(first.orders.map(({ supplierName, lines }) => [supplierName, lines.length])).toEqual(
      expect.arrayContaining([
        ['Fennbridge Fittings', 1],
        ['Oldbeck Tannery', 1],
      ]),
    );
    const rivets = first.orders.find(({ supplierName }) => supplierName === 'Fennbridge Fittings');
    expect(rivets).toMatchObject({
      state: 'draft',
      expectedOn: null,
      arrivesOn: '2026-12-04',
      note: '',
      draftedFor: 'Round coaster, packed by Mon 21 Dec 2026',
      lines: [{ quantity: 300 }],
    });
    const again = await draft(runs);
    expect(again.orders).toEqual([]);
    expect(again.notes).toContain(
      `Rivet 9 mm is on draft ${rivets?.number}, which you still have to send.`,
    );
    expect(rivetsOf(await check(runs), 0)?.sentence).toContain(
      `${rivets?.number} is drafted for it and still to be sent.`,
    );
  });

  it('names what nobody is known to sell, and is for the owner', async () => {
    const runs = [{ patternId: ready.patternId, quantity: 200 }];
    const { orders, notes } = await draft(runs);
    expect(orders).toEqual([]);
    expect(notes).toContain('Rivet 9 mm has no supplier. Say who sells it, then draft again.');
    await as('maker').post('/api/checks/purchase-orders').send({ runs }).expect(403);
    await post(runs, 'bookkeeper').expect(403);
  });
});

describe('what makes no sense', () => {
  it('is refused beside its field', async () => {
    const { patternId } = ready;
    const quote = await agreedQuote(ready);
    const refused = async (runs: object[]) => {
      const reply = await post(runs).expect(422);
      return (reply.body.errors as { field: string; message: string }[]).map(
        ({ field, message }) => `${field}: ${message}`,
      );
    };
    expect(await refused([{ patternId: 999, quantity: 5 }])).toEqual([
      'runs.0.patternId: This pattern is not there. Choose one from the list.',
    ]);
    expect(await refused([{ patternId, quantity: 0 }])).toEqual([
      'runs.0.quantity: Enter 1 or more pieces.',
    ]);
    expect(await refused([{ patternId }])).toEqual(['runs.0.quantity: Enter how many.']);
    expect(await refused([{ patternId, quantity: 5, by: '2026-11-30' }])).toEqual([
      'runs.0.by: That day is over. Choose today or a day to come.',
    ]);
    expect(await refused([{ quoteId: quote.id }, { quoteId: quote.id }])).toEqual([
      'runs.1.quoteId: This quote is chosen already. Check it once, with all of its quantity.',
    ]);
    expect(await refused([{ quoteId: 999 }])).toEqual([
      'runs.0.quoteId: This quote is not there. Choose one from the list.',
    ]);
    expect(await refused([{ quoteId: quote.id, option: 'In gold' }])).toEqual([
      `runs.0.option: ${quote.number} offers no option "In gold". Choose one that it offers.`,
    ]);
    expect(await refused([{ patternId, quantity: 5, option: 'In gold' }])).toHaveLength(1);
    expect(await refused([{}])).toHaveLength(1);
    expect(await refused([{ patternId, quoteId: quote.id, quantity: 5 }])).toHaveLength(1);
    await post([]).expect(422);
  });

  it('is refused for a quote that is taken on already', async () => {
    const order = await takenOn(ready);
    const reply = await post([{ quoteId: order.quoteId }]).expect(422);
    expect(reply.body.errors[0].message).toBe(
      `${order.quoteNumber} is taken on as ${order.number}: what it needs is held already.`,
    );
  });
});
