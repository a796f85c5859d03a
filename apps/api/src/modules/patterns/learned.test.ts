import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type { Job, Learned, Pattern } from '@hidewright/contract';
import { readyForTheBench, type BenchShop } from '../../testing/bench-shop.ts';
import { finishedRun } from '../../testing/finished-run.ts';
import { startTestShop } from '../../testing/test-shop.ts';

let ready: BenchShop;
const jobs: Job[] = [];

const as = (role: 'owner' | 'maker' | 'bookkeeper') => ready.shop.as(role);
const at = () => `/api/patterns/${ready.patternId}`;
const learned = async (query = '', role: 'owner' | 'maker' = 'owner') =>
  (await as(role).get(`${at()}/learned${query}`).expect(200)).body as Learned;
const pattern = async () => (await as('owner').get(at()).expect(200)).body as Pattern;
const take = async (body: object) => {
  const { version } = await pattern();
  return as('owner').post(`${at()}/learned`).set('If-Match', `"${version}"`).send(body);
};
const stepsOf = ({ definition: { work } }: Pattern) => (work.kind === 'steps' ? work.steps : []);

beforeAll(async () => {
  ready = await readyForTheBench(await startTestShop());
});
afterAll(() => ready.shop.close());

describe('what the last runs of a pattern say', () => {
  it('is nothing before there is one', async () => {
    expect(await learned()).toMatchObject({
      by: 'steps',
      runs: [],
      minutes: { said: null, found: null },
      rejects: { said: '7.81', found: null },
      history: { good: null, of: null, uncounted: ['Stamp', 'Cut', 'Fold and rivet'] },
    });
    const reply = await take({ take: [{ what: 'minutes', step: 2 }] });
    expect(reply.status).toBe(422);
    expect(reply.body.errors[0].message).toMatch(/nothing to use/);
  });

  it('is read off the finished jobs, pooled by their pieces', async () => {
    jobs.push(
      await finishedRun(ready, {
        'Case panels': { good: 7, minutes: '15' },
        Stamp: { good: 52, rejects: 4, minutes: '19' },
        Cut: { good: 50, rejects: 2, minutes: '10' },
        'Fold and rivet': { good: 50, minutes: '50' },
      }),
      await finishedRun(ready, {
        Stamp: { good: 54, rejects: 2, minutes: '23' },
        Cut: { good: 54, minutes: '12' },
        'Fold and rivet': { good: 51, rejects: 3, minutes: '48' },
      }),
    );
    const found = await learned();
    expect(
      found.runs.map(({ number, cut, rejects, minutes }) => [number, cut, rejects, minutes]),
    ).toEqual([
      ['J-0002', 56, 5, '83'],
      ['J-0001', 56, 6, '94'],
    ]);
    expect(found.minutes.found).toEqual({ per100: '158.04', sd: '13.89', pieces: 112, runs: 2 });
    expect(found.rejects.found).toMatchObject({ percent: '9.82', rejected: 11, reached: 112 });
    expect(found.steps.map(({ name, time }) => [name, time?.secondsPerUnit, time?.runs])).toEqual([
      // 15 minutes less 5 of setup on 7 panels.
      ['Case panels', '85.71', 1],
      ['Stamp', '17.14', 2],
      ['Cut', '6.79', 2],
      ['Fold and rivet', '50.77', 2],
    ]);
    expect(found.steps.map(({ rejects }) => rejects?.rejected ?? null)).toEqual([null, 6, 2, 3]);
    expect(found.history).toEqual({ good: 101, of: 112, uncounted: [] });
    expect(found.hardware).toMatchObject([
      { name: 'Rivet 9 mm', said: 2, found: null, saidLossPercent: '0', losses: null },
    ]);
    expect(found.leather.extra).toBeNull();
  });

  it('can be read without a run', async () => {
    const found = await learned(`?without=${jobs[0]?.id}`);
    expect(found.runs.map(({ mixedIn }) => mixedIn)).toEqual([true, false]);
    expect(found.minutes.found).toMatchObject({ runs: 1, sd: null, pieces: 56 });
    await as('owner').get(`${at()}/learned?without=all`).expect(422);
  });

  it('tells the maker minutes and rejects, and no money', async () => {
    const found = await learned('', 'maker');
    expect(found.minutes.found?.per100).toBe('158.04');
    expect('money' in found).toBe(false);
    expect('money' in (await learned())).toBe(true);
    await as('maker').post(`${at()}/learned`).set('If-Match', '"1"').send({}).expect(403);
  });
});

