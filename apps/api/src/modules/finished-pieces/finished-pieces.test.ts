import type { FinishedMovement, FinishedPiece, Job, RunsCheck } from '@hidewright/contract';
import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import {
  agreedQuote,
  readyForTheBench,
  takenOn,
  ticketOf,
  type BenchShop,
} from '../../testing/bench-shop.ts';
import { startTestShop } from '../../testing/test-shop.ts';

let ready: BenchShop;
let ticket: Job;

beforeEach(async () => {
  ready = await readyForTheBench(await startTestShop());
  ticket = await ticketOf(ready, await takenOn(ready));
});
afterEach(() => ready.shop.close());

type Role = 'owner' | 'maker' | 'bookkeeper';
const as = (role: Role) => ready.shop.as(role);
const post = (path: string, body: object, role: Role = 'maker') =>
  as(role).post(`/api/${path}`).send(body);
const shelf = async (role: Role = 'owner') =>
  (await as(role).get('/api/finished-pieces').expect(200)).body.items as FinishedPiece[];
const movements = async (id: number) =>
  (await as('owner').get(`/api/finished-pieces/${id}/movements`).expect(200)).body
    .items as FinishedMovement[];

async function finish(good: number, seconds: number): Promise<void> {
  const [lot] = ticket.lots;
  await post(`jobs/${ticket.id}/takings`, {
    lotId: ready.lotId,
    areaMm2: lot?.heldAreaMm2,
  }).expect(201);
  await post(`jobs/${ticket.id}/takings`, { hardwareId: ready.hardwareId, quantity: 100 }).expect(
    201,
  );
  await post(`jobs/${ticket.id}/finish`, { good, seconds }).expect(201);
}

const kind = async (sort: FinishedPiece['sort']) =>
  (await shelf()).find((piece) => piece.sort === sort) as FinishedPiece;

describe('a job that makes more than is ordered, or seconds', () => {
  it('puts them on the shelf at their share of leather and hardware', async () => {
    await finish(52, 1);
    const pieces = await shelf();
    expect(pieces.map(({ sort, onHand, patternName }) => [patternName, sort, onHand])).toEqual([
      ['Round coaster', 'seconds', 1],
      ['Round coaster', 'good', 2],
    ]);
    const { items } = (await as('owner').get(`/api/stock-movements?jobId=${ticket.id}`)).body;
    const cost = (items as { value: string }[]).reduce((sum, { value }) => sum - Number(value), 0);
    const value = pieces.reduce((sum, piece) => sum + Number(piece.value), 0);
    expect(value).toBeCloseTo((cost * 3) / 53, 2);
    const [made] = await movements(pieces[1]?.id ?? 0);
    expect(made).toMatchObject({ kind: 'made', quantity: 2, jobNumber: ticket.number });
    expect((await shelf('maker'))[0]).not.toHaveProperty('value');
  });

  it('puts nothing there when just enough came out', async () => {
    await finish(50, 0);
    expect(await shelf()).toEqual([]);
  });

  it('is said where the same pattern is checked again', async () => {
    await finish(52, 1);
    const { id, version } = await kind('good');
    await as('maker')
      .patch(`/api/finished-pieces/${id}`)
      .set('If-Match', `"${version}"`)
      .send({ place: 'tray 3' })
      .expect(200);
    const runs = [{ patternId: ready.patternId, quantity: 10 }];
    const check = (await post('checks', { runs }).expect(200)).body as RunsCheck;
    const said = (notes: string[] = []) => notes.filter((note) => note.includes('on the shelf'));
    expect(await kind('good')).toMatchObject({ customerId: ready.customer.id });
    const both = [
      '2 finished ones are on the shelf, tray 3.',
      '1 finished second is on the shelf.',
    ];
    // What carries a customer's mark is offered to that customer only.
    expect(said(check.runs[0]?.notes)).toEqual([]);
    const quote = await agreedQuote(ready, 50);
    const asked = (await as('maker').get(`/api/quotes/${quote.id}/check`).expect(200)).body as {
      notes: string[];
    };
    expect(said(asked.notes)).toEqual(both);
  });
});

