import { addDays } from '@hidewright/domain';
import fc from 'fast-check';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type { Job, StockCount, StockReservation } from '@hidewright/contract';
import { readyForTheBench, takenOn, type BenchShop } from '../../testing/bench-shop.ts';
import {
  faultsOf,
  readStand,
  shortFaults,
  unloggedChanges,
  type StockStand,
} from '../../testing/stock-invariants.ts';
import { startTestShop } from '../../testing/test-shop.ts';
import { dayIn, dayOver } from '../../day-in.ts';
import { readOwedToJobs } from '../../flows/check/owed-to-jobs.ts';
import { Workshop } from '../workshop/workshop.entity.ts';
import { readStandingsAt } from './read-standings-at.ts';
import { readStandings } from './read-standings.ts';
import type { Standings } from './standings.ts';

const sequences = process.env['DRILL_SIZE'] === 'full' ? 1000 : 150;

let ready: BenchShop;
let supplierId: number;
const jobIds: number[] = [];
const lotIds: number[] = [];
const orderIds: number[] = [];
/** Orders that have a lot worked on. */
const workIds: number[] = [];
/** Things of which an honest count said that less is there than is held, until enough is there again. */
const broken = new Set<string>();
const names = { owner: 'The owner', maker: 'The maker' };

/** A new shop now and then: the books of a long life take longer to be held against it after every step. */
const sequencesPerShop = 15;

async function openShop(): Promise<void> {
  ready = await readyForTheBench(await startTestShop());
  for (const kept of [jobIds, lotIds, orderIds, workIds]) kept.length = 0;
  broken.clear();
  days.clear();
  supplierId = ((await send('owner', '/suppliers', { name: 'Oldbeck Tannery' })) as { id: number })
    .id;
  lotIds.push(ready.lotId);
  for (let at = 0; at < 3; at += 1) {
    const { job } = await takenOn(ready, 50, { evenIfShort: true });
    jobIds.push(job.id);
  }
}

beforeAll(openShop);
afterAll(() => ready.shop.close());

type Role = 'owner' | 'maker';
const footage = 92_903.04;
const ft2 = (quarters: number) => ((quarters * footage) / 4).toFixed(2);
const pick = <T>(from: readonly T[], at: number): T => from[at % from.length] as T;

/** The reply of what went well; undefined where it was refused, which is an answer as well. */
async function send(
  role: Role,
  path: string,
  body: object,
  headers: Record<string, string> = {},
): Promise<object | undefined> {
  const reply = await ready.shop.as(role).post(`/api${path}`).set(headers).send(body);
  if (reply.status >= 500) throw new Error(`${path}: ${reply.status} ${reply.text}`);
  return reply.status < 300 ? (reply.body as object) : undefined;
}

function noteBroken(reservations: readonly StockReservation[]): void {
  for (const { lotId, hardwareId } of reservations)
    broken.add(lotId === null ? `hardware ${hardwareId}` : `lot ${lotId}`);
}

interface Command {
  verb: keyof typeof commands;
  a: number;
  b: number;
  /** Quarter feet of leather, or tens of rivets. */
  much: number;
}

/** A lot where `b` is even, else the rivets. */
const amount = ({ b, much }: Command) =>
  b % 2 === 0
    ? { lotId: pick(lotIds, b >> 1), areaMm2: ft2(much) }
    : { hardwareId: ready.hardwareId, quantity: much * 10 };

