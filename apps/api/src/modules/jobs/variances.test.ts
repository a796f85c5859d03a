import { Decimal } from 'decimal.js';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type {
  Job,
  JobComparison,
  JobVariances,
  Learned,
  Pattern,
  Person,
} from '@hidewright/contract';
import { readyForTheBench, takenOn, ticketOf, type BenchShop } from '../../testing/bench-shop.ts';
import { finishedRun } from '../../testing/finished-run.ts';
import { startTestShop } from '../../testing/test-shop.ts';

let ready: BenchShop;

beforeAll(async () => {
  ready = await readyForTheBench(await startTestShop());
});
afterAll(() => ready.shop.close());

const read = async <Reply>(job: Job, what: string, role: 'owner' | 'maker' = 'owner') =>
  (await ready.shop.as(role).get(`/api/jobs/${job.id}/${what}`).expect(200)).body as Reply;

const sumOf = (values: readonly (string | undefined)[]): string =>
  values.reduce((sum, value) => sum.plus(value ?? 0), new Decimal(0)).toFixed(2);

const logs = {
  'Case panels': { good: 7, minutes: '15' },
  Stamp: { good: 52, rejects: 4, minutes: '19' },
  Cut: { good: 50, rejects: 2, minutes: '10' },
  'Fold and rivet': { good: 50, minutes: '50' },
};

const takenRun = (): Promise<Job> =>
  finishedRun(ready, logs, { good: 50 }, ({ neededAreaMm2 }) => [
    { lotId: ready.lotId, areaMm2: neededAreaMm2 },
    { hardwareId: ready.hardwareId, quantity: 120 },
  ]);

describe('why a run cost other than was said', () => {
  let job: Job;
  beforeAll(async () => {
    job = await takenRun();
  });

  it('adds up to the differences of estimate and fact, to the cent', async () => {
    const found = await read<JobVariances>(job, 'variances');
    const { money } = await read<JobComparison>(job, 'comparison');
    const difference = (what: string) => {
      const row = money?.find((each) => each.what === what);
      return new Decimal(row?.fact ?? 0).minus(row?.estimate ?? 0).toFixed(2);
    };
    const bought = (kind: string) => found.bought?.find((each) => each.kind === kind);
    expect(bought('leather')?.sum).toBe(difference('Leather'));
    expect(bought('hardware')?.sum).toBe(difference('Hardware'));
    expect(found.wages?.sum).toBe(difference('Bench wages'));
    const parts = [
      ...found.steps.flatMap(({ money: each }) => [each?.time, each?.made, each?.wage]),
      found.wages?.other,
      ...(found.bought ?? []).flatMap(({ price, usage, made, other }) => [
        ...[price, usage, made, other],
      ]),
    ];
    expect(sumOf(parts)).toBe(found.sum);
    expect(found.sum).toBe(sumOf(['Leather', 'Hardware', 'Bench wages'].map(difference)));
  });

  it('tells slow steps, wasted hardware and a dearer lot apart', async () => {
    const { steps, bought } = await read<JobVariances>(job, 'variances');
    // 56 strikes at 12 s and 5 minutes of setup are 16.2 minutes; 19 were logged, at 22 an hour.
    expect(steps[1]).toMatchObject({
      name: 'Stamp',
      handled: 56,
      saidForMade: '16.2',
      wasMinutes: '19',
      money: { time: '1.03', wage: '0.00' },
    });
    // 20 rivets at 0.17 beyond the 100 that 50 pieces take.
    expect(bought?.find(({ kind }) => kind === 'hardware')).toMatchObject({
      usage: '3.40',
      price: '0.00',
      made: '0.00',
    });
    expect(Number(bought?.[0]?.price)).toBeGreaterThan(0);
  });

  it('tells the maker minutes, and no money', async () => {
    const found = await read<JobVariances>(job, 'variances', 'maker');
    expect(Object.keys(found)).toEqual(['steps']);
    expect(found.steps.map((step) => 'money' in step)).toEqual([false, false, false, false]);
  });
});

