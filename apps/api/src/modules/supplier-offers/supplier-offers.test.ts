import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { ft2, stockUp } from '../../testing/stockroom.ts';
import { startTestShop } from '../../testing/test-shop.ts';

let shop: Awaited<ReturnType<typeof startTestShop>>;
let things: Awaited<ReturnType<typeof stockUp>>;
let second: number;

beforeAll(async () => {
  shop = await startTestShop();
  things = await stockUp(shop);
  const { body } = await owner().post('/api/suppliers').send({ name: 'Fennbridge Fittings' });
  second = body.id;
});
afterAll(() => shop.close());

const owner = () => shop.as('owner');
const offer = (body: object) => owner().post('/api/supplier-offers').send(body);
const breaks = [
  { from: '100', price: '0.18' },
  { from: '1000', price: '0.15' },
];

describe('offers of suppliers', () => {
  it('are several for one thing, the first of them preferred', async () => {
    const { supplierId, hardwareId } = things;
    const first = await offer({
      ...{ supplierId, hardwareId, breaks },
      articleNumber: 'R-9',
      minimum: '100',
      multiple: '100',
    }).expect(201);
    expect(first.body).toMatchObject({
      of: 'hardware',
      unit: 'piece',
      minimum: '100',
      multiple: '100',
      leadDays: null,
      usualLeadDays: 10,
      preferred: true,
      breaks,
    });
    const other = { supplierId: second, hardwareId, leadDays: 2 };
    await offer({ ...other, breaks: [{ from: '1', price: '0.2' }] }).expect(201);
    const list = await owner().get(`/api/supplier-offers?hardwareId=${hardwareId}`).expect(200);
    expect(
      list.body.items.map((each: { preferred: boolean; usualLeadDays: number }) => [
        each.preferred,
        each.usualLeadDays,
      ]),
    ).toEqual([
      [true, 10],
      [false, 2],
    ]);
  });

  it('leave what is paid today preferred, and set it beside the first offer of somebody else', async () => {
    const { supplierId } = things;
    const buckle = { name: 'Buckle 20 mm', unitPrice: '0.62', packSize: 25, supplierId };
    const { body: hardware } = await owner().post('/api/hardware').send(buckle).expect(201);
    const asked = { supplierId: second, hardwareId: hardware.id };
    await offer({ ...asked, breaks: [{ from: '1', price: '0.5' }] }).expect(201);
    const list = await owner().get(`/api/supplier-offers?hardwareId=${hardware.id}`).expect(200);
    expect(list.body.items).toMatchObject([
      { supplierId, preferred: true, multiple: '25', breaks: [{ from: '25', price: '0.62' }] },
      { supplierId: second, preferred: false },
    ]);
    const { body: due } = await owner().get('/api/order-suggestions?show=all').expect(200);
    const item = due.items.find(
      ({ id, of }: { id: number; of: string }) => of === 'hardware' && id === hardware.id,
    );
    expect(item).toMatchObject({ supplierId, multiple: '25' });
  });

  it('leave whole sides and their price per ft² preferred beside somebody else’s first offer', async () => {
    const { supplierId } = things;
    const sides = { wholeForm: 'side', wholeAreaMm2: ft2(22), supplierId };
    const { body: leather } = await owner()
      .post('/api/leathers')
      .send({ name: 'Chestnut 2–3 oz', pricePerFt2: '7.40', ...sides })
      .expect(201);
    const asked = { supplierId: second, leatherId: leather.id };
    await offer({ ...asked, breaks: [{ from: '0', price: '6.9' }] }).expect(201);
    const list = await owner().get(`/api/supplier-offers?leatherId=${leather.id}`).expect(200);
    expect(list.body.items).toMatchObject([
      { supplierId, preferred: true, multiple: null, breaks: [{ from: '0', price: '7.4' }] },
      { supplierId: second, preferred: false },
    ]);
    const { body: due } = await owner().get('/api/order-suggestions?show=all').expect(200);
    const item = due.items.find(
      ({ id, of }: { id: number; of: string }) => of === 'leather' && id === leather.id,
    );
    expect(item).toMatchObject({ supplierId, multiple: '2043866.88' });
  });

  describe('keep the supplier whom a thing names without a price', () => {
    const named = (kind: 'leathers' | 'hardware') =>
      kind === 'leathers' ? { pricePerFt2: '0' } : { unitPrice: '0', packSize: 25 };
    async function withFirstOffer(kind: 'leathers' | 'hardware', name: string) {
      const { supplierId } = things;
      const { body } = await owner()
        .post(`/api/${kind}`)
        .send({ name, supplierId, ...named(kind) })
        .expect(201);
      const thing = kind === 'leathers' ? { leatherId: body.id } : { hardwareId: body.id };
      const first = [{ from: kind === 'leathers' ? '0' : '1', price: '0.5' }];
      const { body: other } = await offer({ supplierId: second, ...thing, breaks: first });
      const [[key, id]] = Object.entries(thing) as [[string, number]];
      const { body: list } = await owner().get(`/api/supplier-offers?${key}=${id}`).expect(200);
      return { id, other, kept: list.items[0], items: list.items };
    }

    it.each([
      ['leathers', '0', null],
      ['hardware', '25', '25'],
    ] as const)(
      'of %s, preferred beside the first offer of somebody else',
      async (kind, from, multiple) => {
        const { supplierId } = things;
        const { id, items } = await withFirstOffer(kind, `No price yet, ${kind}`);
        expect(items).toMatchObject([
          { supplierId, preferred: true, multiple, breaks: [{ from, price: '0' }] },
          { supplierId: second, preferred: false },
        ]);
        const of = kind === 'leathers' ? 'leather' : 'hardware';
        const { body: due } = await owner().get('/api/order-suggestions?show=all').expect(200);
        const item = due.items.find(
          (each: { id: number; of: string }) => each.of === of && each.id === id,
        );
        expect(item).toMatchObject({ supplierId, unitPrice: '0.00' });
        const { body: log } = await owner().get('/api/activities?limit=2').expect(200);
        expect(log.items[1].action).toMatch(/^kept an offer without a price for No price yet, /);
      },
    );

    it('as an offer that quotes cannot reckon with before its price is entered', async () => {
      const { id, kept } = await withFirstOffer('hardware', 'Ring without a price');
      const adopt = () => owner().post(`/api/supplier-offers/${kept.id}/adoptions`);
      const refused = await adopt().expect(409);
      expect(refused.body.detail).toBe(
        'No price of theirs is known. Enter it with their offer, then use it.',
      );
      await owner()
        .patch(`/api/supplier-offers/${kept.id}`)
        .set('If-Match', `"${kept.version}"`)
        .send({ breaks: [{ from: '25', price: '0.4' }] })
        .expect(200);
      await adopt().expect(200);
      const { body } = await owner().get(`/api/hardware/${id}`).expect(200);
      expect(body).toMatchObject({ unitPrice: '0.40', supplierId: things.supplierId });
    });

    it('as one that is not the least dear of those that are left', async () => {
      const { id, other, kept } = await withFirstOffer('hardware', 'Stud without a price');
      const third = await owner().post('/api/suppliers').send({ name: 'Brindle Brass' });
      const last = { supplierId: third.body.id, hardwareId: id, preferred: true };
      const { body: dear } = await offer({ ...last, breaks: [{ from: '1', price: '0.9' }] });
      await owner().delete(`/api/supplier-offers/${dear.id}`).expect(200);
      const { body } = await owner().get(`/api/supplier-offers?hardwareId=${id}`).expect(200);
      expect(body.items.map((each: { id: number }) => each.id)).toEqual([other.id, kept.id]);
    });
  });

  it('keep an area of leather exactly, and its price per ft²', async () => {
    const { supplierId, leatherId } = things;
    const { body } = await offer({
      ...{ supplierId, leatherId },
      minimum: ft2(20),
      breaks: [
        { from: '0', price: '9.1' },
        { from: ft2(100), price: '8.75' },
      ],
    }).expect(201);
    expect(body).toMatchObject({
      of: 'leather',
      unit: 'mm2',
      minimum: '1858060.8',
      multiple: null,
      breaks: [{ price: '9.1' }, { from: '9290304', price: '8.75' }],
    });
  });

  it('show the maker who sells it, and no price', async () => {
    const { hardwareId } = things;
    const { body } = await shop
      .as('maker')
      .get(`/api/supplier-offers?hardwareId=${hardwareId}`)
      .expect(200);
    expect(body.items).toHaveLength(2);
    expect(body.items[0]).not.toHaveProperty('breaks');
    for (const role of ['maker', 'bookkeeper'] as const)
      await shop
        .as(role)
        .post('/api/supplier-offers')
        .send({ supplierId: second, hardwareId, breaks })
        .expect(403);
  });

  it('change only the thing’s own price when that is pressed', async () => {
    const { hardwareId } = things;
    const read = async () => (await owner().get(`/api/hardware/${hardwareId}`).expect(200)).body;
    const { body } = await owner().get(`/api/supplier-offers?hardwareId=${hardwareId}`);
    const other = body.items[1];
    expect(await read()).toMatchObject({ unitPrice: '0.17', supplierId: null });
    await owner().post(`/api/supplier-offers/${other.id}/adoptions`).expect(200);
    expect(await read()).toMatchObject({ unitPrice: '0.20', supplierId: second, packSize: 100 });
    const after = await owner().get(`/api/supplier-offers?hardwareId=${hardwareId}`);
    expect(
      after.body.items.map((each: { id: number; preferred: boolean }) => [each.id, each.preferred]),
    ).toEqual([
      [other.id, true],
      [body.items[0].id, false],
    ]);
  });

  it('change in the version that was read, and go off the list', async () => {
    const { hardwareId } = things;
    const { body } = await owner().get(`/api/supplier-offers?hardwareId=${hardwareId}`);
    const [{ id, version }] = body.items;
    const change = (read: number) =>
      owner().patch(`/api/supplier-offers/${id}`).set('If-Match', `"${read}"`);
    const changed = await change(version).send({ minimum: '50', leadDays: null }).expect(200);
    expect(changed.body).toMatchObject({ minimum: '50', leadDays: null, breaks: [{ from: '1' }] });
    await change(version).send({ leadDays: 4 }).expect(412);
    await change(changed.body.version).send({ minimum: '55', multiple: '10' }).expect(422);
    await owner().delete(`/api/supplier-offers/${id}`).expect(200);
    await owner().delete(`/api/supplier-offers/${id}`).expect(404);
  });

  const line = (from: string, price: string) => ({ from, price });
  it.each([
    ['breaks out of order', { breaks: [line('100', '2'), line('50', '1')] }, 'breaks.1.from'],
    ['twice the same', { breaks: [line('1', '2'), line('1', '1')] }, 'breaks.1.from'],
    ['a rising price', { breaks: [line('1', '2'), line('50', '2.1')] }, 'breaks.1.price'],
    [
      'a minimum off the pack',
      { breaks: [line('1', '2')], minimum: '150', multiple: '100' },
      'minimum',
    ],
    [
      'a first price above the minimum',
      { breaks: [line('100', '2')], minimum: '50' },
      'breaks.0.from',
    ],
    ['no price at all', { breaks: [] }, 'breaks'],
    ['half a rivet', { breaks: [line('1', '2'), line('5.5', '1')] }, 'breaks.1.from'],
    ['a price below zero', { breaks: [line('1', '-2')] }, 'breaks.0.price'],
  ])('refuse %s, naming the line', async (_what, wrong, field) => {
    const { hardwareId } = things;
    const { body } = await owner()
      .post('/api/suppliers')
      .send({ name: `For ${_what}` });
    const refused = await offer({ supplierId: body.id, hardwareId, ...wrong }).expect(422);
    expect(refused.body.errors).toMatchObject([{ field }]);
    expect(refused.body.errors[0].message).toMatch(/^[A-Z].*\.$/);
  });

  it('say who is on the list already, and what is no thing', async () => {
    const { supplierId, hardwareId, leatherId } = things;
    const again = await offer({ supplierId, hardwareId, minimum: '100', breaks }).expect(422);
    expect(again.body.errors[0].message).toContain('is on the list already');
    await offer({ supplierId, hardwareId, leatherId, breaks }).expect(422);
    await offer({ supplierId, breaks }).expect(422);
    await offer({ supplierId, hardwareId: 999, breaks }).expect(422);
  });
});

