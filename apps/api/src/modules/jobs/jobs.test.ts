import { afterAll, afterEach, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import type { BenchHours, Job, JobComparison, Order } from '@hidewright/contract';
import {
  readyForTheBench,
  setBenchHours,
  takenOn,
  ticketOf,
  type BenchShop,
} from '../../testing/bench-shop.ts';
import { startTestShop } from '../../testing/test-shop.ts';

let ready: BenchShop;
let order: Order;
let ticket: Job;

async function openShop(): Promise<void> {
  ready = await readyForTheBench(await startTestShop());
}

async function newTicket(): Promise<void> {
  order = await takenOn(ready, 50, { evenIfShort: true });
  ticket = await ticketOf(ready, order);
}

/** One shop for a group of tests, each of which has a ticket of its own. */
function inOneShop(): void {
  beforeAll(openShop);
  beforeEach(newTicket);
  afterAll(() => ready.shop.close());
}

/** For tests of what is counted over the whole shop. */
function inFreshShop(): void {
  beforeEach(openShop);
  beforeEach(newTicket);
  afterEach(() => ready.shop.close());
}

const as = (role: 'owner' | 'maker' | 'bookkeeper') => ready.shop.as(role);
const post = (what: string, body: object = {}) =>
  as('maker').post(`/api/jobs/${ticket.id}/${what}`).send(body);
const stepId = (name: string) => ticket.steps.find((step) => step.name === name)?.id ?? 0;
const log = (name: string, counts: object) => post('logs', { stepId: stepId(name), ...counts });
const stepIn = (job: unknown, name: string) =>
  (job as Job).steps.find((step) => step.name === name);

describe('the ticket', () => {
  beforeAll(openShop);
  beforeAll(newTicket);
  afterAll(() => ready.shop.close());

  it('says which plate, die and lot, and how many of everything', () => {
    expect(ticket).toMatchObject({
      number: 'J-0001',
      state: 'ready',
      customerName: 'Brambling Brewery',
      quantity: 50,
      plate: { number: '41' },
      die: { number: '7', slot: 'C3' },
      lots: [{ tag: 'OT-118', place: 'rack 2' }],
    });
    expect(ticket.cutCount).toBeGreaterThan(50);
    expect(ticket.lots[0]?.heldAreaMm2).toBe(ticket.neededAreaMm2);
    expect(ticket.steps.map(({ name, limit }) => [name, limit])).toEqual([
      ['Case panels', ticket.containers],
      ['Stamp', ticket.cutCount],
      ['Cut', ticket.cutCount],
      ['Fold and rivet', ticket.cutCount],
    ]);
  });

  it('cautions at the press, in words that defer to the manual', () => {
    const cautions = ticket.steps.map(({ name, caution }) => [name, caution?.level ?? null]);
    expect(cautions).toEqual([
      ['Case panels', null],
      ['Stamp', 'WARNING'],
      ['Cut', 'WARNING'],
      ['Fold and rivet', 'CAUTION'],
    ]);
    expect(stepIn(ticket, 'Stamp')?.caution?.text).toMatch(/maker’s manual/);
  });

  it('carries no money and no way to reach the customer to the maker', () => {
    expect(JSON.stringify(ticket)).not.toMatch(
      /price|cost|total|value|example\.com|Maltings|555|estimate/i,
    );
  });

  it('is for owner and maker', async () => {
    await as('bookkeeper').get(`/api/jobs/${ticket.id}`).expect(403);
    await as('bookkeeper').post(`/api/jobs/${ticket.id}/logs`).send({ stepId: 1 }).expect(403);
    await as('owner').get(`/api/jobs/${ticket.id}`).expect(200);
    await as('owner').get('/api/jobs/999').expect(404);
  });
});

describe('logging', () => {
  inOneShop();

  it('adds up on the step, and brings job and order into work', async () => {
    const first = await log('Stamp', { good: 20, rejects: 1, minutes: '12.5' }).expect(201);
    expect(first.body).toMatchObject({
      state: 'at the bench',
      orderState: 'in work',
      loggedMinutes: '12.5',
    });
    const second = await log('Stamp', {
      good: 5,
      seconds: 2,
      minutes: '3',
      note: 'after tea',
    }).expect(201);
    expect(stepIn(second.body, 'Stamp')).toMatchObject({
      good: 25,
      rejects: 1,
      seconds: 2,
      minutes: '15.5',
    });
    expect(stepIn(second.body, 'Cut')?.limit).toBe(ticket.cutCount - 1);
    expect((second.body as Job).logs).toMatchObject([
      { stepName: 'Stamp', good: 5, seconds: 2, note: 'after tea', personName: 'The maker' },
      { stepName: 'Stamp', good: 20, rejects: 1 },
    ]);
  });

  it('corrects by a further row, and never below nothing', async () => {
    await log('Stamp', { good: 20, rejects: 3, minutes: '10' }).expect(201);
    const corrected = await log('Stamp', { good: -2, rejects: -1, minutes: '-4' }).expect(201);
    expect(stepIn(corrected.body, 'Stamp')).toMatchObject({ good: 18, rejects: 2, minutes: '6' });
    expect((corrected.body as Job).logs).toHaveLength(2);
    const refused = await log('Stamp', { good: -19 }).expect(422);
    expect(refused.body.errors).toEqual([
      { field: 'good', message: 'Only 18 good are logged on Stamp. Take back at most that many.' },
    ]);
    await log('Stamp', { minutes: '-7' }).expect(422);
  });

  it('refuses more than the cut count, with a sentence', async () => {
    await log('Cut', { good: ticket.cutCount - 1 }).expect(201);
    const refused = await log('Cut', { good: 2 }).expect(422);
    expect(refused.body.errors).toEqual([
      {
        field: 'good',
        message: `Cut has ${ticket.cutCount} pieces to work on, and ${ticket.cutCount - 1} are logged: 2 more cannot be. Log at most 1.`,
      },
    ]);
    await log('Case panels', { good: ticket.containers + 1 }).expect(422);
  });

  it('refuses more rejects than pieces, and rejects that leave too few for what is logged after them', async () => {
    const refused = await log('Stamp', { rejects: ticket.cutCount + 1 }).expect(422);
    expect(refused.body.errors[0].field).toBe('rejects');
    await log('Cut', { good: ticket.cutCount }).expect(201);
    const starving = await log('Stamp', { rejects: 1 }).expect(422);
    expect(starving.body.detail).toContain('Correct Cut first.');
  });

  it('refuses what makes no sense', async () => {
    await log('Stamp', {}).expect(422);
    await log('Stamp', { good: 1.5 }).expect(422);
    await log('Stamp', { minutes: 'NaN' }).expect(422);
    await log('Stamp', { minutes: '1e3' }).expect(422);
    await log('Stamp', { good: 1, bonus: 3 }).expect(422);
    const foreign = await post('logs', { stepId: 9_999, good: 1 }).expect(422);
    expect(foreign.body.errors[0].field).toBe('stepId');
  });

  it('counts once what a lost connection sends again', async () => {
    const send = () => log('Stamp', { good: 13, minutes: '4' }).set('Idempotency-Key', 'tap-0001');
    await send().expect(201);
    const again = await send().expect(201);
    expect(again.get('Idempotent-Replayed')).toBe('true');
    const now = await ticketOf(ready, order);
    expect(stepIn(now, 'Stamp')).toMatchObject({ good: 13, minutes: '4' });
    expect(now.logs).toHaveLength(1);
    await log('Stamp', { good: 14, minutes: '4' }).set('Idempotency-Key', 'tap-0001').expect(422);
  });

  it('loses no count when two log at once', async () => {
    await Promise.all(
      Array.from({ length: 8 }, () => log('Stamp', { good: 2, minutes: '1' }).expect(201)),
    );
    expect(stepIn(await ticketOf(ready, order), 'Stamp')).toMatchObject({ good: 16, minutes: '8' });
  });
});

describe('the states of a job', () => {
  inOneShop();

  it('is not worked while its order waits', async () => {
    const waiting = await takenOn(ready, 50, { awaits: ['proof'], evenIfShort: true });
    const reply = await as('maker')
      .post(`/api/jobs/${waiting.job.id}/logs`)
      .send({ stepId: 1, good: 1 })
      .expect(409);
    expect(reply.body).toMatchObject({ allowed: ['note what has arrived'] });
    await as('maker').post(`/api/jobs/${waiting.job.id}/finish`).send({ good: 50 }).expect(409);
  });

  it('pauses and goes on', async () => {
    expect((await post('pauses').expect(409)).body.allowed).toEqual(['take', 'log', 'finish']);
    await log('Stamp', { good: 1 }).expect(201);
    expect((await post('pauses').expect(201)).body).toMatchObject({ state: 'paused' });
    const refused = await log('Stamp', { good: 1 }).expect(409);
    expect(refused.body).toMatchObject({
      detail: `${ticket.number} is paused. Resume it first.`,
      allowed: ['resume'],
    });
    expect((await post('resumptions').expect(201)).body).toMatchObject({ state: 'at the bench' });
    await post('resumptions').expect(409);
  });
});

describe('taking', () => {
  inFreshShop();

  it('takes held leather and hardware, and what is free beyond', async () => {
    const held = ticket.lots[0]?.heldAreaMm2 ?? '';
    const taken = await post('takings', { lotId: ready.lotId, areaMm2: held }).expect(201);
    expect((taken.body as Job).lots[0]).toMatchObject({ heldAreaMm2: '0', takenAreaMm2: held });
    const more = await post('takings', { hardwareId: ready.hardwareId, quantity: 120 }).expect(201);
    expect((more.body as Job).hardware).toMatchObject([
      { needed: 100, held: 0, taken: 120, free: 180 },
    ]);
  });

  it('takes once what two take who saw the same held', async () => {
    const held = ticket.lots[0]?.heldAreaMm2 ?? '';
    const leather = { lotId: ready.lotId, areaMm2: held, heldSeenAreaMm2: held };
    const replies = await Promise.all([post('takings', leather), post('takings', leather)]);
    expect(replies.map(({ status }) => status).sort()).toEqual([201, 409]);
    const refused = replies.find(({ status }) => status === 409);
    expect(refused?.body.detail).toMatch(
      /^Nothing of lot OT-118 is held for J-0001 any more: it was taken already, or let go of\./,
    );
    expect((await ticketOf(ready, order)).lots[0]).toMatchObject({ takenAreaMm2: held });
    const { hardwareId } = ready;
    await post('reservations', { hardwareId, quantity: 5 }).expect(201);
    const fewer = { hardwareId, quantity: 100, heldSeenQuantity: 100 };
    expect((await post('takings', fewer).expect(409)).body).toMatchObject({
      detail:
        '105 of Rivet 9 mm is held for J-0001 now, not 100 as before. Nothing is taken now. Look at the ticket, then take it again.',
      allowed: ['take 105'],
    });
    await post('takings', { hardwareId, quantity: 105, heldSeenQuantity: 105 }).expect(201);
    await post('takings', { hardwareId, quantity: 100, heldSeenQuantity: 105 }).expect(409);
    // Whoever types how many may take what is free beyond.
    const more = await post('takings', { hardwareId, quantity: 20 }).expect(201);
    expect((more.body as Job).hardware).toMatchObject([{ held: 0, taken: 125 }]);
    await post('takings', { hardwareId, quantity: 20, heldSeenQuantity: -1 }).expect(422);
  });

  it('refuses more than there is, nothing, and another leather', async () => {
    await post('takings', { hardwareId: ready.hardwareId, quantity: 301 }).expect(409);
    await post('takings', { lotId: ready.lotId, areaMm2: '0' }).expect(422);
    await post('takings', { lotId: ready.lotId, areaMm2: '-5' }).expect(422);
    await post('takings', { lotId: 999, areaMm2: '5' }).expect(404);
    const bridle = await as('owner')
      .post('/api/leathers')
      .send({ name: 'Bridle 8 oz', pricePerFt2: '12' })
      .expect(201);
    const receipt = await as('owner')
      .post('/api/receipts')
      .send({
        lots: [{ leatherId: bridle.body.id, tag: 'BR-1', form: 'side', measuredAreaMm2: '900000' }],
      })
      .expect(201);
    const other = await post('takings', { lotId: receipt.body.lots[0].id, areaMm2: '5' }).expect(
      422,
    );
    expect(other.body.detail).toBe(
      'Lot BR-1 is another leather; J-0001 needs Oak tan 5–6 oz. Choose a lot of that.',
    );
  });
});

describe('finishing', () => {
  inFreshShop();

  async function work() {
    await post('takings', { lotId: ready.lotId, areaMm2: ticket.neededAreaMm2 }).expect(201);
    await post('takings', { hardwareId: ready.hardwareId, quantity: 60 }).expect(201);
    await log('Case panels', { good: ticket.containers, minutes: '9' }).expect(201);
    await log('Stamp', { good: ticket.cutCount - 3, rejects: 3, minutes: '20' }).expect(201);
    await log('Cut', { good: 50, rejects: 1, seconds: 1, minutes: '11' }).expect(201);
  }

  it('packs the order, lets go of what is held, and adds the strikes to die and plate', async () => {
    await work();
    const finished = await post('finish', {
      good: 50,
      seconds: 1,
      leatherLeft: [{ lotId: ready.lotId, areaMm2: '50000' }],
      hardwareLeft: [{ hardwareId: ready.hardwareId, quantity: 4 }],
    }).expect(201);
    expect(finished.body).toMatchObject({
      state: 'finished',
      orderState: 'packed',
      good: 50,
      seconds: 1,
    });
    expect((finished.body as Job).hardware[0]).toMatchObject({ held: 0, taken: 56, free: 244 });
    expect((await as('maker').get('/api/reservations')).body).toMatchObject({ items: [] });
    for (const id of [ready.dieId, ready.plateId]) {
      expect((await as('maker').get(`/api/tools/${id}`)).body).toMatchObject({
        used: ticket.cutCount,
      });
    }
    const refused = await log('Cut', { good: 1 }).expect(409);
    expect(refused.body.allowed).toEqual(['read estimate and fact']);
    await post('finish', { good: 50 }).expect(409);
  });

  it('refuses more pieces than can come out, and more left than was taken', async () => {
    await work();
    const most = ticket.cutCount - 4;
    const refused = await post('finish', { good: most + 1 }).expect(422);
    expect(refused.body.errors).toEqual([
      {
        field: 'good',
        message: `${ticket.cutCount} are cut and 4 are logged as rejects, so at most ${most} pieces can come out. Count again, or correct the rejects.`,
      },
    ]);
    await post('finish', { good: most, seconds: 1 }).expect(422);
    await post('finish', {
      good: 50,
      leatherLeft: [{ lotId: ready.lotId, areaMm2: '99999999' }],
    }).expect(409);
    expect((await ticketOf(ready, order)).state).toBe('at the bench');
  });

  it('sets fact beside estimate, with money for the owner alone', async () => {
    await as('owner').get(`/api/jobs/${ticket.id}/comparison`).expect(409);
    await work();
    await post('finish', {
      good: 50,
      seconds: 1,
      leatherLeft: [{ lotId: ready.lotId, areaMm2: '50000' }],
    }).expect(201);
    const compared = (await as('owner').get(`/api/jobs/${ticket.id}/comparison`).expect(200))
      .body as JobComparison;
    const row = (what: string) => compared.work.find((each) => each.what === what);
    expect(row('Bench minutes')).toMatchObject({ fact: '40' });
    expect(Number(row('Bench minutes')?.estimate)).toBeCloseTo(Number(ticket.plannedMinutes), 1);
    expect(row('Leather')?.fact).toBe(String(Number(ticket.neededAreaMm2) - 50_000));
    expect(row('Rejects')?.fact).toBe(String(Math.round((4 / ticket.cutCount) * 10_000) / 100));
    expect(row('Hardware')).toMatchObject({ estimate: '100', fact: '60' });
    const money = (what: string) => compared.money?.find((each) => each.what === what);
    // 60 rivets at 0.17; 40 minutes at 22 an hour.
    expect(money('Hardware')?.fact).toBe('10.20');
    expect(money('Bench wages')?.fact).toBe('14.67');
    const leather = (120 * (Number(ticket.neededAreaMm2) - 50_000)) / 1107102.96;
    expect(Number(money('Leather')?.fact)).toBeCloseTo(leather, 1);
    const left = Number(order.total) - Number(money('Leather')?.fact) - 10.2 - 48 - 6;
    expect(Number(money('Left after everything bought')?.fact)).toBeCloseTo(left, 2);
    expect(Number(money('Per bench hour')?.fact)).toBeCloseTo((left * 60) / 40, 1);
    expect(Number(money('Per hour all in')?.fact)).toBeCloseTo(
      ((left - (85 * 22) / 60) * 60) / 85,
      1,
    );
    const forMaker = await as('maker').get(`/api/jobs/${ticket.id}/comparison`).expect(200);
    expect(Object.keys(forMaker.body)).toEqual(['work']);
  });

  it('says what was not logged instead of calling it nothing', async () => {
    await post('finish', { good: 50 }).expect(201);
    const compared = (await as('owner').get(`/api/jobs/${ticket.id}/comparison`).expect(200))
      .body as JobComparison;
    const facts = Object.fromEntries(compared.work.map(({ what, fact }) => [what, fact]));
    expect(facts).toMatchObject({
      'Bench minutes': null,
      Leather: null,
      Hardware: null,
      'Good pieces': '50',
    });
    expect(compared.money?.find(({ what }) => what === 'Per bench hour')?.fact).toBeNull();
  });
});

describe('the calendar of bench hours', () => {
  inFreshShop();

  const hours = async (days = 14) =>
    (await as('maker').get(`/api/bench-hours?days=${days}`).expect(200)).body as BenchHours;

  it('lays open work over working days and gives back what is done', async () => {
    const before = await hours();
    expect(before.days).toHaveLength(14);
    expect(before.days[0]).toMatchObject({
      day: '2026-12-01',
      minutes: '360',
      planned: [{ number: 'J-0001', minutes: ticket.plannedMinutes }],
    });
    expect(before.days[4]).toMatchObject({ day: '2026-12-05', minutes: '0', planned: [] });
    expect(before.late).toEqual([]);
    await log('Stamp', { good: ticket.cutCount, minutes: '30' }).expect(201);
    const after = await hours();
    const stamp = Number(stepIn(ticket, 'Stamp')?.plannedMinutes);
    expect(Number(after.days[0]?.planned[0]?.minutes)).toBeCloseTo(
      Number(ticket.plannedMinutes) - stamp,
      1,
    );
    expect(after.days[0]).toMatchObject({ loggedMinutes: '30' });
  });

  it('names what cannot be packed in time', async () => {
    await setBenchHours(ready, '0.1');
    const { late } = await hours(1);
    // Twelve working days of six minutes until the 16th.
    const short = (Number(ticket.plannedMinutes) - 72).toFixed(2).replace(/\.?0+$/, '');
    expect(late).toMatchObject([
      { number: 'J-0001', promisedOn: '2026-12-16', minutesShort: short },
    ]);
  });

  it('is not for the bookkeeper', () => as('bookkeeper').get('/api/bench-hours').expect(403));
});

describe('the list of jobs', () => {
  inFreshShop();

  it('shows each step’s share and what comes next', async () => {
    await log('Case panels', { good: ticket.containers, minutes: '8' }).expect(201);
    const list = (await as('maker').get('/api/jobs?open=true').expect(200)).body as {
      items: object[];
    };
    expect(list.items).toMatchObject([
      {
        number: 'J-0001',
        state: 'at the bench',
        progress: [1, 0, 0, 0],
        step: 'Stamp',
        loggedMinutes: '8',
      },
    ]);
    expect(
      ((await as('maker').get('/api/jobs?state=finished')).body as { items: object[] }).items,
    ).toEqual([]);
    expect(
      ((await as('maker').get('/api/jobs?q=coasters')).body as { items: object[] }).items,
    ).toHaveLength(1);
  });
});