describe('a run of which little was logged', () => {
  it('has nothing to say of what was not', async () => {
    const job = await finishedRun(ready, {});
    const found = await read<JobVariances>(job, 'variances');
    expect(found).toMatchObject({ wages: null, bought: [], sum: '0.00' });
    expect(found.steps.every(({ wasMinutes }) => wasMinutes === null)).toBe(true);
  });

  it('waits until it is finished', async () => {
    const { id } = await ticketOf(ready, await takenOn(ready, 50, { evenIfShort: true }));
    await ready.shop.as('owner').get(`/api/jobs/${id}/variances`).expect(409);
  });
});

describe('an hour that was paid otherwise than the shop’s wage', () => {
  it('is told apart from slow work, and adds up', async () => {
    const paid = await readyForTheBench(await startTestShop());
    const owner = paid.shop.as('owner');
    const { items } = (await owner.get('/api/people').expect(200)).body as { items: Person[] };
    const maker = items.find(({ role }) => role === 'maker') as Person;
    await owner
      .patch(`/api/people/${maker.id}`)
      .set('If-Match', `"${maker.version}"`)
      .send({ wagePerHour: '30' })
      .expect(200);
    const job = await finishedRun(paid, logs);
    const reply = await owner.get(`/api/jobs/${job.id}/variances`).expect(200);
    const { steps, wages } = reply.body as JobVariances;
    // 19 minutes of stamping at 30 in place of 22 an hour.
    expect(steps[1]?.money?.wage).toBe('2.53');
    const { money } = (await owner.get(`/api/jobs/${job.id}/comparison`).expect(200))
      .body as JobComparison;
    const row = money?.find(({ what }) => what === 'Bench wages');
    // 94 minutes at 30 an hour.
    expect(row?.fact).toBe('47.00');
    expect(new Decimal(row?.fact ?? 0).minus(row?.estimate ?? 0).toFixed(2)).toBe(wages?.sum);
    await paid.shop.close();
  });
});

describe('two at a step, one paid by the piece, and rest for all', () => {
  it('are told and learned as they were said', async () => {
    const shared = await readyForTheBench(await startTestShop());
    const owner = shared.shop.as('owner');
    const change = async (path: string, body: (now: Pattern) => object) => {
      const now = (await owner.get(path).expect(200)).body as Pattern;
      await owner.patch(path).set('If-Match', `"${now.version}"`).send(body(now)).expect(200);
    };
    await change('/api/workshop', () => ({ restPercent: '10' }));
    await change(`/api/patterns/${shared.patternId}`, ({ definition }) => {
      const { work } = definition;
      if (work.kind !== 'steps') throw new TypeError('The pattern is worked in steps');
      const said = { Stamp: { people: 2 }, Cut: { pieceRate: '0.10' } };
      const steps = work.steps.map((step) => ({
        ...step,
        ...(step.name in said && said[step.name as keyof typeof said]),
      }));
      return { definition: { ...definition, work: { ...work, steps } } };
    });
    const job = await finishedRun(shared, logs);
    const reply = await owner.get(`/api/jobs/${job.id}/variances`).expect(200);
    const { steps, wages } = reply.body as JobVariances;
    // 56 strikes at 12 s and 5 minutes of setup by two, and a tenth for rest: 35.64 minutes; 19 were logged.
    expect(steps[1]).toMatchObject({
      name: 'Stamp',
      saidForMade: '35.64',
      money: { time: '-6.10' },
    });
    const { money } = (await owner.get(`/api/jobs/${job.id}/comparison`).expect(200))
      .body as JobComparison;
    const row = money?.find(({ what }) => what === 'Bench wages');
    // 84 minutes at 22 an hour, and 52 pieces at 0.10.
    expect(row?.fact).toBe('36.00');
    expect(new Decimal(row?.fact ?? 0).minus(row?.estimate ?? 0).toFixed(2)).toBe(wages?.sum);
    const found = (await owner.get(`/api/patterns/${shared.patternId}/learned`).expect(200))
      .body as Learned;
    // 19 / (2 × 1.1) minutes less 5 of setup, over 56 strikes; the piece-paid step's 10 / 1.1 over 52.
    expect(found.steps[1]?.time?.secondsPerUnit).toBe('3.9');
    await shared.shop.close();
  });
});