const commands = {
  receive: async ({ b, much }: Command): Promise<Role> => {
    const form = { leatherId: ready.leatherId, form: 'panel', measuredAreaMm2: ft2(much) };
    const what =
      b % 2 === 0
        ? { lots: [form] }
        : { hardware: [{ hardwareId: ready.hardwareId, quantity: much * 10 }] };
    const reply = (await send('maker', '/receipts', what)) as
      { lots: { id: number }[] } | undefined;
    lotIds.push(...(reply?.lots ?? []).map(({ id }) => id));
    return 'maker';
  },
  order: async ({ much }: Command): Promise<Role> => {
    const line = {
      ...{ of: 'hardware', hardwareId: ready.hardwareId },
      ...{ quantity: much * 10, unitPrice: '0.17' },
    };
    const reply = await send('owner', '/purchase-orders', { supplierId, lines: [line] });
    if (reply !== undefined) orderIds.push((reply as { id: number }).id);
    return 'owner';
  },
  sendOrder: async ({ a }: Command): Promise<Role> => {
    const id = pick(orderIds, a);
    if (id !== undefined) await send('owner', `/purchase-orders/${id}/sendings`, { by: 'hand' });
    return 'owner';
  },
  receiveOnOrder: async ({ a, much }: Command): Promise<Role> => {
    const purchaseOrderId = pick(orderIds, a);
    if (purchaseOrderId === undefined) return 'maker';
    const order = (await ready.shop.as('maker').get(`/api/purchase-orders/${purchaseOrderId}`))
      .body as { lines: { id: number }[] };
    const purchaseLineId = order.lines[0]?.id;
    const hardware = [{ hardwareId: ready.hardwareId, purchaseLineId, quantity: much * 5 }];
    await send('maker', '/receipts', { purchaseOrderId, hardware, nothingMore: much % 3 === 0 });
    return 'maker';
  },
  sendOut: async ({ a, b, much }: Command): Promise<Role> => {
    const line = {
      ...{ of: 'service', service: 'dyeing', lotId: pick(lotIds, b) },
      ...{ becomesLeatherId: ready.leatherId, fixedPrice: '12.37' },
      ...(a % 2 === 0 && { areaMm2: ft2(much) }),
    };
    const reply = await send('owner', '/purchase-orders', { supplierId, lines: [line] });
    const id = (reply as { id: number } | undefined)?.id;
    if (id === undefined) return 'owner';
    workIds.push(id);
    await send('owner', `/purchase-orders/${id}/sendings`, { by: 'hand' });
    return 'owner';
  },
  comeBack: async ({ a, b, much }: Command): Promise<Role> => {
    const purchaseOrderId = pick(workIds, a);
    if (purchaseOrderId === undefined) return 'maker';
    const order = (await ready.shop.as('maker').get(`/api/purchase-orders/${purchaseOrderId}`))
      .body as { lines: { id: number }[] };
    const lot = {
      ...{ leatherId: ready.leatherId, purchaseLineId: order.lines[0]?.id },
      ...{ form: 'side', measuredAreaMm2: ft2(much) },
    };
    const lots = b % 2 === 0 ? [lot] : [lot, { ...lot, measuredAreaMm2: ft2(much + 1) }];
    const reply = (await send('maker', '/receipts', { purchaseOrderId, lots })) as
      { lots: { id: number }[] } | undefined;
    lotIds.push(...(reply?.lots ?? []).map(({ id }) => id));
    return 'maker';
  },
  callOff: async ({ a }: Command): Promise<Role> => {
    const id = pick(workIds, a);
    const body = { reason: 'too dear' };
    if (id !== undefined) await send('owner', `/purchase-orders/${id}/cancellations`, body);
    return 'owner';
  },
  sendBack: async ({ a, much }: Command): Promise<Role> => {
    const id = pick(orderIds, a);
    const body = { of: 'hardware', hardwareId: ready.hardwareId, quantity: much, reason: 'bent' };
    if (id !== undefined) await send('owner', `/purchase-orders/${id}/returns`, body);
    return 'owner';
  },
  hold: async (command: Command): Promise<Role> => {
    await send('maker', `/jobs/${pick(jobIds, command.a)}/reservations`, amount(command));
    return 'maker';
  },
  letGo: async ({ a, b }: Command): Promise<Role> => {
    const item = b % 2 === 0 ? { lotId: pick(lotIds, b >> 1) } : { hardwareId: ready.hardwareId };
    await send('maker', `/jobs/${pick(jobIds, a)}/releases`, item);
    return 'maker';
  },
  take: async (command: Command): Promise<Role> => {
    await send('maker', `/jobs/${pick(jobIds, command.a)}/takings`, amount(command));
    return 'maker';
  },
  bringBack: async (command: Command): Promise<Role> => {
    await send('maker', `/jobs/${pick(jobIds, command.a)}/returns`, amount(command));
    return 'maker';
  },
  cancel: async ({ a, b }: Command): Promise<Role> => {
    // Seldom, or there would be little left to do.
    if (b % 4 > 0) return 'owner';
    const job = (await ready.shop.as('maker').get(`/api/jobs/${pick(jobIds, a)}`)).body as Job;
    const path = `/orders/${job.orderId}/cancellation`;
    const { seen } = (await ready.shop.as('owner').get(`/api${path}`)).body as { seen: string };
    await send('owner', path, { why: 'not wanted', seen });
    return 'owner';
  },
  adjust: async ({ b, much }: Command): Promise<Role> => {
    const set =
      b % 2 === 0
        ? { of: 'lot', lotId: pick(lotIds, b >> 1), areaMm2: ft2(much) }
        : { of: 'hardware', hardwareId: ready.hardwareId, counted: much * 10 };
    const reply = await send('maker', '/adjustments', { ...set, reason: 'looked' });
    noteBroken((reply as { broken: StockReservation[] } | undefined)?.broken ?? []);
    return 'maker';
  },
  openCount: async (): Promise<Role> => {
    await send('maker', '/counts', { of: 'hardware' });
    return 'maker';
  },
  count: async ({ much }: Command): Promise<Role> => {
    const sheet = await openSheet('open');
    const line = sheet?.lines[0];
    if (sheet && line) {
      const path = `/api/counts/${sheet.id}/lines/${line.id}`;
      const reply = await ready.shop
        .as('maker')
        .put(path)
        .send({ quantity: much * 10 });
      expect(reply.status).toBeLessThan(500);
    }
    return 'maker';
  },
  handIn: async (): Promise<Role> => {
    const sheet = await openSheet('open');
    if (sheet) await send('maker', `/counts/${sheet.id}/handing-in`, { leaveUncounted: true });
    return 'maker';
  },
  approve: async (): Promise<Role> => {
    const sheet = await openSheet('handed in');
    if (sheet) {
      const asRead = { 'If-Match': `"${sheet.version}"` };
      const approved = await send('owner', `/counts/${sheet.id}/approval`, {}, asRead);
      if (approved !== undefined) noteBroken(sheet.broken ?? []);
    }
    return 'owner';
  },
  finish: async ({ a, much }: Command): Promise<Role> => {
    const at = a % jobIds.length;
    const { status } = await ready.shop
      .as('maker')
      .post(`/api/jobs/${jobIds[at]}/finish`)
      .send({ good: 20 + much });
    expect(status).toBeLessThan(500);
    return 'maker';
  },
  takeOn: async ({ a }: Command): Promise<Role> => {
    const at = a % jobIds.length;
    const job = (await ready.shop.as('maker').get(`/api/jobs/${jobIds[at]}`)).body as Job;
    // A place at the bench is given out again once its job is over.
    if (job.state === 'finished' || job.orderState === 'cancelled')
      jobIds[at] = (await takenOn(ready, 50, { evenIfShort: true })).job.id;
    return 'owner';
  },
};

