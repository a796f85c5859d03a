import type {
  FinishedMovement,
  FinishedPiece,
  Invoice,
  InvoiceSummary,
  SalesSheet,
} from '@hidewright/contract';
import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { readyForTheBench, type BenchShop } from '../../testing/bench-shop.ts';
import { makeReadyOrder } from '../../testing/ready-order.ts';
import { startTestShop } from '../../testing/test-shop.ts';
import { verifyFolder } from '../../verify/verify-folder.ts';

let ready: BenchShop;
let buyer: number;
let rate: number;
let seconds: FinishedPiece;

beforeEach(async () => {
  ready = await readyForTheBench(await startTestShop());
  buyer = (await made<{ id: number }>('customers', { name: 'Tern Street Outfitters' })).id;
  rate = (await made<{ id: number }>('tax-rates', { name: 'Sales tax', percent: '8.25' })).id;
  seconds = await put({ sort: 'seconds', quantity: 7, unitCost: '1.43' });
});
afterEach(() => ready.shop.close());

type Role = 'owner' | 'maker' | 'bookkeeper';
const as = (role: Role) => ready.shop.as(role);
const post = (path: string, body: object, role: Role = 'owner') =>
  as(role).post(`/api/${path}`).send(body);
const made = async <Reply>(path: string, body: object) =>
  (await post(path, body).expect(201)).body as Reply;
const read = async <Reply>(path: string, role: Role = 'owner') =>
  (await as(role).get(`/api/${path}`).expect(200)).body as Reply;

const put = (body: object) =>
  made<FinishedPiece>('finished-pieces', {
    ...{ patternId: ready.patternId, sort: 'good', reason: 'found in a box' },
    ...body,
  });
const sale = (change: object = {}) => ({
  ...{ customerId: buyer, quantity: 4, unitPrice: '3.15', taxRateId: rate },
  ...change,
});
const sell = (change: object = {}, of = seconds.id) =>
  post(`finished-pieces/${of}/sales`, sale(change));
const sold = async (change: object = {}, of = seconds.id) =>
  (await sell(change, of).expect(201)).body as Invoice;
const pieceNow = (id = seconds.id) => read<FinishedPiece>(`finished-pieces/${id}`);
const movements = async (id = seconds.id, role: Role = 'owner') =>
  (await read<{ items: FinishedMovement[] }>(`finished-pieces/${id}/movements`, role)).items;
const issue = ({ id, version }: Invoice) =>
  as('bookkeeper')
    .post(`/api/invoices/${id}/issue`)
    .set('If-Match', `"${version}"`)
    .send({ issuedOn: '2026-12-01' });
const discard = (id: number, role: Role = 'owner') => as(role).delete(`/api/invoices/${id}`);
const takeOff = ({ id, version }: Invoice, position: number) =>
  as('owner').delete(`/api/invoices/${id}/lines/${position}`).set('If-Match', `"${version}"`);

const faults = async () =>
  (await verifyFolder(ready.shop.context.config.dataDir)).flatMap((rule) => rule.faults);

