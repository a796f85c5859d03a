import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import type { OrderSuggestionReply, PurchaseOrder } from '@hidewright/contract';
import { ft2, orderMore, stockUp } from '../../testing/stockroom.ts';
import { startTestShop } from '../../testing/test-shop.ts';
import { inTransaction, theProgram } from '../../work.ts';
import { takeStock } from '../stock/stock-ledger.ts';

let shop: Awaited<ReturnType<typeof startTestShop>>;
let things: Awaited<ReturnType<typeof stockUp>>;

beforeAll(async () => {
  shop = await startTestShop();
});
afterAll(() => shop.close());
beforeEach(async () => {
  things = await stockUp(shop);
});

const owner = () => shop.as('owner');

async function suggestions(show = 'all', role: 'owner' | 'maker' = 'owner') {
  const { body } = await shop.as(role).get(`/api/order-suggestions?show=${show}`).expect(200);
  return body as { items: OrderSuggestionReply[]; fine: number; orderCost?: string };
}

async function rivets(role: 'owner' | 'maker' = 'owner'): Promise<OrderSuggestionReply> {
  const { items } = await suggestions('all', role);
  const found = items.find(({ of, id }) => of === 'hardware' && id === things.hardwareId);
  return found as OrderSuggestionReply;
}

async function leather(): Promise<OrderSuggestionReply> {
  const { items } = await suggestions();
  return items.find(({ of, id }) => of === 'leather' && id === things.leatherId) as never;
}

async function change(of: 'hardware' | 'leathers', id: number, body: object): Promise<void> {
  const { body: now } = await owner().get(`/api/${of}/${id}`).expect(200);
  await owner()
    .patch(`/api/${of}/${id}`)
    .set('If-Match', `"${now.version}"`)
    .send(body)
    .expect(200);
}

const sold = () => change('hardware', things.hardwareId, { supplierId: things.supplierId });

const receive = (quantity: number) =>
  owner()
    .post('/api/receipts')
    .send({ lots: [], hardware: [{ hardwareId: things.hardwareId, quantity, cost: '10.00' }] })
    .expect(201);

const draft = (lines: object[]) =>
  owner().post('/api/order-suggestions/purchase-orders').send({ lines });

const lineFor = (item: OrderSuggestionReply, more: object = {}) => ({
  ...{ of: item.of, id: item.id, quantity: item.quantity, drafted: item.drafted },
  ...more,
});