async function openSheet(state: StockCount['state']): Promise<StockCount | undefined> {
  const list = await ready.shop.as('owner').get('/api/counts').expect(200);
  const card = (list.body as { items: StockCount[] }).items.find((each) => each.state === state);
  if (card === undefined) return undefined;
  return (await ready.shop.as('owner').get(`/api/counts/${card.id}`).expect(200))
    .body as StockCount;
}

const command = fc.record({
  verb: fc.constantFrom(...(Object.keys(commands) as (keyof typeof commands)[])),
  a: fc.nat(11),
  b: fc.nat(40),
  much: fc.integer({ min: 0, max: 30 }),
});

/** What was held, free, on order and promised at the end of each day so far. */
const days = new Map<string, unknown>();

/** Goes on to the next day. How things stood is told of every day before as it was told on that day. */
async function endTheDay(): Promise<void> {
  const em = ready.shop.context.orm.em.fork();
  const timeZone = (await em.findOneOrFail(Workshop, 1)).timeZone;
  const told = ({ ofLeather, ofHardware }: Standings) => ({
    leather: ofLeather(ready.leatherId),
    hardware: ofHardware(ready.hardwareId),
  });
  const on = dayIn(timeZone, ready.shop.clock.now());
  days.set(on, told(await readStandings(em, await readOwedToJobs(em))));
  ready.shop.clock.set(new Date(`${addDays(on, 1)}T09:00:00.000Z`));
  // Nobody has to sign in anew for it.
  await em.execute(`UPDATE web_session SET expires_at = '2027-12-01', created_at = ?`, [
    ready.shop.clock.now().toISOString(),
  ]);
  for (const [day, stood] of days) {
    const then = dayOver(timeZone, day);
    const owed = await readOwedToJobs(em, then);
    expect(told(await readStandingsAt(em, then, owed)), day).toEqual(stood);
  }
}

async function step(each: Command, before: StockStand): Promise<StockStand> {
  const em = ready.shop.context.orm.em.fork();
  const role = await commands[each.verb](each);
  const after = await readStand(em);
  // takeOn goes through several requests of its own, and each of them changes something else.
  const unlogged = await unloggedChanges(em, before, after, names[role]);
  const short = await shortFaults(em, broken, before);
  const faults = [...(await faultsOf(em)), ...short, ...unlogged];
  expect(faults, JSON.stringify(each)).toEqual([]);
  return after;
}

describe('whatever is done in the stockroom, in whatever order', () => {
  it('[I1] [I2] [I8] [I9] holds after every step', { timeout: 3_600_000 }, async () => {
    const sequence = fc.array(command, { minLength: 30, maxLength: 30 });
    let played = 0;
    await fc.assert(
      fc.asyncProperty(sequence, async (all) => {
        if (played > 0 && played % sequencesPerShop === 0) {
          await ready.shop.close();
          await openShop();
        }
        played += 1;
        let stand = await readStand(ready.shop.context.orm.em.fork());
        for (const each of all) stand = await step(each, stand);
        await endTheDay();
      }),
      { numRuns: sequences, endOnFailure: true },
    );
  });
});
