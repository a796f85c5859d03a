import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type { Job } from '@hidewright/contract';
import { readyForTheBench, takenOn, ticketOf, type BenchShop } from '../../testing/bench-shop.ts';
import { startTestShop } from '../../testing/test-shop.ts';

let ready: BenchShop;
let ticket: Job;
beforeAll(async () => {
  ready = await readyForTheBench(await startTestShop());
  ticket = await ticketOf(ready, await takenOn(ready));
});
afterAll(() => ready.shop.close());

const post = (what: string, body: object) =>
  ready.shop.as('maker').post(`/api/jobs/${ticket.id}/${what}`).send(body);
const lot = () => ticket.lots.find(({ lotId }) => lotId === ready.lotId);

describe('stock held for a job by hand', () => {
  it('is held on top of what is held, and nobody else can have it', async () => {
    const before = { held: Number(lot()?.heldAreaMm2), free: Number(lot()?.freeAreaMm2) };
    const asked = { lotId: ready.lotId, areaMm2: '92903.04' };
    ticket = (await post('reservations', asked).expect(201)).body as Job;
    expect(Number(lot()?.heldAreaMm2)).toBeCloseTo(before.held + 92_903.04, 3);
    expect(Number(lot()?.freeAreaMm2)).toBeCloseTo(before.free - 92_903.04, 3);
  });

  it('is refused beyond what is free, with how much that is', async () => {
    const reply = await post('reservations', { hardwareId: ready.hardwareId, quantity: 201 });
    expect(reply.status).toBe(409);
    expect(reply.body.detail).toContain('There is 200 of Rivet 9 mm to be had');
    expect(reply.body.allowed).toEqual(['up to 200']);
    await post('reservations', { lotId: 999, areaMm2: '100' }).expect(404);
    await post('reservations', { lotId: ready.lotId, areaMm2: '0' }).expect(422);
  });

  it('is the parts of a kit, never the kit, and so is what is taken', async () => {
    const parts = [{ hardwareId: ready.hardwareId, quantity: 2 }];
    const kit = { kind: 'hardware', name: 'Rivet pair', unitPrice: '0.34', parts };
    const { body } = await ready.shop.as('owner').post('/api/hardware').send(kit).expect(201);
    for (const what of ['reservations', 'takings']) {
      const refused = await post(what, { hardwareId: body.id, quantity: 1 }).expect(422);
      expect(refused.body.errors[0].message).toBe(
        'Rivet pair is a kit and is counted by its parts: enter Rivet 9 mm instead.',
      );
    }
  });

  it('is let go of, once', async () => {
    const body = { lotId: ready.lotId };
    ticket = (await post('releases', body).expect(201)).body as Job;
    expect(lot()?.heldAreaMm2).toBe('0');
    const again = await post('releases', body);
    expect(again.status).toBe(409);
    expect(again.body.detail).toContain(`Nothing of lot OT-118 is held for ${ticket.number}`);
  });

  it('is nobody’s business once the job is finished', async () => {
    await post('finish', { good: 50 }).expect(201);
    await post('reservations', { hardwareId: ready.hardwareId, quantity: 1 }).expect(409);
  });
});

describe('leather that would mix in one order', () => {
  it('is warned of on the ticket, names the shades, and may be held all the same', async () => {
    const owner = ready.shop.as('owner');
    const side = { leatherId: ready.leatherId, form: 'side', measuredAreaMm2: '900000' };
    const lots = [
      { ...side, tag: 'OT-200', shade: 'dark tan' },
      { ...side, tag: 'OT-201', shade: 'mid tan' },
      { ...side, tag: 'OT-202' },
    ].map((lot) => ({ ...lot, cost: '90.00' }));
    const hardware = [{ hardwareId: ready.hardwareId, quantity: 300, cost: '51.00' }];
    await owner.post('/api/receipts').send({ lots, hardware }).expect(201);
    const order = await takenOn(ready);
    ticket = await ticketOf(ready, order);
    for (const { lotId, heldAreaMm2 } of ticket.lots)
      if (heldAreaMm2 !== '0') await post('releases', { lotId }).expect(201);
    ticket = await ticketOf(ready, order);
    expect(ticket.lots.map(({ mix }) => mix)).toEqual(ticket.lots.map(() => null));

    const named = (tag: string) => ticket.lots.find((each) => each.tag === tag);
    const hold = async (tag: string) => {
      const body = { lotId: named(tag)?.lotId, areaMm2: '1000' };
      ticket = (await post('reservations', body).expect(201)).body as Job;
    };
    await hold('OT-200');
    expect(named('OT-200')?.mix).toBeNull();
    expect(named('OT-201')?.mix?.of).toBe('shades');
    expect(named('OT-201')?.mix?.sentence).toContain(
      'OT-201 is mid tan, and this order has OT-200 (dark tan)',
    );
    expect(named('OT-202')?.mix?.of).toBe('lots');
    await hold('OT-201');
    expect(named('OT-200')?.mix?.of).toBe('shades');
  });
});
