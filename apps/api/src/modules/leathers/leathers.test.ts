import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { startTestShop } from '../../testing/test-shop.ts';

let shop: Awaited<ReturnType<typeof startTestShop>>;

beforeAll(async () => {
  shop = await startTestShop();
});
afterAll(() => shop.close());

const owner = () => shop.as('owner');
const add = (body: object) => owner().post('/api/leathers').send(body);

describe('leathers', () => {
  it('need no more than a name and a price', async () => {
    const { body } = await add({ name: 'Bridle black', pricePerFt2: '11.5' }).expect(201);
    expect(body).toMatchObject({
      pricePerFt2: '11.50',
      weightLowOz: null,
      supplierName: null,
      onHandAreaMm2: '0',
      freeAreaMm2: '0',
      onOrderAreaMm2: '0',
    });
  });

  it('change only what is sent, in the version that was read', async () => {
    const { body } = await add({
      name: 'Oak tan',
      pricePerFt2: '9.20',
      weightLowOz: '5',
      weightHighOz: '6',
      colour: 'russet',
    }).expect(201);
    const change = () =>
      owner().patch(`/api/leathers/${body.id}`).set('If-Match', `"${body.version}"`);
    const changed = await change().send({ pricePerFt2: '9.40' }).expect(200);
    expect(changed.body).toMatchObject({
      pricePerFt2: '9.40',
      weightLowOz: '5',
      weightHighOz: '6',
      colour: 'russet',
      version: body.version + 1,
    });
    await change().send({ colour: 'black' }).expect(412);
  });

  it.each([
    ['a name that is taken', { name: 'Oak tan', pricePerFt2: '1' }, 'name'],
    ['a price below zero', { name: 'Below', pricePerFt2: '-1' }, 'pricePerFt2'],
    ['a price that is no number', { name: 'None', pricePerFt2: 'NaN' }, 'pricePerFt2'],
    [
      'weights the wrong way round',
      { name: 'Round', pricePerFt2: '1', weightLowOz: '6', weightHighOz: '5' },
      'weightHighOz',
    ],
    [
      'a supplier that does not exist',
      { name: 'From nowhere', pricePerFt2: '1', supplierId: 999 },
      'supplierId',
    ],
  ])('refuse %s', async (_what, body, field) => {
    const refused = await add(body).expect(422);
    expect(refused.body.errors).toMatchObject([{ field }]);
  });

  it('show the maker everything but the price', async () => {
    const { body } = await shop.as('maker').get('/api/leathers?q=Oak').expect(200);
    expect(body.items).toHaveLength(1);
    expect(body.items[0]).toMatchObject({ name: 'Oak tan', weightLowOz: '5' });
    expect(body.items[0]).not.toHaveProperty('pricePerFt2');
  });
});