describe('selling from the shelf', () => {
  it('drafts an invoice and takes the pieces off, each naming the other', async () => {
    const invoice = await sold();
    expect(invoice).toMatchObject({
      ...{ state: 'draft', number: null, orderId: null, orderNumber: null, orderState: null },
      ...{ customerName: 'Tern Street Outfitters', title: 'Pieces from the shelf' },
      ...{ net: '12.60', tax: '1.04', total: '13.64' },
    });
    expect(invoice.lines).toEqual([
      {
        ...{ position: 1, description: 'Round coaster, seconds', quantity: 4, unitPrice: '3.15' },
        ...{ amount: '12.60', taxPercent: '8.25', taxRateId: rate, taxName: 'Sales tax' },
        finishedPieceId: seconds.id,
      },
    ]);
    expect(await pieceNow()).toMatchObject({ onHand: 3, value: '4.29' });
    const [left] = await movements();
    expect(left).toMatchObject({
      ...{ kind: 'sold', quantity: -4, value: '-5.72', reason: 'sold to Tern Street Outfitters' },
      invoice: { id: invoice.id, number: null },
    });
    const log = (await read<{ items: { action: string }[] }>('activities')).items;
    expect(log[0]?.action).toBe(
      'sold 4 of Round coaster, seconds to Tern Street Outfitters from the shelf',
    );
    expect(await faults()).toEqual([]);
  });

  it('adds further kinds to the same draft, taxed each as it says', async () => {
    const first = await sold();
    const good = await put({ quantity: 5, unitCost: '2.00' });
    const both = await sold(
      { draftId: first.id, quantity: 5, unitPrice: '4.5', taxRateId: null },
      good.id,
    );
    expect(both).toMatchObject({ id: first.id, net: '35.10', tax: '1.04', total: '36.14' });
    expect(both.version).toBeGreaterThan(first.version);
    expect(both.lines.map((line) => [line.position, line.finishedPieceId])).toEqual([
      [1, seconds.id],
      [2, good.id],
    ]);
    await issue(first).expect(412);
    expect(await faults()).toEqual([]);
  });

  it('is issued, paid, printed and booked as every other', async () => {
    const draft = await sold();
    const drafts = await read<{ items: InvoiceSummary[] }>(
      `invoices?of=shelf&state=draft&customerId=${buyer}`,
    );
    expect(drafts.items.map(({ id }) => id)).toEqual([draft.id]);
    const issued = (await issue(draft).expect(200)).body as Invoice;
    expect(issued).toMatchObject({ number: 'I-0001', state: 'issued', open: '13.64' });
    expect((await movements())[0]?.invoice).toEqual({ id: draft.id, number: 'I-0001' });
    const owed = await read<{ items: { number: string; open: string }[] }>('owed', 'bookkeeper');
    expect(owed.items).toMatchObject([{ number: 'I-0001', open: '13.64' }]);
    const paper = await as('bookkeeper').get(`/api/invoices/${draft.id}/paper`).expect(200);
    expect(paper.headers['content-type']).toContain('application/pdf');
    const paid = await post(
      `invoices/${draft.id}/payments`,
      { amount: '13.64', receivedOn: '2026-12-01', method: 'cash' },
      'bookkeeper',
    ).expect(201);
    expect(paid.body).toMatchObject({ state: 'paid', open: '0.00' });
    const sheet = await read<SalesSheet>('sales-sheets?from=2026-12-01&to=2026-12-01');
    expect(sheet.invoices).toMatchObject([{ number: 'I-0001', orderNumber: null, net: '12.60' }]);
    expect(sheet.totals).toMatchObject({ total: '13.64', received: '13.64' });
    const file = '/api/sales-sheets/file?from=2026-12-01&to=2026-12-01';
    await as('bookkeeper').get(file).expect(200);
    await post('periods', { fromDay: '2026-12-01', toDay: '2026-12-01' }, 'bookkeeper').expect(201);
    expect(await faults()).toEqual([]);
  });

  it('stands in lists and searches beside the invoices of orders', async () => {
    const shelf = await sold();
    const order = await makeReadyOrder(ready.shop.context);
    const other = await made<Invoice>('invoices', { orderId: order.id, taxRateId: null });
    expect(other.lines[0]).toMatchObject({ finishedPieceId: null });
    const ids = async (query: string) =>
      (await read<{ items: InvoiceSummary[] }>(`invoices?${query}`)).items.map(({ id }) => id);
    expect(await ids('')).toEqual([other.id, shelf.id]);
    expect(await ids('of=orders')).toEqual([other.id]);
    expect(await ids('of=shelf')).toEqual([shelf.id]);
    expect(await ids('q=from the shelf')).toEqual([shelf.id]);
    expect(await ids('q=tern')).toEqual([shelf.id]);
  });

  it('begins with what a customer could have: no other’s mark', async () => {
    const marked = await put({ quantity: 3, customerId: ready.customer.id });
    const could = async (customer: number) =>
      (await read<{ items: FinishedPiece[] }>(`finished-pieces?there=yes&forCustomer=${customer}`))
        .items;
    expect((await could(buyer)).map(({ id }) => id)).toEqual([seconds.id]);
    expect((await could(ready.customer.id)).map(({ id }) => id)).toEqual([marked.id, seconds.id]);
  });
});