describe('a list of offers', () => {
  it('comes page by page, the preferred ones first, each once', async () => {
    const made = await owner()
      .post('/api/hardware')
      .send({ name: 'Rings 25 mm', kind: 'hardware', unitPrice: '0.30' })
      .expect(201);
    const hardwareId: number = made.body.id;
    for (const supplierId of [things.supplierId, second]) {
      await offer({ supplierId, hardwareId, breaks: [{ from: '1', price: '0.3' }] }).expect(201);
    }
    const read = async (paging = '') => {
      const { body } = await owner().get(`/api/supplier-offers?hardwareId=${hardwareId}${paging}`);
      return body as { items: { id: number }[]; next: string | null };
    };
    const [early, late] = (await read()).items.map(({ id }) => id);
    // Made preferred, the later one comes first, although its number is higher.
    await owner().post(`/api/supplier-offers/${late}/adoptions`).expect(200);
    const first = await read('&limit=1');
    expect(first.items).toMatchObject([{ id: late }]);
    const rest = await read(`&limit=1&cursor=${first.next}`);
    expect(rest.items).toMatchObject([{ id: early }]);
    expect(rest.next).toBeNull();
  });
});

describe('the preferred offer', () => {
  const price = (each: string) => [{ from: '0', price: each }];
  const preferredOf = async (leatherId: number) => {
    const { body } = await owner().get(`/api/supplier-offers?leatherId=${leatherId}`).expect(200);
    const items = body.items as { id: number; preferred: boolean }[];
    return items.filter(({ preferred }) => preferred).map(({ id }) => id);
  };

  it('is the least dear of the others once it is removed, or preferred no more', async () => {
    const { supplierId, leatherId } = await stockUp(shop);
    const third = await owner().post('/api/suppliers').send({ name: 'Thornwick Hides' });
    const first = await offer({ leatherId, supplierId, breaks: price('8') }).expect(201);
    const dear = await offer({ leatherId, supplierId: second, breaks: price('9') }).expect(201);
    const cheap = { leatherId, supplierId: third.body.id, breaks: price('8.5') };
    const { body: least } = await offer(cheap).expect(201);
    await owner().delete(`/api/supplier-offers/${first.body.id}`).expect(200);
    expect(await preferredOf(leatherId)).toEqual([least.id]);
    const { body } = await owner().get(`/api/supplier-offers?leatherId=${leatherId}`);
    await owner()
      .patch(`/api/supplier-offers/${least.id}`)
      .set('If-Match', `"${body.items[0].version}"`)
      .send({ preferred: false })
      .expect(200);
    expect(await preferredOf(leatherId)).toEqual([dear.body.id]);
  });

  it('still sells the thing where none is preferred and the thing names nobody', async () => {
    const { supplierId, hardwareId } = await stockUp(shop);
    const only = await offer({ hardwareId, supplierId, breaks: price('0.17') }).expect(201);
    await owner()
      .patch(`/api/supplier-offers/${only.body.id}`)
      .set('If-Match', `"${only.body.version}"`)
      .send({ preferred: false })
      .expect(200);
    const { body } = await owner().get('/api/order-suggestions?show=all').expect(200);
    const items = body.items as { of: string; id: number; supplierId: number | null }[];
    expect(items.find(({ of, id }) => of === 'hardware' && id === hardwareId)).toMatchObject({
      supplierId,
    });
  });

  it('refuses a quantity that nobody orders, with how much is the most', async () => {
    const { supplierId, leatherId } = await stockUp(shop);
    const refused = await offer({
      ...{ leatherId, supplierId },
      breaks: [...price('8'), { from: '1021933440', price: '6' }],
    }).expect(422);
    expect(refused.body.errors).toEqual([
      {
        field: 'breaks.1.from',
        message: 'Enter at most 1,000,000,000 pieces, or 10,763 ft² of leather.',
      },
    ]);
  });
});
