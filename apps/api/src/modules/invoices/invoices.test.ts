import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import { Decimal } from 'decimal.js';
import { shipOrder } from '../../flows/ship-order.ts';
import { inTransaction, theProgram } from '../../work.ts';
import { startTestShop } from '../../testing/test-shop.ts';
import { makeReadyOrder } from '../../testing/ready-order.ts';
import { Activity } from '../activity/activity.entity.ts';
import { Order } from '../orders/order.entity.ts';
import { Payment } from '../payments/payment.entity.ts';
import { Posting } from '../periods/posting.entity.ts';
import { Invoice } from './invoice.entity.ts';
import { snapshotHash } from './snapshot.ts';

type Shop = Awaited<ReturnType<typeof startTestShop>>;
let shop: Shop;

beforeAll(async () => {
  shop = await startTestShop();
});
afterAll(async () => {
  await shop.close();
});

const books = () => shop.as('bookkeeper');
const fresh = () => shop.context.orm.em.fork();

async function addRate(name: string, percent: string): Promise<number> {
  const reply = await books().post('/api/tax-rates').send({ name, percent }).expect(201);
  return reply.body.id as number;
}

async function draft(
  taxRateId: number | null = null,
  wanted: Parameters<typeof makeReadyOrder>[1] = {},
) {
  const order = await makeReadyOrder(shop.context, wanted);
  const reply = await books()
    .post('/api/invoices')
    .send({ orderId: order.id, taxRateId })
    .expect(201);
  return {
    order,
    invoice: reply.body as { id: number; version: number; [field: string]: unknown },
  };
}

const issue = (invoice: { id: number; version: number }, issuedOn = '2026-12-01') =>
  books()
    .post(`/api/invoices/${invoice.id}/issue`)
    .set('If-Match', `"${invoice.version}"`)
    .send({ issuedOn });

async function issued(
  taxRateId: number | null = null,
  wanted: Parameters<typeof makeReadyOrder>[1] = {},
) {
  const { order, invoice } = await draft(taxRateId, wanted);
  const reply = await issue(invoice).expect(200);
  return { order, invoice: reply.body as typeof invoice & { number: string; total: string } };
}

const pay = (id: number, body: Record<string, unknown>) =>
  books()
    .post(`/api/invoices/${id}/payments`)
    .send({ receivedOn: '2026-12-01', method: 'bank', ...body });

describe('the first invoice', () => {
  test('asks for tax: nothing is usual yet, and saying nothing about it is refused', async () => {
    const rates = await books().get('/api/tax-rates').expect(200);
    expect(rates.body).toEqual({ items: [], usual: null });
    const order = await makeReadyOrder(shop.context);
    const refused = await books().post('/api/invoices').send({ orderId: order.id }).expect(422);
    expect(refused.body.errors[0].field).toBe('taxRateId');
  });

  test('takes "no tax" as an answer, which is usual from then on', async () => {
    const { invoice } = await draft(null);
    expect(invoice).toMatchObject({
      state: 'draft',
      number: null,
      net: '505.00',
      tax: '0.00',
      total: '505.00',
      taxes: [],
    });
    const rates = await books().get('/api/tax-rates').expect(200);
    expect(rates.body.usual).toEqual({ taxRateId: null });
  });
});

