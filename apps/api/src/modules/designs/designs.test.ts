import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type { Learned, Pattern, Quote, RunBasis } from '@hidewright/contract';
import { readyForTheBench, type BenchShop } from '../../testing/bench-shop.ts';
import { draftQuote } from '../../testing/example-quote.ts';
import { finishedRun } from '../../testing/finished-run.ts';
import { startTestShop } from '../../testing/test-shop.ts';

let ready: BenchShop;
const as = (role: 'owner' | 'maker') => ready.shop.as(role);
const at = () => `/api/patterns/${ready.patternId}`;
const learned = async (query = '') =>
  (await as('owner').get(`${at()}/learned${query}`).expect(200)).body as Learned;
const basis = async (query = '') =>
  (await as('owner').get(`${at()}/run-basis${query}`).expect(200)).body as RunBasis;
const take = async (body: object) => {
  const { version } = (await as('owner').get(at()).expect(200)).body as Pattern;
  return as('owner').post(`${at()}/learned`).set('If-Match', `"${version}"`).send(body);
};
const theirs = () => `?customerId=${ready.customer.id}`;

beforeAll(async () => {
  ready = await readyForTheBench(await startTestShop());
  const logs = {
    'Case panels': { good: 7, minutes: '15' },
    Stamp: { good: 52, rejects: 4, minutes: '19' },
    Cut: { good: 50, rejects: 2, minutes: '10' },
    'Fold and rivet': { good: 50, minutes: '50' },
  };
  // A tenth more leather than the layout says, and 120 rivets for 100 that were fitted.
  await finishedRun(ready, logs, { good: 50 }, ({ neededAreaMm2 }) => [
    { lotId: ready.lotId, areaMm2: (Number(neededAreaMm2) * 1.1).toFixed(2) },
    { hardwareId: ready.hardwareId, quantity: 120 },
  ]);
});
afterAll(() => ready.shop.close());

describe('what one customer’s runs say', () => {
  it('is asked for by customer, with leather and hardware beside minutes and rejects', async () => {
    const found = await learned(theirs());
    expect(found).toMatchObject({
      customerId: ready.customer.id,
      customers: [{ id: ready.customer.id, name: 'Brambling Brewery', runs: 1 }],
      design: null,
      leather: { saidExtraPercent: '0', extra: { extraPercent: '10', runs: 1 } },
      hardware: [{ losses: { percent: '16.67', taken: 120, needed: 100, runs: 1 } }],
    });
    expect((await learned('?customerId=999')).runs).toEqual([]);
  });

  it('is what their next quotes go by, and nobody else’s', async () => {
    const steps = [2, 3].map((step) => ({ what: 'rejects', step }));
    const reply = await take({
      customerId: ready.customer.id,
      take: [
        ...steps,
        { what: 'minutes', step: 2 },
        { what: 'leather', step: null },
        { what: 'hardware', step: null, hardwareId: ready.hardwareId },
      ],
    });
    expect(reply.status).toBe(200);
    expect((reply.body as Learned).design).toMatchObject({
      customerName: 'Brambling Brewery',
      patternName: 'Round coaster',
      runs: 1,
    });
    const own = await basis(theirs());
    const { input } = own;
    expect(own.design?.customerId).toBe(ready.customer.id);
    expect(input.leather.extraPercent).toBe('10');
    expect(input.hardware[0]?.lossPercent).toBe('16.67');
    expect(input.work.kind === 'steps' && input.work.steps[1]).toMatchObject({
      secondsPerUnit: '15',
      rejectPercent: '7.14',
    });
    const others = await basis();
    expect(others.design).toBeNull();
    expect(others.input.leather.extraPercent).toBeUndefined();

    const quote: Quote = await draftQuote(ready);
    const [line] = quote.numbers?.breaks[0]?.costLines ?? [];
    expect(line?.workings).toContain('and 10 % more');
    const { versionNumber } = (await as('owner').get(at()).expect(200)).body as Pattern;
    expect(versionNumber).toBe(1);
  });

  it('is listed, and let go of', async () => {
    const list = await as('maker').get(`/api/designs${theirs()}`).expect(200);
    const [design] = (list.body as { items: { id: number }[] }).items;
    await as('maker').delete(`/api/designs/${design?.id}`).expect(403);
    await as('owner').delete(`/api/designs/${design?.id}`).expect(200);
    await as('owner').delete(`/api/designs/${design?.id}`).expect(404);
    expect((await basis(theirs())).design).toBeNull();
  });

  it('goes into the pattern as well, for everybody', async () => {
    const reply = await take({
      take: [
        { what: 'leather', step: null },
        { what: 'hardware', step: null, hardwareId: ready.hardwareId },
      ],
    });
    expect(reply.status).toBe(200);
    const { definition } = (await as('owner').get(at()).expect(200)).body as Pattern;
    expect(definition.leatherExtraPercent).toBe('10');
    expect(definition.hardware[0]?.lossPercent).toBe('16.67');
    expect((await learned()).leather).toMatchObject({ saidExtraPercent: '10' });
    const unknown = await take({ take: [{ what: 'hardware', step: null, hardwareId: 999 }] });
    expect(unknown.status).toBe(422);
  });
});
