import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { orderMore, stockUp } from '../../testing/stockroom.ts';
import { startTestShop } from '../../testing/test-shop.ts';

let shop: Awaited<ReturnType<typeof startTestShop>>;

beforeAll(async () => {
  shop = await startTestShop();
});

afterAll(async () => {
  await shop.close();
});

const change = async (body: object) => {
  const { body: now } = await shop.as('owner').get('/api/workshop');
  return shop.as('owner').patch('/api/workshop').set('If-Match', `"${now.version}"`).send(body);
};

describe('the shop’s starting values', () => {
  it('are sensible from the start', async () => {
    const { body } = await shop.as('owner').get('/api/workshop').expect(200);
    expect(body).toMatchObject({
      currency: 'USD',
      rejectPercent: '10',
      targetPerHour: '60.00',
      timeZone: 'UTC',
    });
  });

  it('can be changed, one at a time', async () => {
    expect((await change({ targetPerHour: '72.5', lengthUnit: 'in' })).status).toBe(200);
    const { body } = await shop.as('owner').get('/api/workshop');
    expect(body).toMatchObject({ targetPerHour: '72.50', lengthUnit: 'in', wagePerHour: '22.00' });
  });

  it.each([
    ['targetPerHour', '-1'],
    ['rejectPercent', '100'],
    ['confidencePercent', '100'],
    ['confidencePercent', '20'],
    ['priceStep', '0'],
    ['benchHoursPerDay', '25'],
    ['timeZone', 'Nowhere/Fennbridge'],
    ['currency', 'XXQ'],
    ['name', ''],
    ['quoteValidDays', 0],
  ])('refuse %s of %s', async (field, value) => {
    const { status, body } = await change({ [field]: value });
    expect(status).toBe(422);
    expect(body.errors[0].field).toBe(field);
  });

  it('keep their currency once something is kept in it', async () => {
    const statusOf = async (currency: string) => (await change({ currency })).status;
    expect([await statusOf('EUR'), await statusOf('USD')]).toEqual([200, 200]);
    await orderMore(shop, await stockUp(shop));
    const { status, body } = await change({ currency: 'EUR' });
    expect(status).toBe(422);
    expect(body.errors[0]).toMatchObject({ field: 'currency' });
    expect(body.errors[0].message).toMatch(/^Quotes, orders or stock are kept in USD/);
    expect(await statusOf('USD')).toBe(200);
  });

  it('[S15] tell the maker no prices', async () => {
    const { body } = await shop.as('maker').get('/api/workshop').expect(200);
    expect(body).toMatchObject({ name: 'A Test Shop' });
    for (const hidden of [
      'targetPerHour',
      'wagePerHour',
      'packingPerOrder',
      'priceStep',
      'depositPercent',
    ]) {
      expect(body).not.toHaveProperty(hidden);
    }
  });
});
