import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import type { Order, PromiseOutlook } from '@hidewright/contract';
import {
  readyForTheBench,
  setBenchHours,
  takenOn,
  type BenchShop,
} from '../../testing/bench-shop.ts';
import { sendByHand, draftQuote } from '../../testing/example-quote.ts';
import { startTestShop } from '../../testing/test-shop.ts';
import { verifyFolder } from '../../verify/verify-folder.ts';
import { OutgoingMail } from '../mail/outgoing-mail.entity.ts';

let ready: BenchShop;
beforeEach(async () => {
  ready = await readyForTheBench(await startTestShop({ SMTP_URL: 'smtp://127.0.0.1:9' }));
});
afterEach(() => ready.shop.close());

const owner = () => ready.shop.as('owner');
const ask = async (id: number, by: string) =>
  (await owner().get(`/api/orders/${id}/promises?by=${by}`).expect(200)).body as PromiseOutlook;
const move = ({ id, version }: Pick<Order, 'id' | 'version'>, body: object) =>
  owner()
    .post(`/api/orders/${id}/promises`)
    .set('If-Match', `"${version}"`)
    .send({ why: 'The hide came late', ...body });

describe('asking whether another day can be kept', () => {
  it('says yes, or how much is short and from when it can', async () => {
    const { id } = await takenOn(ready);
    expect(await ask(id, '2026-12-20')).toMatchObject({
      kept: true,
      sentence: 'The bench can do it by Sun 20 Dec 2026.',
      pushed: [],
      cannotMail: null,
    });
    await setBenchHours(ready, '0.5');
    const tight = await ask(id, '2026-12-02');
    expect(tight.kept).toBe(false);
    expect(tight.sentence).toMatch(
      /^The bench cannot do it by Wed 2 Dec 2026: .+ are short\. It can by .+ Dec 2026\.$/,
    );
    expect((await ask(id, tight.earliest ?? '')).kept).toBe(true);
  });

  it('names whose promise an earlier day would break', async () => {
    const first = await takenOn(ready, 50, { promisedOn: '2026-12-04' });
    const second = await takenOn(ready, 50, { promisedOn: '2026-12-18', evenIfShort: true });
    await setBenchHours(ready, '0.5');
    const { pushed } = await ask(second.id, '2026-12-03');
    expect(pushed).toEqual([
      expect.stringMatching(
        new RegExp(
          `^${first.job.number} .+ is promised for Fri 4 Dec 2026: .+ of it would be late\\.$`,
        ),
      ),
    ]);
  });

  it('says so where the work is done, and refuses a day that is over', async () => {
    const { id, job } = await takenOn(ready);
    await owner().get(`/api/orders/${id}/promises?by=2026-11-30`).expect(422);
    await owner().post(`/api/jobs/${job.id}/finish`).send({ good: 50 }).expect(201);
    expect(await ask(id, '2026-12-02')).toMatchObject({
      kept: true,
      sentence: 'J-0001 is finished: nothing is left to do at the bench.',
    });
  });
});