describe('drafting', () => {
  test('puts pieces and tooling on lines of their own and sums them', async () => {
    const rate = await addRate('Sales tax', '8.25');
    const { invoice } = await draft(rate, {
      quantity: 250,
      priceEach: '0.0715',
      tooling: '120.50',
    });
    expect(invoice.lines).toEqual([
      {
        position: 1,
        description: 'Round coasters',
        quantity: 250,
        unitPrice: '0.0715',
        amount: '17.88',
        taxPercent: '8.25',
        taxRateId: rate,
        taxName: 'Sales tax',
        finishedPieceId: null,
      },
      {
        position: 2,
        description: 'Tooling, charged once',
        quantity: 1,
        unitPrice: '120.50',
        amount: '120.50',
        taxPercent: '8.25',
        taxRateId: rate,
        taxName: 'Sales tax',
        finishedPieceId: null,
      },
    ]);
    expect(invoice).toMatchObject({ net: '138.38', tax: '11.42', total: '149.80', open: '149.80' });
  });

  test('works tax out once on the summed net of each rate, half up', async () => {
    const low = await addRate('Low', '5');
    const high = await addRate('High', '10');
    // By line 0.10 × 5 % = 0.005 → 0.01 twice; on the sum 0.20 × 5 % = 0.01 once.
    const { invoice } = await draft(low, { quantity: 1, priceEach: '0.10', tooling: '0.10' });
    expect(invoice).toMatchObject({ net: '0.20', tax: '0.01', total: '0.21' });
    const changed = await books()
      .patch(`/api/invoices/${invoice.id}`)
      .set('If-Match', `"${invoice.version}"`)
      .send({ lines: [{ position: 2, taxRateId: high }] })
      .expect(200);
    expect(changed.body.taxes).toEqual([
      { percent: '5', net: '0.10', tax: '0.01' },
      { percent: '10', net: '0.10', tax: '0.01' },
    ]);
    expect(changed.body).toMatchObject({ net: '0.20', tax: '0.02', total: '0.22' });
  });

  test('refuses a second invoice for an order, an order in work, and one that is not there', async () => {
    const { order } = await draft();
    const again = await books()
      .post('/api/invoices')
      .send({ orderId: order.id, taxRateId: null })
      .expect(409);
    expect(again.body.detail).toMatch(/draft invoice already/);
    const early = await makeReadyOrder(shop.context, { state: 'in work' });
    const refused = await books()
      .post('/api/invoices')
      .send({ orderId: early.id, taxRateId: null })
      .expect(409);
    expect(refused.body.detail).toMatch(/is in work/);
    await books().post('/api/invoices').send({ orderId: 999_999, taxRateId: null }).expect(422);
  });

  test('refuses a rate that is retired or unknown', async () => {
    const rate = await addRate('Old tax', '3');
    await books()
      .patch(`/api/tax-rates/${rate}`)
      .set('If-Match', '"1"')
      .send({ active: false })
      .expect(200);
    const order = await makeReadyOrder(shop.context);
    const refused = await books()
      .post('/api/invoices')
      .send({ orderId: order.id, taxRateId: rate })
      .expect(422);
    expect(refused.body.errors).toEqual([
      { field: 'taxRateId', message: 'Old tax is retired. Choose another rate, or no tax.' },
    ]);
    await books().post('/api/invoices').send({ orderId: order.id, taxRateId: 999_999 }).expect(422);
  });

  test('[S35] a change of words alone makes a new version, and a stale one is refused', async () => {
    const { invoice } = await draft();
    const change = (version: number) =>
      books()
        .patch(`/api/invoices/${invoice.id}`)
        .set('If-Match', `"${version}"`)
        .send({ lines: [{ position: 1, description: 'Coasters with the heron' }] });
    const changed = await change(invoice.version).expect(200);
    expect(changed.body.lines[0].description).toBe('Coasters with the heron');
    expect(changed.body.version).toBeGreaterThan(invoice.version);
    await change(invoice.version).expect(412);
    await issue(invoice).expect(412);
    await books()
      .patch(`/api/invoices/${invoice.id}`)
      .send({ lines: [{ position: 1 }] })
      .expect(428);
  });

  test('a discarded draft leaves its order to be invoiced again', async () => {
    const { order, invoice } = await draft();
    await books().delete(`/api/invoices/${invoice.id}`).expect(200);
    await books().get(`/api/invoices/${invoice.id}`).expect(404);
    const waiting = await books().get('/api/orders-to-invoice').expect(200);
    expect(waiting.body.items.map((item: { orderId: number }) => item.orderId)).toContain(order.id);
    await books().post('/api/invoices').send({ orderId: order.id, taxRateId: null }).expect(201);
  });

  test('[I10] the same idempotency key drafts once', async () => {
    const order = await makeReadyOrder(shop.context);
    const send = () =>
      books()
        .post('/api/invoices')
        .set('Idempotency-Key', `draft-${order.id}`)
        .send({ orderId: order.id, taxRateId: null });
    const first = await send().expect(201);
    const second = await send().expect(201);
    expect(second.body).toEqual(first.body);
    expect(await fresh().count(Invoice, { orderId: order.id })).toBe(1);
  });
});