describe('pieces that no job put there', () => {
  const put = (body: object, role: Role = 'owner') =>
    post(
      'finished-pieces',
      { patternId: ready.patternId, sort: 'good', reason: 'found in a box', ...body },
      role,
    );

  it('are put on the shelf by hand, with a cost or without, and logged', async () => {
    const first = await put({ quantity: 24, unitCost: '1.37', place: 'tray 3' }).expect(201);
    expect(first.body).toMatchObject({
      ...{ patternName: 'Round coaster', option: null, sort: 'good', customerId: null },
      ...{ onHand: 24, place: 'tray 3', value: '32.88', valueEach: '1.37' },
    });
    const more = await put({ quantity: 1 }, 'maker').expect(201);
    expect(more.body).toMatchObject({ id: first.body.id, onHand: 25, place: 'tray 3' });
    expect(more.body).not.toHaveProperty('value');
    expect((await shelf())[0]).toMatchObject({ value: '34.25' });
    expect(await movements(first.body.id)).toMatchObject([
      { kind: 'count', quantity: 1, jobId: null, reason: 'found in a box' },
      { kind: 'count', quantity: 24, value: '32.88' },
    ]);
    const log = (await as('owner').get('/api/activities')).body.items as { action: string }[];
    expect(log[0]?.action).toBe('put 1 of Round coaster on the shelf');
  });

  it('lie apart by sort and mark, and go back to what they cost before', async () => {
    const marked = await put({ quantity: 3, customerId: ready.customer.id }).expect(201);
    const seconds = await put({ quantity: 2, sort: 'seconds', unitCost: '0.50' }).expect(201);
    expect(new Set([marked.body.id, seconds.body.id]).size).toBe(2);
    expect(marked.body).toMatchObject({ customerName: ready.customer.name, value: '0.00' });
    const { id } = seconds.body as FinishedPiece;
    await post(`finished-pieces/${id}/counts`, { counted: 0, reason: 'gone' }).expect(201);
    await put({ quantity: 4, sort: 'seconds' }).expect(201);
    expect(await kind('seconds')).toMatchObject({ onHand: 4, value: '2.00' });
  });

  it('are refused where they make no sense, with a sentence beside the field', async () => {
    const refused = async (body: object, role: Role = 'owner') =>
      (await put({ quantity: 1, ...body }, role).expect(422)).body.errors as object[];
    expect(await refused({ patternId: 999 })).toMatchObject([{ field: 'patternId' }]);
    expect(await refused({ customerId: 999 })).toMatchObject([{ field: 'customerId' }]);
    expect(await refused({ option: 'In gold' })).toEqual([
      {
        field: 'option',
        message: 'Round coaster has no option "In gold". Choose one that it has.',
      },
    ]);
    expect(await refused({ unitCost: '1.00' }, 'maker')).toEqual([
      { field: 'unitCost', message: 'Leave the cost to the owner.' },
    ]);
    expect(await refused({ quantity: 0 })).toMatchObject([{ field: 'quantity' }]);
    expect(await refused({ reason: ' ' })).toMatchObject([{ field: 'reason' }]);
    await put({ quantity: 1 }, 'bookkeeper').expect(403);
    expect(await shelf()).toEqual([]);
  });
});