describe('moving the promised day', () => {
  it('keeps each day it was promised for, who moved it and why', async () => {
    const order = await takenOn(ready);
    const once = (await move(order, { promisedOn: '2026-12-18' }).expect(201)).body as Order;
    const twice = (await move(once, { promisedOn: '2026-12-17', why: 'It came' }).expect(201))
      .body as Order;
    expect(twice).toMatchObject({
      promisedOn: '2026-12-17',
      moves: [
        { fromDay: '2026-12-16', toDay: '2026-12-18', why: 'The hide came late', by: 'The owner' },
        { fromDay: '2026-12-18', toDay: '2026-12-17', why: 'It came' },
      ],
    });
    const { days } = (await owner().get('/api/bench-hours?days=30').expect(200)).body as {
      days: { day: string; promised: unknown[] }[];
    };
    expect(days.filter(({ promised }) => promised.length > 0).map(({ day }) => day)).toEqual([
      '2026-12-17',
    ]);
    expect(
      (await verifyFolder(ready.shop.context.config.dataDir)).flatMap((rule) => rule.faults),
    ).toEqual([]);
  });

  it('is moved once for one key, and by one of two who move it at once', async () => {
    const order = await takenOn(ready);
    const key = () => move(order, { promisedOn: '2026-12-18' }).set('Idempotency-Key', 'one-press');
    const first = (await key().expect(201)).body as Order;
    expect((await key().expect(201)).body).toEqual(first);
    const both = await Promise.all([
      move(first, { promisedOn: '2026-12-21' }),
      move(first, { promisedOn: '2026-12-22' }),
    ]);
    expect(both.map(({ status }) => status).sort()).toEqual([201, 412]);
    const { body } = await owner().get(`/api/orders/${order.id}`).expect(200);
    expect(body.moves).toHaveLength(2);
    await owner()
      .post(`/api/orders/${order.id}/promises`)
      .send({ promisedOn: '2026-12-30', why: 'x' })
      .expect(428);
  });

  it('takes a day that the bench cannot keep at the owner’s word', async () => {
    const order = await takenOn(ready);
    await setBenchHours(ready, '0.5');
    expect((await ask(order.id, '2026-12-01')).kept).toBe(false);
    await move(order, { promisedOn: '2026-12-01' }).expect(201);
  });

  it('refuses the same day, a day that is over or out of sight, and to say nothing why', async () => {
    const order = await takenOn(ready);
    for (const promisedOn of ['2026-12-16', '2026-11-30', '2031-01-01', '2026-02-30']) {
      const { body } = await move(order, { promisedOn }).expect(422);
      expect(body.errors).toMatchObject([{ field: 'promisedOn' }]);
    }
    const { body } = await move(order, { promisedOn: '2026-12-18', why: '' }).expect(422);
    expect(body.errors).toEqual([{ field: 'why', message: 'Say why the day is moved.' }]);
    for (const role of ['maker', 'bookkeeper'] as const)
      await ready.shop
        .as(role)
        .post(`/api/orders/${order.id}/promises`)
        .set('If-Match', '"1"')
        .send({ promisedOn: '2026-12-18', why: 'x' })
        .expect(403);
  });

  it('is over once the order is shipped or cancelled', async () => {
    const { id, job } = await takenOn(ready);
    await owner().post(`/api/jobs/${job.id}/finish`).send({ good: 50 }).expect(201);
    const shipped = await owner()
      .post(`/api/orders/${id}/shipments`)
      .send({ shippedOn: '2026-12-01' })
      .expect(201);
    const late = await move(shipped.body as Order, { promisedOn: '2026-12-18' }).expect(409);
    expect(late.body).toMatchObject({
      detail: 'O-0001 is shipped, so its promised day stays as it is.',
      allowed: ['invoice it'],
    });
    await owner().get(`/api/orders/${id}/promises?by=2026-12-18`).expect(409);
  });

  it('tells the customer by mail and on their link, and nobody why', async () => {
    const { token, quote } = await sendByHand(ready, await draftQuote(ready));
    await owner()
      .post(`/api/quotes/${quote.id}/agreements`)
      .send({ quantity: 50, how: 'phone' })
      .expect(200);
    const link = async () =>
      (await ready.shop.nobody().get(`/api/links/${token}`).expect(200)).body;
    expect((await link()).order).toBeNull();
    const order = (
      await owner()
        .post('/api/orders')
        .send({ quoteId: quote.id, promisedOn: '2026-12-16' })
        .expect(201)
    ).body as Order;
    await move(order, {
      promisedOn: '2026-12-18',
      tellCustomer: true,
      word: 'We are sorry.',
    }).expect(201);
    expect(await link()).toMatchObject({
      order: { number: 'O-0001', promisedOn: '2026-12-18', shippedOn: null, cancelledOn: null },
    });
    const [mail] = await ready.shop.context.orm.em
      .fork()
      .find(OutgoingMail, { subjectKind: 'order' });
    expect(mail).toMatchObject({
      recipient: 'bar@example.com',
      subject: 'A Test Shop: order O-0001 comes later',
    });
    expect(mail?.body).toContain(
      'your order O-0001, 50 of Coasters with a bramble, will be packed by Fri 18 Dec 2026 now, later than Wed 16 Dec 2026 as we had promised.\n\nWe are sorry.',
    );
    expect(JSON.stringify([mail, await link()])).not.toContain('The hide came late');
    const { seen } = (await owner().get(`/api/orders/${order.id}/cancellation`)).body;
    await owner()
      .post(`/api/orders/${order.id}/cancellation`)
      .send({ why: 'Called off', seen })
      .expect(201);
    expect(await link()).toMatchObject({ order: { cancelledOn: '2026-12-01' } });
  });
});