describe('what to order', () => {
  it('is what is free and on order below the minimum, in packs, with why', async () => {
    await sold();
    await receive(120);
    expect(await rivets()).toMatchObject({
      ...{ state: 'now', onHand: '120', free: '120', onOrder: '0', minimum: '500', point: '500' },
      ...{ pointBy: 'minimum', quantity: '400', usualBy: 'need', multiple: '100' },
      ...{ supplierId: things.supplierId, arrivesOn: '2026-12-11', belowMinimumOn: '2026-12-01' },
      ...{ unitPrice: '0.17', amount: '68.00', usage: { method: 'too little' }, workedOut: null },
      why: '120 free, below the minimum of 500. Order 400 to fill it up.',
    });
  });

  it('names a thing whose row was damaged, and says of the others all the same', async () => {
    await inTransaction(shop.context, theProgram, async ({ em }) => {
      await em.execute('PRAGMA ignore_check_constraints = ON');
      await em.execute('UPDATE hardware SET pack_size = -1 WHERE id = ?', [things.hardwareId]);
      await em.execute('PRAGMA ignore_check_constraints = OFF');
    });
    const { body } = await owner().get('/api/order-suggestions?show=all').expect(200);
    expect(body.unclear).toMatchObject([{ of: 'hardware', id: things.hardwareId }]);
    expect(body.items.map(({ of }: OrderSuggestionReply) => of)).toContain('leather');
    expect(body.items).not.toContainEqual(
      expect.objectContaining({ id: things.hardwareId, of: 'hardware' }),
    );
  });

  it('counts what is on order, and says when nothing is due', async () => {
    await orderMore(shop, things);
    const item = await rivets();
    expect(item).toMatchObject({ state: 'fine', onOrder: '1000', quantity: '0' });
    expect(item.days.find(({ what }) => what[0]?.startsWith('P-'))?.comes).toBe('1000');
    const { items, fine } = await suggestions('due');
    expect(items.map(({ id, of }) => `${of} ${id}`)).not.toContain(`hardware ${things.hardwareId}`);
    expect(fine).toBeGreaterThan(0);
  });

  it('says several of what is counted otherwise than by the piece', async () => {
    await sold();
    await change('hardware', things.hardwareId, { unit: 'pair' });
    expect((await rivets()).why).toContain('below the minimum of 500 pairs.');
  });

  it('asks for leather below its least area, in whole sides', async () => {
    const whole = { wholeForm: 'side', wholeAreaMm2: ft2(22) };
    await change('leathers', things.leatherId, { reorderAtMm2: ft2(50), ...whole });
    expect(await leather()).toMatchObject({
      ...{ state: 'now', unit: 'mm2', quantity: String(Number(ft2(22)) * 3), amount: '594.00' },
      ...{ whole: { areaMm2: ft2(22), form: 'side' }, point: ft2(50) },
      why: 'None free, below the minimum of 50.0 ft². Order 66.0 ft² to fill it up.',
    });
  });

  it('goes by what was used, and by the shop’s own figures', async () => {
    await sold();
    const start = new Date('2025-11-20T09:00:00Z').getTime();
    shop.clock.set(new Date(start));
    await receive(9000);
    for (let week = 0; week < 53; week++) {
      shop.clock.set(new Date(start + (week * 7 + 6) * 86_400_000));
      const quantity = week % 2 === 0 ? 60 : 80;
      await inTransaction(shop.context, theProgram, (work) =>
        takeStock(work, { hardwareId: things.hardwareId, jobId: null, quantity }),
      );
    }
    shop.clock.set(new Date('2026-12-01T09:00:00.000Z'));
    const item = await rivets();
    expect(item.usage).toMatchObject({ periodDays: 7, method: 'smoothing', idlePercent: '0' });
    expect(Number(item.usage.mean)).toBeCloseTo(70, 0);
    expect(item.usage.series).toHaveLength(52);
    expect(Number(item.workedOut?.safety)).toBeGreaterThan(10);
    const { body: workshop } = await owner().get('/api/workshop');
    const rates = { servicePercent: '99', orderCost: '40' };
    await owner()
      .patch('/api/workshop')
      .set('If-Match', `"${workshop.version}"`)
      .send(rates)
      .expect(200);
    const then = await rivets();
    expect(Number(then.workedOut?.safety)).toBeGreaterThan(Number(item.workedOut?.safety));
    // Four times the cost of an order, twice the quantity.
    expect(Number(then.economic) / Number(item.economic)).toBeCloseTo(2, 3);
  });

  it('counts what is put back in a later week as never used', async () => {
    const day = (on: string) => shop.clock.set(new Date(`${on}T09:00:00Z`));
    const leatherId = things.leatherId;
    day('2026-11-10');
    const side = { leatherId, form: 'side', measuredAreaMm2: ft2(22) };
    const { body } = await owner()
      .post('/api/receipts')
      .send({ lots: [side] })
      .expect(201);
    const lotId = body.lots[0].id as number;
    day('2026-11-19');
    const all = Number(ft2(22)) * 1000;
    await inTransaction(shop.context, theProgram, (work) =>
      takeStock(work, { lotId, jobId: null, quantity: all }),
    );
    await shop.context.orm.em.fork().execute(
      `INSERT INTO stock_movement (at, day, kind, lot_id, quantity, value, reason, actor_name)
        VALUES ('2026-11-26T09:00:00.000Z', '2026-11-26', 'return', ?, ?, 0, '', 'The maker')`,
      [lotId, Number(ft2(10)) * 1000],
    );
    day('2026-12-01');
    const { usage } = await leather();
    expect(usage.series).toEqual(['0', String(Number(ft2(12))), '0']);
  });

  it('tells the maker no price, and lets neither the maker nor the bookkeeper order', async () => {
    const item = await rivets('maker');
    expect(item).toMatchObject({ state: 'now' });
    expect(item).not.toHaveProperty('unitPrice');
    expect(item).not.toHaveProperty('amount');
    expect(await suggestions('due', 'maker')).not.toHaveProperty('orderCost');
    await shop.as('bookkeeper').get('/api/order-suggestions').expect(403);
    await shop
      .as('maker')
      .post('/api/order-suggestions/purchase-orders')
      .send({ lines: [lineFor(item)] })
      .expect(403);
  });

  it('asks the database as often for many things as for few', async () => {
    const count = async () => {
      const seen: string[] = [];
      const driver = shop.context.orm.em.getConnection();
      const execute = driver.execute.bind(driver);
      driver.execute = ((sql: string, ...rest: []) => {
        seen.push(String(sql));
        return execute(sql, ...rest);
      }) as never;
      await suggestions();
      driver.execute = execute;
      return seen.length;
    };
    const before = await count();
    await stockUp(shop);
    await stockUp(shop);
    expect(before).toBeGreaterThan(5);
    expect(await count()).toBe(before);
  });
});