describe('issuing', () => {
  test('gives a number, days, and keeps what was issued with its hash', async () => {
    const rate = await addRate('Town tax', '7');
    const { invoice } = await issued(rate);
    expect(invoice.number).toMatch(/^I-\d{4}$/);
    expect(invoice).toMatchObject({
      state: 'issued',
      issuedOn: '2026-12-01',
      dueOn: '2026-12-31',
      total: '540.35',
    });
    const row = await fresh().findOneOrFail(Invoice, invoice.id);
    expect(row.snapshotHash).toBe(snapshotHash(row.snapshot));
    expect(row.snapshot).toMatchObject({
      number: invoice.number,
      total: '540.35',
      taxes: [{ percent: '7', net: '505.00', tax: '35.35' }],
    });
  });

  test('[I5] posts receivables against sales and tax, and the sides sum to nought', async () => {
    const rate = await addRate('County tax', '6');
    const { invoice } = await issued(rate);
    const postings = await fresh().find(Posting, { invoiceId: invoice.id });
    const byAccount = Object.fromEntries(
      postings.map((side) => [side.account, side.amount.toFixed(2)]),
    );
    expect(byAccount).toEqual({ receivables: '535.30', sales: '-505.00', tax: '-30.30' });
    expect(new Set(postings.map((side) => side.entry)).size).toBe(1);
  });

  test('twice is refused, with what can be done instead', async () => {
    const { invoice } = await issued();
    const again = await issue(invoice).expect(409);
    expect(again.body.detail).toBe(
      `This invoice was issued as ${invoice.number}, and an issued invoice does not change.`,
    );
    expect(again.body.allowed).toContain('record a payment');
    await books().delete(`/api/invoices/${invoice.id}`).expect(409);
    await books()
      .patch(`/api/invoices/${invoice.id}`)
      .set('If-Match', `"${invoice.version}"`)
      .send({ lines: [{ position: 1, description: 'Other words' }] })
      .expect(409);
  });

  test('refuses a day to come, no day, and what is no day', async () => {
    const { invoice } = await draft();
    const tomorrow = await issue(invoice, '2026-12-02').expect(422);
    expect(tomorrow.body.errors[0]).toMatchObject({ field: 'issuedOn', message: /still to come/ });
    await issue(invoice, '2026-02-30').expect(422);
    await issue(invoice, '').expect(422);
    const row = await fresh().findOneOrFail(Invoice, invoice.id);
    expect(row).toMatchObject({ state: 'draft', number: null });
  });

  test('[I7] what was issued cannot be changed by SQL', async () => {
    const { invoice } = await issued();
    const attempts = [
      `UPDATE invoice SET total = total + 1, net = net + 1 WHERE id = ${invoice.id}`,
      `UPDATE invoice SET snapshot = '{}' WHERE id = ${invoice.id}`,
      `UPDATE invoice SET number = 'I-9999' WHERE id = ${invoice.id}`,
      `UPDATE invoice SET number = NULL, sequence = NULL, state = 'draft' WHERE id = ${invoice.id}`,
      `DELETE FROM invoice WHERE id = ${invoice.id}`,
      `UPDATE invoice_line SET amount = 1 WHERE invoice_id = ${invoice.id}`,
      `DELETE FROM invoice_line WHERE invoice_id = ${invoice.id}`,
      `INSERT INTO invoice_line (invoice_id, position, description, quantity, unit_price, amount, tax_percent)
        VALUES (${invoice.id}, 9, 'Extra', 1, 0, 0, 0)`,
      `INSERT INTO invoice_tax (invoice_id, percent, net, tax) VALUES (${invoice.id}, 990000, 0, 0)`,
      `UPDATE posting SET amount = 1 WHERE invoice_id = ${invoice.id}`,
      `DELETE FROM posting WHERE invoice_id = ${invoice.id}`,
    ];
    for (const sql of attempts) {
      await expect(fresh().getConnection().execute(sql), sql).rejects.toThrow(
        /does not change|not deleted|append-only/,
      );
    }
  });

  test('[I6] twenty at once get twenty numbers without a gap', async () => {
    const drafts: Awaited<ReturnType<typeof draft>>[] = [];
    for (let each = 0; each < 20; each += 1) drafts.push(await draft());
    const replies = await Promise.all(drafts.map(({ invoice }) => issue(invoice)));
    expect(replies.map((reply) => reply.status)).toEqual(Array<number>(20).fill(200));
    const sequences = (await fresh().find(Invoice, { number: { $ne: null } }))
      .map((invoice) => Number(invoice.sequence))
      .sort((a, b) => a - b);
    expect(sequences).toEqual(sequences.map((_, at) => at + 1));
    expect(sequences.length).toBeGreaterThanOrEqual(20);
  });

  test('a refused issue uses up no number', async () => {
    const { invoice: first } = await issued();
    const { invoice } = await draft();
    await issue(invoice, '2027-01-01').expect(422);
    const reply = await issue(invoice).expect(200);
    expect(Number(reply.body.number.slice(2))).toBe(Number(first.number.slice(2)) + 1);
  });

  test('gives a PDF, the same bytes each time; a draft has none', async () => {
    const { invoice } = await issued();
    const paper = () => books().get(`/api/invoices/${invoice.id}/paper`).responseType('blob');
    const [one, two] = [await paper().expect(200), await paper().expect(200)];
    expect(one.headers['content-type']).toBe('application/pdf');
    expect(one.headers['content-disposition']).toContain(`${invoice.number}.pdf`);
    expect((one.body as Buffer).subarray(0, 5).toString()).toBe('%PDF-');
    expect((one.body as Buffer).equals(two.body as Buffer)).toBe(true);
    const unissued = await draft();
    await books().get(`/api/invoices/${unissued.invoice.id}/paper`).expect(409);
  });

  test('keeps the customer’s name as it was when it was issued', async () => {
    const { invoice } = await issued(null, { customerName: 'Odalys & Pim' });
    await fresh()
      .getConnection()
      .execute(`UPDATE customer SET name = 'Somebody else' WHERE name = 'Odalys & Pim'`);
    const read = await books().get(`/api/invoices/${invoice.id}`).expect(200);
    expect(read.body).toMatchObject({
      customerName: 'Odalys & Pim',
      billedTo: { name: 'Odalys & Pim' },
    });
  });
});

