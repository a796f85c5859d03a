import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import { Decimal } from 'decimal.js';
import ExcelJS from 'exceljs';
import type { SalesSheet } from '@hidewright/contract';
import { makeReadyOrder } from '../../testing/ready-order.ts';
import { startTestShop } from '../../testing/test-shop.ts';
import { Invoice } from '../invoices/invoice.entity.ts';
import { Period } from './period.entity.ts';
import { Posting } from './posting.entity.ts';

type Shop = Awaited<ReturnType<typeof startTestShop>>;
let shop: Shop;

/** November has three invoices at two rates and without tax, and two payments; one more lies in October. */
beforeAll(async () => {
  shop = await startTestShop();
  const [low, high] = [await addRate('Low', '5'), await addRate('High', '8.25')];
  await issued('2026-10-31', low, {});
  const first = await issued('2026-11-01', low, {
    customerName: '=HYPERLINK("x")',
    title: '+1 coaster',
  });
  await issued('2026-11-15', high, { quantity: 333, priceEach: '0.0715', tooling: '0' });
  const last = await issued('2026-11-30', null, {
    priceEach: '1.015',
    title: 'Größe “é” <&> 牛革',
  });
  await pay(first, '100.10', '2026-11-20', '@note').expect(201);
  await pay(last, '50.00', '2026-11-30', '').expect(201);
});
afterAll(async () => {
  await shop.close();
});

const books = () => shop.as('bookkeeper');
const fresh = () => shop.context.orm.em.fork();

async function addRate(name: string, percent: string): Promise<number> {
  return (await books().post('/api/tax-rates').send({ name, percent }).expect(201)).body
    .id as number;
}

async function drafted(taxRateId: number | null, wanted: Parameters<typeof makeReadyOrder>[1]) {
  const order = await makeReadyOrder(shop.context, wanted);
  return (await books().post('/api/invoices').send({ orderId: order.id, taxRateId }).expect(201))
    .body as { id: number; version: number };
}

const issue = (draft: { id: number; version: number }, issuedOn: string) =>
  books()
    .post(`/api/invoices/${draft.id}/issue`)
    .set('If-Match', `"${draft.version}"`)
    .send({ issuedOn });

async function issued(
  issuedOn: string,
  taxRateId: number | null,
  wanted: Parameters<typeof makeReadyOrder>[1],
): Promise<number> {
  const draft = await drafted(taxRateId, wanted);
  await issue(draft, issuedOn).expect(200);
  return draft.id;
}

const pay = (id: number, amount: string, receivedOn: string, note: string) =>
  books().post(`/api/invoices/${id}/payments`).send({ amount, receivedOn, method: 'bank', note });

const readSheet = async (from: string, to: string) =>
  (await books().get('/api/sales-sheets').query({ from, to }).expect(200)).body as SalesSheet & {
    locks: unknown[];
  };

async function readBook(from: string, to: string): Promise<ExcelJS.Workbook> {
  const reply = await books()
    .get('/api/sales-sheets/file')
    .query({ from, to })
    .responseType('blob')
    .expect(200);
  expect(reply.headers['content-disposition']).toContain(`sales-sheet-${from}-to-${to}.xlsx`);
  const book = new ExcelJS.Workbook();
  await book.xlsx.load(reply.body as ExcelJS.Buffer);
  return book;
}

/** The rows below a sheet's head, each by its column's title. */
function rowsOf(book: ExcelJS.Workbook, name: string): Record<string, ExcelJS.CellValue>[] {
  const sheet = book.getWorksheet(name);
  if (sheet === undefined) throw new Error(`The workbook has no sheet ${name}`);
  const titles = (sheet.getRow(1).values as string[]).slice(1);
  const rows: Record<string, ExcelJS.CellValue>[] = [];
  sheet.eachRow((row, at) => {
    if (at > 1)
      rows.push(
        Object.fromEntries(titles.map((title, column) => [title, row.getCell(column + 1).value])),
      );
  });
  return rows;
}

const sum = (values: unknown[]) =>
  values.reduce<Decimal>((total, value) => total.plus(String(value)), new Decimal(0)).toFixed(2);