describe('a point and a quantity set by hand', () => {
  const set = async (body: object, version?: number) => {
    const item = await rivets();
    return owner()
      .patch(`/api/order-suggestions/hardware/${item.id}`)
      .set('If-Match', `"${version ?? item.version}"`)
      .send(body);
  };

  it('are kept until they are let go', async () => {
    await receive(120);
    expect((await set({ point: '700', quantity: '850' })).body).toMatchObject({
      ...{ point: '700', pointBy: 'hand', quantity: '900', usualBy: 'hand' },
      byHand: { point: '700', quantity: '850' },
      why: '120 free, below the 700 set by hand. Order 900, as set by hand.',
    });
    expect((await set({ point: null, quantity: null })).body).toMatchObject({
      ...{ point: '500', pointBy: 'minimum', quantity: '400' },
    });
  });

  it.each([
    ['at what was paid', '0.17', '9', ['0.17', '9.00']],
    ['at 0.00 where no price was known', '0', '0', ['0.00', '0.00']],
  ])(
    'are ordered from whom it was bought before somebody else made an offer, %s',
    async (_what, unitPrice, pricePerFt2, drafted) => {
      const { supplierId, hardwareId, leatherId } = things;
      await change('hardware', hardwareId, { supplierId, unitPrice });
      await change('leathers', leatherId, {
        pricePerFt2,
        wholeForm: 'side',
        wholeAreaMm2: ft2(22),
      });
      const other = await stockUp(shop);
      const first = { supplierId: other.supplierId, breaks: [{ from: '0', price: '0.01' }] };
      await owner()
        .post('/api/supplier-offers')
        .send({ hardwareId, ...first })
        .expect(201);
      await owner()
        .post('/api/supplier-offers')
        .send({ leatherId, ...first })
        .expect(201);
      await set({ point: '700', quantity: '850' });
      const side = await leather();
      await owner()
        .patch(`/api/order-suggestions/leather/${leatherId}`)
        .set('If-Match', `"${side.version}"`)
        .send({ point: ft2(10), quantity: ft2(30) })
        .expect(200);
      const items = [await rivets(), await leather()];
      expect(items).toMatchObject([
        { supplierId, quantity: '900', usualBy: 'hand' },
        { supplierId, quantity: ft2(44), usualBy: 'hand' },
      ]);
      const { body } = await draft(items.map((item) => lineFor(item))).expect(201);
      const [order, ...others] = (body as { orders: PurchaseOrder[] }).orders;
      expect(others).toEqual([]);
      expect(order?.lines.map((line) => line.unitPrice)).toEqual(drafted);
      expect(body.notes).toHaveLength(unitPrice === '0' ? 2 : 0);
    },
  );

  it('refuse parts of a piece, nothing at a time, and what somebody changed meanwhile', async () => {
    expect((await set({ quantity: '1.5' })).body.errors[0].field).toBe('quantity');
    expect((await set({ quantity: '0' })).status).toBe(422);
    expect((await set({ point: '-3' })).status).toBe(422);
    expect((await set({ point: '3' }, 999)).status).toBe(412);
  });
});