describe('payments', () => {
  test('[I4] part, then the rest: paid and open always sum to the total', async () => {
    const { order, invoice } = await issued(null, { state: 'shipped' });
    const part = await pay(invoice.id, { amount: '200.50', note: 'first half' }).expect(201);
    expect(part.body).toMatchObject({ state: 'part paid', paid: '200.50', open: '304.50' });
    const rest = await pay(invoice.id, { amount: '304.50', method: 'cheque' }).expect(201);
    expect(rest.body).toMatchObject({
      state: 'paid',
      paid: '505.00',
      open: '0.00',
      orderState: 'closed',
    });
    expect(rest.body.payments).toHaveLength(2);
    const log = await fresh().find(Activity, { subjectKind: 'order', subjectId: order.id });
    expect(log.map((deed) => deed.action)).toEqual([`closed ${order.number}`]);
  });

  test('of a packed order leave it packed; shipping it then closes it', async () => {
    const { order, invoice } = await issued(null, { state: 'packed' });
    await pay(invoice.id, { amount: '505.00' }).expect(201);
    expect((await fresh().findOneOrFail(Order, order.id)).state).toBe('packed');
    await inTransaction(shop.context, theProgram, (work) =>
      shipOrder(work, order.id, '2026-12-01'),
    );
    expect((await fresh().findOneOrFail(Order, order.id)).state).toBe('closed');
  });

  test('are posted as money against receivables', async () => {
    const { invoice } = await issued();
    await pay(invoice.id, { amount: '5.00' }).expect(201);
    const sides = await fresh().find(Posting, { invoiceId: invoice.id, paymentId: { $ne: null } });
    expect(sides.map((side) => [side.account, side.amount.toFixed(2)])).toEqual([
      ['money', '5.00'],
      ['receivables', '-5.00'],
    ]);
  });

  test('on a draft are refused', async () => {
    const { invoice } = await draft();
    const refused = await pay(invoice.id, { amount: '1.00' }).expect(409);
    expect(refused.body.detail).toBe(
      'This invoice is a draft. Issue it before you record a payment.',
    );
  });

  test('of more than is open are refused, and so is anything on a paid invoice', async () => {
    const { invoice } = await issued();
    const over = await pay(invoice.id, { amount: '505.01' }).expect(422);
    expect(over.body.errors).toEqual([
      { field: 'amount', message: `Only 505.00 is open on ${invoice.number}. Enter that or less.` },
    ]);
    await pay(invoice.id, { amount: '505.00' }).expect(201);
    const paid = await pay(invoice.id, { amount: '0.01' }).expect(409);
    expect(paid.body.detail).toBe(`${invoice.number} is paid: nothing is open on it.`);
    expect(await fresh().count(Payment, { invoiceId: invoice.id })).toBe(1);
  });

  test.each([
    '-5.00',
    '0',
    '0.00',
    'NaN',
    'Infinity',
    '1e2',
    '-0',
    '5.001',
    '',
    ' ',
    '1,000.00',
    '99999999999999',
    5,
    null,
    ['5'],
  ])('[S19] of %j are refused beside their field, and nothing is stored', async (amount) => {
    const { invoice } = await issued();
    const refused = await pay(invoice.id, { amount }).expect(422);
    expect(refused.body.errors[0].field).toBe('amount');
    expect(await fresh().count(Payment, { invoiceId: invoice.id })).toBe(0);
  });

  test('[S17] refuse fields that are not asked for, and unknown methods and days', async () => {
    const { invoice } = await issued();
    await pay(invoice.id, { amount: '5.00', state: 'paid' }).expect(422);
    await pay(invoice.id, { amount: '5.00', method: 'barter' }).expect(422);
    await pay(invoice.id, { amount: '5.00', receivedOn: '2026-12-02' }).expect(422);
    await pay(invoice.id, { amount: '5.00', receivedOn: 'yesterday' }).expect(422);
  });

  test('stay as they were written', async () => {
    const { invoice } = await issued();
    await pay(invoice.id, { amount: '5.00' }).expect(201);
    for (const sql of [
      `UPDATE payment SET amount = 1 WHERE invoice_id = ${invoice.id}`,
      `DELETE FROM payment WHERE invoice_id = ${invoice.id}`,
    ]) {
      await expect(fresh().getConnection().execute(sql)).rejects.toThrow(/append-only/);
    }
  });

  test('sent at once cannot pay more than is open', async () => {
    const { invoice } = await issued();
    const replies = await Promise.all(
      Array.from({ length: 6 }, () => pay(invoice.id, { amount: '100.00' })),
    );
    expect(replies.filter((reply) => reply.status === 201)).toHaveLength(5);
    const row = await fresh().findOneOrFail(Invoice, invoice.id);
    expect(row.paid.toFixed(2)).toBe('500.00');
  });
});