describe('the sales sheet of a period', () => {
  test('holds what was issued and paid on its days, and nothing else', async () => {
    const sheet = await readSheet('2026-11-01', '2026-11-30');
    expect(sheet.invoices.map((row) => row.issuedOn)).toEqual([
      '2026-11-01',
      '2026-11-15',
      '2026-11-30',
    ]);
    expect(sheet.totals).toEqual({
      invoices: 3,
      net: '715.31',
      tax: '27.21',
      total: '742.52',
      payments: 2,
      received: '150.10',
      taxes: [
        { percent: null, net: '186.50', tax: '0.00' },
        { percent: '5', net: '505.00', tax: '25.25' },
        { percent: '8.25', net: '23.81', tax: '1.96' },
      ],
    });
    expect(sheet.lines).toHaveLength(5);
    expect(sheet.locks).toEqual([]);
  });

  test('of a period without sales is all nought', async () => {
    const sheet = await readSheet('2026-01-01', '2026-01-31');
    expect(sheet.totals).toEqual({
      invoices: 0,
      net: '0.00',
      tax: '0.00',
      total: '0.00',
      payments: 0,
      received: '0.00',
      taxes: [],
    });
    const book = await readBook('2026-01-01', '2026-01-31');
    expect(rowsOf(book, 'Lines')).toEqual([]);
  });

  test('refuses days that are no days, in the wrong order, or more than a year', async () => {
    for (const [from, to, field] of [
      ['2026-11-31', '2026-12-01', 'from'],
      ['2026-11-30', '2026-11-29', 'to'],
      ['2025-01-01', '2026-11-30', 'to'],
      ['', '2026-11-30', 'from'],
    ]) {
      for (const path of ['sales-sheets', 'sales-sheets/file']) {
        const reply = await books().get(`/api/${path}`).query({ from, to }).expect(422);
        expect(reply.body.errors.map((error: { field: string }) => error.field)).toEqual([field]);
      }
    }
  });

  test('as a spreadsheet, recomputed from its line rows, agrees with the API to the cent', async () => {
    const { totals } = await readSheet('2026-11-01', '2026-11-30');
    const book = await readBook('2026-11-01', '2026-11-30');
    expect(book.worksheets.map((sheet) => sheet.name)).toEqual([
      'Invoices',
      'Lines',
      'Tax by rate',
      'Payments',
      'Totals',
    ]);
    const lines = rowsOf(book, 'Lines');
    expect(sum(lines.map((line) => line['Net']))).toBe(totals.net);
    const invoices = rowsOf(book, 'Invoices');
    expect(sum(invoices.map((row) => row['Net']))).toBe(totals.net);
    expect(sum(invoices.map((row) => row['Tax']))).toBe(totals.tax);
    expect(sum(invoices.map((row) => row['Total']))).toBe(totals.total);
    expect(taxFromLines(lines)).toBe(totals.tax);
    const taxes = rowsOf(book, 'Tax by rate');
    expect(sum(taxes.map((row) => row['Net']))).toBe(totals.net);
    expect(sum(taxes.map((row) => row['Tax']))).toBe(totals.tax);
    expect(sum(rowsOf(book, 'Payments').map((row) => row['Amount']))).toBe(totals.received);
    const [row] = rowsOf(book, 'Totals');
    expect(row).toMatchObject({
      Invoices: 3,
      Net: 715.31,
      Tax: 27.21,
      Total: 742.52,
      Payments: 2,
      Received: 150.1,
    });
  });

  test('[S28] types text as text, numbers as numbers with two decimals, days as days', async () => {
    const book = await readBook('2026-11-01', '2026-11-30');
    const [line] = rowsOf(book, 'Lines');
    const [invoice] = rowsOf(book, 'Invoices');
    expect(line?.['For']).toBe('+1 coaster');
    expect(invoice?.['Customer']).toBe('=HYPERLINK("x")');
    expect(rowsOf(book, 'Payments')[0]?.['Note']).toBe('@note');
    expect(rowsOf(book, 'Lines').map((row) => row['For'])).toContain('Größe “é” <&> 牛革');
    expect(invoice?.['Issued']).toEqual(new Date('2026-11-01T00:00:00Z'));
    const customer = book.getWorksheet('Invoices')?.getCell('D2');
    expect(customer?.type).toBe(ExcelJS.ValueType.String);
    const net = book.getWorksheet('Invoices')?.getCell('F2');
    expect([net?.type, net?.numFmt]).toEqual([ExcelJS.ValueType.Number, '#,##0.00']);
  });
});

/** EN 16931-1, BR-CO-17: once per invoice and rate, on the summed net, half up. */
function taxFromLines(lines: Record<string, ExcelJS.CellValue>[]): string {
  const nets = new Map<string, Decimal>();
  for (const line of lines) {
    const key = `${String(line['Invoice'])} ${String(line['Tax %'] ?? 0)}`;
    nets.set(key, (nets.get(key) ?? new Decimal(0)).plus(String(line['Net'])));
  }
  const taxes = [...nets].map(([key, net]) =>
    net
      .times(key.split(' ')[1] ?? '0')
      .dividedBy(100)
      .toDecimalPlaces(2, Decimal.ROUND_HALF_UP),
  );
  return sum(taxes);
}