describe('drafting', () => {
  it('puts a line on the supplier’s one draft, and never twice', async () => {
    await sold();
    const item = await rivets();
    const first = await draft([lineFor(item)]).expect(201);
    const [order] = (first.body as { orders: PurchaseOrder[] }).orders;
    expect(order?.lines).toMatchObject([{ quantity: 500, unitPrice: '0.17' }]);
    const drafted = await rivets();
    expect(drafted).toMatchObject({ state: 'drafted', drafted: '500', quantity: '0' });
    expect(drafted.why).toContain(`What is on draft ${order?.number} will do once it is sent.`);

    const again = await draft([lineFor(item)]).expect(201);
    expect(again.body.orders).toEqual([]);
    expect(again.body.notes[0]).toContain(`is on draft ${order?.number} by now.`);

    await draft([{ of: 'leather', id: things.leatherId, quantity: ft2(30), drafted: '0' }]);
    const more = await draft([lineFor(drafted, { quantity: '200' })]).expect(201);
    expect(more.body.orders).toMatchObject([
      { id: order?.id, lines: [{ quantity: 700 }, { of: 'leather', areaMm2: ft2(30) }] },
    ]);
  });

  it('keeps a price that was typed on the draft, and says so', async () => {
    await sold();
    const { supplierId, hardwareId } = things;
    const line = { of: 'hardware', hardwareId, quantity: 500, unitPrice: '0.15' };
    const body = { supplierId, lines: [line] };
    await owner().post('/api/purchase-orders').send(body).expect(201);
    const { body: more } = await draft([lineFor(await rivets(), { quantity: '200' })]).expect(201);
    expect(more.orders[0].lines).toMatchObject([{ quantity: 700, unitPrice: '0.15' }]);
    expect(more.notes[0]).toMatch(/ keeps the price that was typed on its draft\.$/);
  });

  it('drafts hardware in what is sold, and says where an area is not', async () => {
    await sold();
    const few = await draft([lineFor(await rivets(), { quantity: '7' })]).expect(201);
    expect(few.body.orders[0].lines).toMatchObject([{ quantity: 100 }]);
    expect(few.body.notes[0]).toMatch(/: 100 is drafted, for it is sold 100 at a time\.$/);
    const any = await draft([lineFor(await leather(), { quantity: ft2(12) })]).expect(201);
    expect(any.body.notes).toEqual([]);
    await change('leathers', things.leatherId, { wholeForm: 'side', wholeAreaMm2: ft2(22) });
    const part = await draft([lineFor(await leather(), { quantity: ft2(18) })]).expect(201);
    expect(part.body.orders[0].lines[1]).toMatchObject({ areaMm2: ft2(30) });
    expect(part.body.notes[0]).toContain(
      '30 ft² is drafted, as typed, but it is sold 22 ft² at a time.',
    );
  });

  it('pays the price that the quantity reaches', async () => {
    const breaks = [
      { from: '100', price: '0.17' },
      { from: '1000', price: '0.12' },
    ];
    const { supplierId, hardwareId } = things;
    const terms = { minimum: '100', multiple: '100', breaks, preferred: true };
    await owner()
      .post('/api/supplier-offers')
      .send({ supplierId, hardwareId, ...terms })
      .expect(201);
    const { body } = await draft([lineFor(await rivets(), { quantity: '1000' })]).expect(201);
    expect(body.orders[0].lines).toMatchObject([{ quantity: 1000, unitPrice: '0.12' }]);
  });

  describe('of a thing without a price', () => {
    const unknown = /is not known: its order asks the supplier for it/;
    beforeEach(async () => {
      await sold();
      await change('hardware', things.hardwareId, { unitPrice: '0' });
      await change('leathers', things.leatherId, { pricePerFt2: '0' });
    });

    it('says so, of hardware and of leather', async () => {
      const rivet = await draft([lineFor(await rivets())]).expect(201);
      expect(rivet.body.orders[0].lines).toMatchObject([{ unitPrice: '0.00' }]);
      expect(rivet.body.notes).toEqual([expect.stringMatching(unknown)]);
      const side = await draft([lineFor(await leather(), { quantity: ft2(22) })]).expect(201);
      expect(side.body.notes).toEqual([expect.stringMatching(unknown)]);
    });

    it('says no more of it once a price is typed on the draft', async () => {
      const { supplierId, hardwareId } = things;
      const line = { of: 'hardware', hardwareId, quantity: 500, unitPrice: '0.15' };
      const body = { supplierId, lines: [line] };
      await owner().post('/api/purchase-orders').send(body).expect(201);
      const { body: more } = await draft([lineFor(await rivets(), { quantity: '200' })]).expect(
        201,
      );
      expect(more.notes).not.toContainEqual(expect.stringMatching(unknown));
    });
  });

  it('says what to do where nobody is named who sells it', async () => {
    const { body } = await draft([lineFor(await rivets())]).expect(201);
    expect(body.orders).toEqual([]);
    expect(body.notes[0]).toMatch(/has no supplier. Say who sells it, then draft again.$/);
  });

  it('refuses nothing, parts of a piece, and what is not bought', async () => {
    await sold();
    const item = await rivets();
    expect((await draft([])).status).toBe(422);
    expect((await draft([lineFor(item, { quantity: '1.5' })])).body.errors[0].field).toBe(
      'lines.0.quantity',
    );
    expect((await draft([lineFor(item, { id: 9999 })])).body.errors[0].field).toBe('lines.0.id');
    expect((await draft([lineFor(item, { quantity: '0' })])).status).toBe(422);
  });
});