describe('what is owed', () => {
  test('is listed by age with sums that agree', async () => {
    const { invoice } = await draft();
    await issue(invoice, '2026-09-16').expect(200);
    const owed = await books().get('/api/owed').expect(200);
    const row = owed.body.items.find(
      (item: { invoiceId: number }) => item.invoiceId === invoice.id,
    );
    expect(row).toMatchObject({
      open: '505.00',
      dueOn: '2026-10-16',
      daysLate: 46,
      band: '31 to 60',
    });
    const sum = (open: string[]) =>
      open.reduce((total, text) => total.plus(text), new Decimal(0)).toFixed(2);
    expect(sum(owed.body.items.map((item: { open: string }) => item.open))).toBe(owed.body.open);
    expect(sum(owed.body.bands.map((band: { open: string }) => band.open))).toBe(owed.body.open);
  });

  test('invoices are found by state, number and customer, page by page', async () => {
    const { invoice } = await issued(null, { customerName: 'The Copper Heron' });
    const found = await books()
      .get('/api/invoices')
      .query({ q: 'copper', state: 'issued' })
      .expect(200);
    expect(found.body.items.map((item: { number: string }) => item.number)).toEqual([
      invoice.number,
    ]);
    const first = await books().get('/api/invoices').query({ limit: 2 }).expect(200);
    const second = await books()
      .get('/api/invoices')
      .query({ limit: 2, cursor: first.body.next })
      .expect(200);
    expect(second.body.items[0].id).toBeLessThan(first.body.items[1].id);
    await pay(invoice.id, { amount: '1.00', note: 'heron’s first' }).expect(201);
    const payments = await books().get('/api/payments').query({ q: 'heron’s' }).expect(200);
    expect(payments.body.items).toEqual([
      expect.objectContaining({
        invoiceNumber: invoice.number,
        amount: '1.00',
        recordedBy: 'The bookkeeper',
      }),
    ]);
  });
});

test('[I5] after all of this, every entry sums to nought', async () => {
  const rows = await inTransaction(shop.context, theProgram, ({ em }) =>
    em.execute<{ balance: number }[]>('SELECT sum(amount) AS balance FROM posting GROUP BY entry'),
  );
  expect(rows.length).toBeGreaterThan(20);
  expect(rows.every((row) => row.balance === 0)).toBe(true);
});

test('the maker has no business in the books', async () => {
  const { invoice } = await issued();
  const maker = shop.as('maker');
  for (const path of [
    'invoices',
    `invoices/${invoice.id}`,
    `invoices/${invoice.id}/paper`,
    'orders-to-invoice',
    'payments',
    'owed',
    'tax-rates',
    'periods',
    'sales-sheets?from=2026-12-01&to=2026-12-01',
    'sales-sheets/file?from=2026-12-01&to=2026-12-01',
  ]) {
    await maker.get(`/api/${path}`).expect(403);
    await shop.nobody().get(`/api/${path}`).expect(401);
  }
  for (const path of [
    'invoices',
    `invoices/${invoice.id}/issue`,
    `invoices/${invoice.id}/payments`,
    'tax-rates',
    'periods',
  ]) {
    await maker.post(`/api/${path}`).send({}).expect(403);
  }
  await maker.delete(`/api/invoices/${invoice.id}`).expect(403);
  await shop.as('owner').get(`/api/invoices/${invoice.id}`).expect(200);
});