describe('locking', () => {
  const lock = (fromDay: string, toDay: string) =>
    books().post('/api/periods').send({ fromDay, toDay });

  test('refuses a period that is not over, or is none', async () => {
    const open = await lock('2026-12-01', '2026-12-31').expect(422);
    expect(open.body.errors[0]).toMatchObject({ field: 'toDay', message: /not over/ });
    await lock('2026-11-30', '2026-11-01').expect(422);
    expect(await fresh().count(Period)).toBe(0);
  });

  test('refuses while papers and ledger disagree', async () => {
    const planted = await startTestShop();
    const order = await makeReadyOrder(planted.context);
    const owner = planted.as('owner');
    const draft = (
      await owner.post('/api/invoices').send({ orderId: order.id, taxRateId: null }).expect(201)
    ).body;
    await owner
      .post(`/api/invoices/${draft.id}/issue`)
      .set('If-Match', `"${draft.version}"`)
      .send({ issuedOn: '2026-11-05' })
      .expect(200);
    await planted.context.orm.em
      .getConnection()
      .execute(
        `INSERT INTO posting (entry, day, account, amount, invoice_id, at) VALUES (99, '2026-11-06', 'sales', -1, ${draft.id}, '')`,
      );
    const refused = await owner
      .post('/api/periods')
      .send({ fromDay: '2026-11-01', toDay: '2026-11-30' })
      .expect(409);
    expect(refused.body.detail).toMatch(/do not agree with the ledger/);
    await planted.close();
  });

  test('keeps the totals, and then refuses issuing and payment on its days', async () => {
    const { totals } = await readSheet('2026-11-01', '2026-11-30');
    const locked = await lock('2026-11-01', '2026-11-30').expect(201);
    expect(locked.body).toMatchObject({
      fromDay: '2026-11-01',
      toDay: '2026-11-30',
      totals,
      lockedBy: 'The bookkeeper',
    });
    const draft = await drafted(null, {});
    const refused = await issue(draft, '2026-11-30').expect(409);
    expect(refused.body.detail).toBe(
      '30 November 2026 lies in a locked period (1 November 2026 to 30 November 2026). Choose a day after it.',
    );
    const unpaid = await fresh().findOneOrFail(Invoice, { issuedOn: '2026-10-31' });
    const payment = await pay(unpaid.id, '1.00', '2026-11-01', '').expect(409);
    expect(payment.body.detail).toMatch(/locked period/);
    expect((await readSheet('2026-11-01', '2026-11-30')).totals).toEqual(totals);
    await issue(draft, '2026-12-01').expect(200);
    await pay(unpaid.id, '1.00', '2026-10-31', '').expect(201);
  });

  test('refuses days that are locked already', async () => {
    const refused = await lock('2026-11-30', '2026-12-01').expect(409);
    expect(refused.body.detail).toMatch(/1 November 2026 to 30 November 2026 is locked already/);
    await lock('2026-11-10', '2026-11-12').expect(409);
    await lock('2026-10-01', '2026-12-01').expect(409);
  });

  test('is listed, and shown with each sheet that it touches', async () => {
    const periods = await books().get('/api/periods').expect(200);
    expect(periods.body.items).toHaveLength(1);
    const sheet = await readSheet('2026-11-30', '2026-12-01');
    expect(sheet.locks).toHaveLength(1);
  });

  test('holds against SQL: no posting into it, no change of it', async () => {
    const posting = await fresh().findOneOrFail(Posting, { day: '2026-11-30', account: 'sales' });
    const connection = fresh().getConnection();
    const attempt = `INSERT INTO posting (entry, day, account, amount, at) VALUES (1, '2026-11-30', 'sales', 1, '')`;
    await expect(connection.execute(attempt)).rejects.toThrow(/the period is locked/);
    await expect(
      connection.execute(`DELETE FROM posting WHERE id = ${posting.id}`),
    ).rejects.toThrow(/append-only/);
    await expect(connection.execute(`UPDATE period SET to_day = '2026-11-01'`)).rejects.toThrow(
      /append-only/,
    );
    await expect(connection.execute('DELETE FROM period')).rejects.toThrow(/append-only/);
  });

  test('what is renamed later changes no sheet of it', async () => {
    const before = await readSheet('2026-11-01', '2026-11-30');
    await fresh().getConnection().execute(`UPDATE customer SET name = name || ' & Sons'`);
    const after = await readSheet('2026-11-01', '2026-11-30');
    expect(after).toEqual(before);
  });
});