describe('a run that was counted in part', () => {
  it('says nothing of rejects where pieces are missing, and all where none are', async () => {
    const partly = await readyForTheBench(await startTestShop());
    const stamped = { Stamp: { good: 52, rejects: 4 } };
    await finishedRun(partly, stamped, { good: 50 });
    await finishedRun(partly, stamped, { good: 51, seconds: 1 });
    await finishedRun(partly, {});
    const reply = await partly.shop.as('owner').get(`/api/patterns/${partly.patternId}/learned`);
    const { runs, rejects, minutes, history } = reply.body as Learned;
    expect(runs.map((run) => run.rejects)).toEqual([null, 4, null]);
    expect(rejects.found).toMatchObject({ rejected: 4, reached: 56 });
    expect(minutes.found).toBeNull();
    expect(history).toEqual({ good: null, of: null, uncounted: ['Cut', 'Fold and rivet'] });
    await partly.shop.close();
  });
});

describe('using it', () => {
  it('one by one leaves the rest as it was, with no pieces behind part of the rejects', async () => {
    const before = await pattern();
    const reply = await take({
      take: [
        { what: 'minutes', step: 2 },
        { what: 'rejects', step: 3 },
      ],
    });
    expect(reply.status).toBe(200);
    const now = await pattern();
    expect(now.versionNumber).toBe(before.versionNumber + 1);
    const [stamp, cut] = stepsOf(now).slice(1);
    expect(stamp).toMatchObject({ setupMinutes: '5', secondsPerUnit: '17.14', rejectPercent: '3' });
    expect(cut).toMatchObject({ secondsPerUnit: '6', rejectPercent: '1.89' });
    expect(now.definition.history).toBeNull();
  });

  it('all of it keeps the pieces behind the rejects, until rejects are changed by hand', async () => {
    const { steps } = await learned();
    const all = steps.flatMap(({ position: step, time, rejects }) => [
      ...(time === null ? [] : [{ what: 'minutes', step }]),
      ...(rejects === null ? [] : [{ what: 'rejects', step }]),
    ]);
    expect((await take({ take: all })).status).toBe(200);
    const now = await pattern();
    expect(now.definition.history).toEqual({ good: 101, total: 112 });
    expect(stepsOf(now).map(({ rejectPercent }) => rejectPercent)).toEqual([
      '0',
      '5.36',
      '1.89',
      '2.88',
    ]);

    const patch = async (change: (each: { name: string }) => object) => {
      const { definition, version } = await pattern();
      const work = { kind: 'steps', steps: stepsOf(await pattern()).map(change) };
      const body = { definition: { ...definition, work } };
      const send = as('owner').patch(at()).set('If-Match', `"${version}"`).send(body);
      return (await send.expect(200)).body as Pattern;
    };
    const slower = await patch((step) => ({ ...step, setupMinutes: '8' }));
    expect(slower.definition.history).toEqual({ good: 101, total: 112 });
    const byHand = await patch((step) => ({
      ...step,
      ...(step.name === 'Cut' ? { rejectPercent: '5' } : {}),
    }));
    expect(byHand.definition.history).toBeNull();
  });

  it('takes no more good pieces than there were, and none where nothing is said of them', async () => {
    const { definition, version } = await pattern();
    const { history, ...unsaid } = definition;
    const send = (sent: object) =>
      as('owner').patch(at()).set('If-Match', `"${version}"`).send({ definition: sent });
    const reply = await send({ ...unsaid, history: { good: 9, total: 8 } }).expect(422);
    expect(reply.body.errors[0].field).toBe('definition.history.good');
    expect((await send(unsaid).expect(200)).body.definition.history).toBeNull();
    expect(history).toBeNull();
  });

  it('needs the version that was read, and figures of this way of working', async () => {
    const body = { take: [{ what: 'minutes', step: 2 }] };
    await as('owner').post(`${at()}/learned`).send(body).expect(428);
    await as('owner').post(`${at()}/learned`).set('If-Match', '"1"').send(body).expect(412);
    expect((await take({ take: [{ what: 'minutes', step: null }] })).status).toBe(422);
    expect((await take({ take: [{ what: 'minutes', step: 9 }] })).status).toBe(422);
    expect((await take({ take: [] })).status).toBe(422);
  });

  it('is one figure of each where the pattern has one, also of runs that went step by step', async () => {
    const { definition, version } = await pattern();
    const work = { kind: 'minutesPer100', minutes: '180', rejectPercent: '10' };
    const send = as('owner').patch(at()).set('If-Match', `"${version}"`);
    await send.send({ definition: { ...definition, work } }).expect(200);
    const found = await learned();
    expect(found).toMatchObject({ by: 'minutesPer100', steps: [], minutes: { said: '180' } });
    const take2 = ['minutes', 'rejects'].map((what) => ({ what, step: null }));
    expect((await take({ take: take2, without: [jobs[0]?.id] })).status).toBe(200);
    expect((await pattern()).definition).toMatchObject({
      work: { minutes: '148.21', rejectPercent: '8.93' },
      history: { good: 51, total: 56 },
    });
  });
});