describe('a draft from the shelf', () => {
  it('that is discarded lays its pieces back, at the very value they left at', async () => {
    const marked = { customerId: ready.customer.id };
    await put({ ...marked, quantity: 1, unitCost: '1.00' });
    const odd = await put({ ...marked, quantity: 2, unitCost: '0' });
    const before = await pieceNow(odd.id);
    const draft = await sold({ ...marked, quantity: 2 }, odd.id);
    // Three cost 1.00: the two leave at a share that does not come out even.
    expect(await pieceNow(odd.id)).toMatchObject({ onHand: 1, value: '0.33' });
    await discard(draft.id, 'bookkeeper').expect(200);
    expect(await pieceNow(odd.id)).toMatchObject({ onHand: 3, value: before.value });
    const [back, left] = await movements(odd.id);
    expect(left).toMatchObject({ kind: 'sold', quantity: -2, invoice: null });
    expect(back).toMatchObject({
      ...{ kind: 'put back', quantity: 2, value: left?.value?.replace('-', ''), invoice: null },
      reason: 'the draft invoice for Brambling Brewery was discarded',
    });
    await as('owner').get(`/api/invoices/${draft.id}`).expect(404);
    expect(await faults()).toEqual([]);
  });

  it('can lose one line, but not its last', async () => {
    const good = await put({ quantity: 5, unitCost: '2.00' });
    const first = await sold();
    await sold({ draftId: first.id, quantity: 1, unitPrice: '4.5' }, good.id);
    const three = await sold({ draftId: first.id, quantity: 2, unitPrice: '3' });
    const two = (await takeOff(three, 1).expect(200)).body as Invoice;
    expect(two.lines.map((line) => [line.position, line.quantity, line.amount])).toEqual([
      [1, 1, '4.50'],
      [2, 2, '6.00'],
    ]);
    expect(two).toMatchObject({ net: '10.50', tax: '0.87', total: '11.37' });
    expect(await pieceNow()).toMatchObject({ onHand: 5 });
    await takeOff(three, 1).expect(412);
    await takeOff(two, 9).expect(404);
    const one = (await takeOff(two, 2).expect(200)).body as Invoice;
    const refused = await takeOff(one, 1).expect(409);
    expect(refused.body.detail).toBe('This is the only line. Discard the draft instead.');
    expect(await faults()).toEqual([]);
  });

  it('takes nothing more once it is issued, nor what belongs elsewhere', async () => {
    const draft = await sold({ quantity: 1 });
    const other = await sell({ customerId: ready.customer.id, quantity: 1, draftId: draft.id });
    expect([other.status, other.body.detail]).toEqual([
      409,
      'That draft is for another customer. Draft a new invoice.',
    ]);
    const order = await makeReadyOrder(ready.shop.context, {
      customerName: 'Tern Street Outfitters',
    });
    const ofOrder = await made<Invoice>('invoices', { orderId: order.id, taxRateId: null });
    await sell({ quantity: 1, draftId: ofOrder.id }).expect(409);
    await takeOff(ofOrder, 1).expect(409);
    await sell({ quantity: 1, draftId: 999 }).expect(404);
    await issue(draft).expect(200);
    const late = await sell({ quantity: 1, draftId: draft.id }).expect(409);
    expect(late.body.detail).toContain('issued as I-0001');
    await discard(draft.id).expect(409);
    await takeOff(draft, 1).expect(409);
    expect(await pieceNow()).toMatchObject({ onHand: 6 });
    const query = (sql: string) => ready.shop.context.orm.em.getConnection().execute(sql);
    await expect(
      query(`UPDATE shelf_sale SET invoice_line_id = NULL, undone_at = 'now'`),
    ).rejects.toThrow('does not change');
    await expect(query('DELETE FROM shelf_sale')).rejects.toThrow('is not deleted');
  });
});

