import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { startTestShop } from '../../testing/test-shop.ts';

let shop: Awaited<ReturnType<typeof startTestShop>>;

beforeAll(async () => {
  shop = await startTestShop();
});
afterAll(() => shop.close());

const owner = () => shop.as('owner');
const add = (body: object) => owner().post('/api/customers').send(body);

describe('customers', () => {
  it('need only a name', async () => {
    const { body } = await add({ name: 'The Copper Heron' }).expect(201);
    expect(body).toMatchObject({
      name: 'The Copper Heron',
      email: '',
      phone: '',
      active: true,
      version: 1,
    });
    const read = await shop.as('bookkeeper').get(`/api/customers/${body.id}`).expect(200);
    expect(read.body).toEqual(body);
  });

  it.each([
    ['no name', { name: ' ' }, 'name'],
    ['an address that is none', { name: 'A', email: 'nobody' }, 'email'],
    ['a line break in a name', { name: 'A\r\nBcc: b@example.com' }, 'name'],
    ['an unknown field', { name: 'A', balance: '0' }, 'balance'],
  ])('are refused with %s', async (_what, body, field) => {
    const reply = await add(body).expect(422);
    expect(reply.body.errors.map((error: { field: string }) => error.field)).toEqual([field]);
  });

  it('do not share a name', async () => {
    await add({ name: 'Quillfeather Books' }).expect(201);
    const { body } = await add({ name: 'Quillfeather Books' }).expect(422);
    expect(body.errors[0]).toEqual({
      field: 'name',
      message:
        'There is a customer of that name already. Open that one, or add what tells the two apart.',
    });
  });

  it('change by version, only in what is named', async () => {
    const customer = (
      await add({ name: 'Saltmarsh Rowing Club', phone: '01632 960001' }).expect(201)
    ).body;
    const change = (body: object, version: number) =>
      shop
        .as('bookkeeper')
        .patch(`/api/customers/${customer.id}`)
        .set('If-Match', `"${version}"`)
        .send(body);
    const changed = (await change({ email: 'boats@example.com' }, 1).expect(200)).body;
    expect(changed).toMatchObject({
      email: 'boats@example.com',
      phone: '01632 960001',
      version: 2,
    });
    await change({ email: '' }, 1).expect(412);
    await change({ name: 'The Copper Heron' }, 2).expect(422);
    await change({ active: false }, 2).expect(200);
    const away = (await owner().get('/api/customers').query({ active: 'no' }).expect(200)).body;
    expect(away.items).toMatchObject([{ id: customer.id }]);
  });

  it('are found by name, contact and address', async () => {
    const { body } = await add({
      name: 'Odalys & Pim',
      contactName: 'Pim',
      email: 'pim@example.com',
    }).expect(201);
    for (const q of ['odalys', 'Pim', 'pim@']) {
      const found = (await owner().get('/api/customers').query({ q }).expect(200)).body;
      expect(found.items.map((each: { id: number }) => each.id)).toEqual([body.id]);
    }
  });

  it('[S15] are not for the maker', async () => {
    await shop.as('maker').get('/api/customers').expect(403);
    await shop.as('maker').get('/api/customers/1').expect(403);
    await shop.as('bookkeeper').post('/api/customers').send({ name: 'B' }).expect(403);
    await shop.nobody().get('/api/customers').expect(401);
  });
});
