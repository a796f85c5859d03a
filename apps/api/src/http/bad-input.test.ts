import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { startTestShop } from '../testing/test-shop.ts';

let shop: Awaited<ReturnType<typeof startTestShop>>;

beforeAll(async () => {
  shop = await startTestShop();
});

afterAll(async () => {
  await shop.close();
});

const post = (body: unknown, type = 'application/json') =>
  shop
    .as('owner')
    .post('/api/leathers')
    .set('Content-Type', type)
    .send(body as string);

describe('[S19] an amount', () => {
  it.each([
    'NaN',
    'Infinity',
    '-0',
    '-1',
    '1e3',
    '1e309',
    '0.12345',
    '01',
    '',
    ' ',
    '1,5',
    '99999999999999',
    '0x10',
  ])('of %s is refused beside its field', async (pricePerFt2) => {
    const { body } = await post(JSON.stringify({ name: 'X', pricePerFt2 })).expect(422);
    expect(body.errors).toEqual([
      { field: 'pricePerFt2', message: expect.stringContaining('Enter a price') as string },
    ]);
  });

  it.each([9.5, null, true, ['9.50'], { value: '9.50' }])(
    'that is no text (%j) is refused',
    async (pricePerFt2) => {
      await post(JSON.stringify({ name: 'X', pricePerFt2 })).expect(422);
    },
  );
});

describe('[S17][S18] a request', () => {
  it('with a field that is not asked for is refused, by name', async () => {
    const { body } = await post(
      JSON.stringify({ name: 'X', pricePerFt2: '1', id: 7, version: 3 }),
    ).expect(422);
    expect((body.errors as { field: string }[]).map((error) => error.field).sort()).toEqual([
      'id',
      'version',
    ]);
  });

  it('with __proto__ is refused', async () => {
    await post('{"name":"X","pricePerFt2":"1","__proto__":{"active":false}}').expect(422);
  });

  it('with a query key twice is refused', async () => {
    await shop.as('owner').get('/api/leathers?limit=1&limit=2').expect(422);
    await shop.as('owner').get('/api/leathers?q[]=1').expect(422);
  });

  it('that is not JSON is refused', async () => {
    const { body } = await post('{"name":').expect(400);
    expect(body.detail).toContain('not valid JSON');
    await post('name=X', 'application/x-www-form-urlencoded').expect(415);
  });

  it('that is too large is refused', async () => {
    await post(JSON.stringify({ name: 'x'.repeat(2_000_000) })).expect(413);
  });

  it('for a place that is not there gets a problem, not a page', async () => {
    const { body, headers } = await shop.as('owner').get('/api/nowhere').expect(404);
    expect(headers['content-type']).toContain('application/problem+json');
    expect(body).toMatchObject({ status: 404, title: 'Not found' });
    await shop.as('owner').get('/api/leathers/abc').expect(404);
    await shop.as('owner').get('/api/leathers/-1').expect(404);
  });
});

describe('a change', () => {
  it('leaves alone what it does not name', async () => {
    const { body: made } = await post(
      JSON.stringify({ name: 'Whole', pricePerFt2: '9.5', colour: 'russet', weightLowOz: '5' }),
    ).expect(201);
    const { body } = await shop
      .as('owner')
      .patch(`/api/leathers/${made.id}`)
      .set('If-Match', '"1"')
      .send({ name: 'Whole again' })
      .expect(200);
    expect(body).toMatchObject({
      name: 'Whole again',
      colour: 'russet',
      weightLowOz: '5',
      pricePerFt2: '9.50',
      version: 2,
    });
  });

  it('must name the version that was read', async () => {
    const { body: made } = await post(
      JSON.stringify({ name: 'Versioned', pricePerFt2: '1' }),
    ).expect(201);
    const change = (ifMatch?: string) => {
      const request = shop.as('owner').patch(`/api/leathers/${made.id}`);
      return (ifMatch === undefined ? request : request.set('If-Match', ifMatch)).send({
        pricePerFt2: '2',
      });
    };
    await change().expect(428);
    await change('three').expect(400);
    await change('"1"').expect(200);
    const { body } = await change('"1"').expect(412);
    expect(body.changed).toMatchObject({
      by: 'The owner',
      what: expect.stringContaining('leather') as string,
    });
    const { body: kept } = await shop.as('owner').get(`/api/leathers/${made.id}`);
    expect(kept.version).toBe(2);
  });
});