describe('a sale that cannot be', () => {
  it('of more than lie there is refused with what is there, and nothing is drafted', async () => {
    const refused = await sell({ quantity: 8 }).expect(409);
    expect(refused.body).toMatchObject({
      detail:
        '7 of them are on the shelf, and 8 cannot be taken. Take fewer, or count the shelf first.',
      allowed: ['take up to 7'],
    });
    expect(await read('invoices')).toMatchObject({ items: [] });
    expect(await pieceNow()).toMatchObject({ onHand: 7, value: '10.01' });
  });

  it('is refused beside its field: another’s mark, no price, no tax said, nobody', async () => {
    const marked = await put({ quantity: 3, customerId: ready.customer.id });
    const errors = async (change: object, of = seconds.id) =>
      (await sell(change, of).expect(422)).body.errors as { field: string; message: string }[];
    expect(await errors({}, marked.id)).toEqual([
      {
        field: 'customerId',
        message:
          'These bear the mark of Brambling Brewery, and go to nobody else. Choose Brambling Brewery.',
      },
    ]);
    await sell({ customerId: ready.customer.id, quantity: 1 }, marked.id).expect(201);
    expect(await errors({ customerId: 999 })).toMatchObject([{ field: 'customerId' }]);
    expect(await errors({ unitPrice: '0' })).toMatchObject([{ field: 'unitPrice' }]);
    expect(await errors({ unitPrice: '-1' })).toMatchObject([{ field: 'unitPrice' }]);
    expect(await errors({ unitPrice: '0.0001', quantity: 1 })).toEqual([
      { field: 'unitPrice', message: 'At this price they come to nothing. Enter a higher one.' },
    ]);
    expect(await errors({ quantity: 0 })).toMatchObject([{ field: 'quantity' }]);
    expect(await errors({ taxRateId: undefined })).toMatchObject([{ field: 'taxRateId' }]);
    expect(await errors({ taxRateId: 999 })).toMatchObject([{ field: 'taxRateId' }]);
    await sell({}, 999).expect(404);
    expect(await pieceNow()).toMatchObject({ onHand: 7 });
  });

  it('[S15] is the owner’s alone, and the maker is told of no invoice', async () => {
    await post(`finished-pieces/${seconds.id}/sales`, sale(), 'maker').expect(403);
    await post(`finished-pieces/${seconds.id}/sales`, sale(), 'bookkeeper').expect(403);
    await sold();
    const [left] = await movements(seconds.id, 'maker');
    expect(left).toMatchObject({ kind: 'sold', quantity: -4 });
    expect(left).not.toHaveProperty('invoice');
    expect(left).not.toHaveProperty('value');
  });
});

describe('several presses at once', () => {
  it('sell the last pieces once', async () => {
    const replies = await Promise.all(Array.from({ length: 8 }, () => sell({ quantity: 4 })));
    expect(replies.map(({ status }) => status).sort()).toEqual([201, ...Array(7).fill(409)]);
    expect(await pieceNow()).toMatchObject({ onHand: 3 });
    expect((await read<{ items: unknown[] }>('invoices')).items).toHaveLength(1);
  });

  it('of one button are one sale', async () => {
    const press = () => sell({ quantity: 2 }).set('Idempotency-Key', 'one-press');
    const replies = await Promise.all([press(), press(), press()]);
    expect(new Set(replies.map(({ status, body }) => `${status} ${body.id}`)).size).toBe(1);
    expect(await pieceNow()).toMatchObject({ onHand: 5 });
  });

  it('discard a draft once', async () => {
    const draft = await sold();
    const replies = await Promise.all([discard(draft.id), discard(draft.id)]);
    expect(replies.map(({ status }) => status).sort()).toEqual([200, 404]);
    expect(await pieceNow()).toMatchObject({ onHand: 7, value: '10.01' });
  });
});
