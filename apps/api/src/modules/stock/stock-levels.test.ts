import ExcelJS from 'exceljs';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { ft2, orderMore, stockUp } from '../../testing/stockroom.ts';
import { startTestShop } from '../../testing/test-shop.ts';
import { inTransaction, theProgram } from '../../work.ts';
import { writeBareJob } from '../../testing/bare-job.ts';
import { releaseReservations, reserveStock, takeStock } from './stock-ledger.ts';

let shop: Awaited<ReturnType<typeof startTestShop>>;
let things: Awaited<ReturnType<typeof stockUp>>;
let lotId: number;
let jobId: number;

const at = (day: string) => shop.clock.set(new Date(`${day}T09:00:00.000Z`));
const levels = async (query: object = {}, role: 'owner' | 'maker' = 'owner') =>
  (await shop.as(role).get('/api/stock-levels').query(query).expect(200)).body;
const movements = async (query: object) =>
  (await shop.as('owner').get('/api/stock-movements').query(query).expect(200)).body.items;

beforeAll(async () => {
  shop = await startTestShop();
  at('2026-11-02');
  things = await stockUp(shop);
  const { leatherId, hardwareId } = things;
  const lots = [{ leatherId, form: 'side', measuredAreaMm2: ft2(20), place: 'rack 1' }];
  const hardware = [{ hardwareId, quantity: 1000 }];
  const { body } = await shop.as('owner').post('/api/receipts').send({ lots, hardware });
  lotId = body.lots[0].id;
  at('2026-11-20');
  jobId = await writeBareJob(shop.context, 1);
  const hardware900 = [{ hardwareId, quantity: 900 }];
  const need = JSON.stringify({ leatherId, leatherAreaMm2: ft2(5), hardware: hardware900 });
  const connection = shop.context.orm.em.fork().getConnection();
  await connection.execute('PRAGMA foreign_keys = OFF');
  await connection.execute('UPDATE job SET estimate = ? WHERE id = ?', [need, jobId]);
  await connection.execute('PRAGMA foreign_keys = ON');
  await inTransaction(shop.context, theProgram, async (work) => {
    await takeStock(work, { jobId, lotId, quantity: 5 * 92_903_040, reason: 'for it' });
    await takeStock(work, { jobId, hardwareId, quantity: 300, reason: 'for it' });
    await reserveStock(work, { jobId, hardwareId, quantity: 400 });
  });
  at('2026-11-29');
  await orderMore(shop, things);
});
afterAll(() => shop.close());

describe('what there was at the end of a day', () => {
  it('is nothing before anything came', async () => {
    expect(await levels({ on: '2026-11-01' })).toMatchObject({ leathers: [], value: '0.00' });
    const [hardware] = (await levels({ on: '2026-11-01' })).hardware;
    expect(hardware.standing).toEqual({ reserved: '0', free: '0', onOrder: '0', promised: '0' });
  });

  it('is what had moved until then, at cost', async () => {
    expect(await levels({ on: '2026-11-19' })).toMatchObject({
      leathers: [{ areaMm2: ft2(20), value: '180.00', standing: { free: ft2(20), promised: '0' } }],
      hardware: [{ quantity: 1000, value: '170.00' }],
      value: '350.00',
    });
    expect(await levels({ on: '2026-11-20' })).toMatchObject({
      leatherAreaMm2: ft2(15),
      leatherValue: '135.00',
      hardwareValue: '119.00',
      value: '254.00',
    });
  });

  it('stands today beside what is held, free, on order and promised of it', async () => {
    const { hardware, leathers } = await levels();
    expect(hardware[0]).toMatchObject({
      quantity: 700,
      standing: { reserved: '400', free: '300', onOrder: '1000', promised: '200' },
    });
    expect(leathers[0].standing).toMatchObject({ free: ft2(15), onOrder: ft2(40) });
    const { hardwareId } = things;
    const one = await levels({ hardwareId });
    expect(one).toMatchObject({ leathers: [], hardware: [{ hardwareId }] });
  });

  it('stood on a day before as it was told on that day', async () => {
    const before = await levels({ on: '2026-11-28' });
    expect(before.hardware[0]).toMatchObject({
      quantity: 700,
      standing: { reserved: '400', free: '300', onOrder: '0', promised: '200' },
    });
    expect(before.leathers[0].standing).toMatchObject({ free: ft2(15), onOrder: '0' });
    const today = await levels();
    at('2026-12-01');
    await inTransaction(shop.context, theProgram, (work) => releaseReservations(work, jobId));
    const { on: _, ...stood } = await levels({ on: '2026-11-29' });
    expect(today).toMatchObject(stood);
    expect((await levels({ on: '2026-11-30' })).hardware[0].standing.reserved).toBe('400');
    expect((await levels()).hardware[0].standing).toMatchObject({ reserved: '0', free: '700' });
  });

  it('is not told of days to come', async () => {
    const { body } = await shop.as('owner').get('/api/stock-levels?on=2026-12-02').expect(422);
    expect(body.errors[0].field).toBe('on');
  });

  it('shows the maker no worth, on the screen or in the spreadsheet', async () => {
    expect(JSON.stringify(await levels({}, 'maker'))).not.toContain('alue');
    const heads = async (role: 'owner' | 'maker') => {
      const { body } = await shop
        .as(role)
        .get('/api/stock-levels/file')
        .buffer()
        .parse((response, done) => {
          const parts: Buffer[] = [];
          response.on('data', (part: Buffer) => parts.push(part));
          response.on('end', () => done(null, Buffer.concat(parts)));
        })
        .expect(200);
      const book = new ExcelJS.Workbook();
      await book.xlsx.load(body as never);
      return book.worksheets.flatMap((page) => page.getRow(1).values as string[]);
    };
    expect(await heads('owner')).toContain('At cost, USD');
    expect(await heads('maker')).not.toContain('At cost, USD');
  });
});

describe('the ledger', () => {
  it('is found by kind, job, leather, person and days', async () => {
    const count = async (query: object) => (await movements(query)).length;
    expect(await count({})).toBe(4);
    expect(await count({ kind: 'take' })).toBe(2);
    expect(await count({ jobId, hardwareId: things.hardwareId })).toBe(1);
    expect(await count({ orderId: 1 })).toBe(2);
    expect(await count({ leatherId: things.leatherId })).toBe(2);
    expect(await count({ person: 'owner' })).toBe(2);
    expect(await count({ from: '2026-11-03', to: '2026-11-20' })).toBe(2);
    expect(await count({ to: '2026-11-01' })).toBe(0);
    await shop.as('owner').get('/api/stock-movements/file?kind=take').expect(200);
  });
});

it('what was written down a day late was awaited until then, and is neither lost nor there twice', async () => {
  at('2026-11-30');
  const order = await orderMore(shop, things);
  at('2026-12-01');
  const hardware = [
    { hardwareId: things.hardwareId, purchaseLineId: order.rivetLine, quantity: 600 },
  ];
  const came = { purchaseOrderId: order.id, receivedOn: '2026-11-30', hardware };
  await shop.as('owner').post('/api/receipts').send(came).expect(201);
  const rivets = async (on: string) => (await levels({ on })).hardware[0];
  const awaited = { quantity: 700, standing: { onOrder: '2000' } };
  expect(await rivets('2026-11-30')).toMatchObject(awaited);
  const partly = { quantity: 1300, standing: { onOrder: '1400' } };
  expect(await rivets('2026-12-01')).toMatchObject(partly);
});