describe('pieces on the shelf', () => {
  it('leave it sold, given or spoiled, each with a word, and the last takes the last cent', async () => {
    await finish(53, 0);
    const { id } = await kind('good');
    const take = (body: object) => post(`finished-pieces/${id}/takings`, body);
    const buyer = { customerId: ready.customer.id };
    const sold = await take({ as: 'sold', ...buyer, quantity: 1, reason: 'at the market' });
    expect(sold.status).toBe(201);
    expect(sold.body).toMatchObject({ onHand: 2 });
    await take({ as: 'given', ...buyer, quantity: 1, reason: 'sample for Tern Street' }).expect(
      201,
    );
    await take({ as: 'spoiled', quantity: 1, reason: 'fell into dye' }).expect(201);
    expect(await kind('good')).toMatchObject({ onHand: 0, value: '0.00', valueEach: null });
    const all = await movements(id);
    expect(all.map((row) => [row.kind, row.quantity])).toEqual([
      ['spoiled', -1],
      ['given', -1],
      ['sold', -1],
      ['made', 3],
    ]);
    expect(all.reduce((sum, { value }) => sum + Math.round(Number(value) * 100), 0)).toBe(0);
    const log = (await as('owner').get('/api/activities')).body.items as { action: string }[];
    expect(log.map(({ action }) => action)).toContain('gave away 1 of Round coaster');
  });

  it('with a customer’s mark are sold or given to that customer alone', async () => {
    await finish(53, 0);
    const { id } = await kind('good');
    const take = (as: string, customerId?: number) =>
      post(
        `finished-pieces/${id}/takings`,
        { as, quantity: 1, reason: 'walk-in', customerId },
        'maker',
      );
    const { name } = ready.customer;
    const message = `These bear the mark of ${name}, and go to nobody else. Choose ${name}.`;
    for (const as of ['sold', 'given'])
      for (const somebody of [undefined, 999])
        expect((await take(as, somebody).expect(422)).body.errors).toEqual([
          { field: 'customerId', message },
        ]);
    expect(await kind('good')).toMatchObject({ onHand: 3 });
    await take('sold', ready.customer.id).expect(201);
    await take('given', ready.customer.id).expect(201);
    await take('spoiled').expect(201);
    expect(await kind('good')).toMatchObject({ onHand: 0 });
  });

  it('are counted, at what those beside them cost or the last did', async () => {
    await finish(52, 0);
    const { id, valueEach } = await kind('good');
    const counted = (count: number) =>
      post(`finished-pieces/${id}/counts`, { counted: count, reason: 'Counted on the shelf' });
    expect((await counted(4).expect(201)).body).toMatchObject({ onHand: 4 });
    await counted(0).expect(201);
    await counted(1).expect(201);
    expect((await kind('good')).value).toBe(valueEach);
    const before = (await movements(id)).length;
    await counted(1).expect(201);
    expect(await movements(id)).toHaveLength(before);
  });

  it('are never fewer than none, and nonsense is refused', async () => {
    await finish(52, 0);
    const { id, version } = await kind('good');
    const take = (quantity: number) =>
      post(`finished-pieces/${id}/takings`, {
        ...{ as: 'sold', customerId: ready.customer.id },
        ...{ quantity, reason: 'at the market' },
      });
    const refused = await take(3).expect(409);
    expect(refused.body.detail).toBe(
      '2 of them are on the shelf, and 3 cannot be taken. Take fewer, or count the shelf first.',
    );
    expect(refused.body.allowed).toEqual(['take up to 2']);
    await take(0).expect(422);
    await take(-1).expect(422);
    await post(`finished-pieces/${id}/takings`, { as: 'sold', quantity: 1, reason: ' ' }).expect(
      422,
    );
    await post(`finished-pieces/${id}/counts`, { counted: -1, reason: 'x' }).expect(422);
    await post('finished-pieces/999/takings', { as: 'sold', quantity: 1, reason: 'x' }).expect(404);
    await post(
      `finished-pieces/${id}/takings`,
      { as: 'sold', quantity: 1, reason: 'x' },
      'bookkeeper',
    ).expect(403);
    await as('maker')
      .patch(`/api/finished-pieces/${id}`)
      .set('If-Match', `"${version + 1}"`)
      .send({ place: 'tray 3' })
      .expect(412);
    expect(await kind('good')).toMatchObject({ onHand: 2 });
  });

  it('are sold once, however many reach for the last', async () => {
    await finish(51, 0);
    const { id } = await kind('good');
    const buyer = { customerId: ready.customer.id };
    const sale = { as: 'sold', ...buyer, quantity: 1, reason: 'at the market' };
    const replies = await Promise.all(
      Array.from({ length: 8 }, () => post(`finished-pieces/${id}/takings`, sale)),
    );
    expect(replies.map(({ status }) => status).sort()).toEqual([201, ...Array(7).fill(409)]);
    expect(await kind('good')).toMatchObject({ onHand: 0 });
  });
});
