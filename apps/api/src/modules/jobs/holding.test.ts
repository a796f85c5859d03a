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
