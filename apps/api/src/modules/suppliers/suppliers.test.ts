import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { startTestShop } from '../../testing/test-shop.ts';

let shop: Awaited<ReturnType<typeof startTestShop>>;

beforeAll(async () => {
  shop = await startTestShop();
});
afterAll(() => shop.close());

const add = (body: object) => shop.as('owner').post('/api/suppliers').send(body);

describe('suppliers', () => {
  it('are added, found and changed', async () => {
    const { body } = await add({ name: 'Fennbridge Fittings', leadDays: 5 }).expect(201);
    expect(body).toMatchObject({ email: '', phone: '', leadDays: 5, active: true });
    const found = await shop.as('bookkeeper').get('/api/suppliers?q=fittings').expect(200);
    expect(found.body.items).toMatchObject([{ id: body.id }]);
    const change = () =>
      shop.as('owner').patch(`/api/suppliers/${body.id}`).set('If-Match', `"${body.version}"`);
    const changed = await change().send({ email: 'desk@example.com' }).expect(200);
    expect(changed.body).toMatchObject({
      email: 'desk@example.com',
      leadDays: 5,
      name: 'Fennbridge Fittings',
    });
    await change().send({ email: '' }).expect(412);
  });

  it.each([
    ['a name that is taken', { name: 'Fennbridge Fittings' }, 'name'],
    ['no name', { name: '  ' }, 'name'],
    ['an address that is none', { name: 'Somebody', email: 'nobody at all' }, 'email'],
    [
      'a line break in an address',
      { name: 'Somebody', email: 'a@example.com\r\nBcc: b@example.com' },
      'email',
    ],
    ['days below zero', { name: 'Somebody', leadDays: -1 }, 'leadDays'],
  ])('are refused with %s', async (_what, body, field) => {
    const refused = await add(body).expect(422);
    expect(refused.body.errors).toMatchObject([{ field }]);
  });

  it('are kept by the owner alone', async () => {
    await shop.as('maker').post('/api/suppliers').send({ name: 'Theirs' }).expect(403);
  });
});
