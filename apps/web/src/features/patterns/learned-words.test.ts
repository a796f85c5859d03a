import type { Learned } from '@hidewright/contract';
import { describe, expect, it } from 'vitest';
import { notLogged, offeredBy } from './learned-words.ts';

const found = { percent: '4', lowPercent: '2.1', highPercent: '7.4', rejected: 8, reached: 200 };
const said = { setupMinutes: '5', secondsPerUnit: '12', rejectPercent: '4' };
const steps: Learned['steps'] = [
  {
    ...{ position: 1, name: 'Stamp', per: 'strike', said },
    time: { setupMinutes: '5', secondsPerUnit: '14.5', units: 200, runs: 3 },
    rejects: found,
  },
  { position: 2, name: 'Cut', per: 'piece', said, time: null, rejects: null },
];

const noMaterials = { leather: { saidExtraPercent: '0', extra: null }, hardware: [] };

describe('what the runs offer', () => {
  it('is each step’s time and rejects, with what stands behind them', () => {
    expect(offeredBy({ by: 'steps', steps, ...noMaterials } as unknown as Learned)).toEqual([
      {
        ...{ what: 'minutes', step: 1, hardwareId: null, name: 'Stamp: time', changes: true },
        now: '12 s',
        found: '14.5 s per strike',
        behind: '200 strikes in 3 runs, setup stays at 5 min',
      },
      {
        ...{ what: 'rejects', step: 1, hardwareId: null, name: 'Stamp: rejects', changes: false },
        now: '4\u202f%',
        found: '4\u202f%',
        behind: '8 of 200; likely 2.1 to 7.4\u202f%',
      },
    ]);
    expect(notLogged({ steps } as Learned)).toEqual(['Cut']);
  });

  it('is one figure of each where the pattern has one', () => {
    const one = {
      by: 'minutesPer100',
      minutes: { said: '180', found: { per100: '158.04', sd: null, pieces: 56, runs: 1 } },
      rejects: { said: '10', found: null },
      ...noMaterials,
    } as unknown as Learned;
    expect(offeredBy(one)).toEqual([
      {
        ...{
          what: 'minutes',
          step: null,
          hardwareId: null,
          name: 'Minutes per 100',
          changes: true,
        },
        now: '180 min',
        found: '158.04 min',
        behind: '56 pieces in 1 run',
      },
    ]);
  });

  it('is leather beside the layout, and hardware that was lost', () => {
    const materials = {
      ...{ by: 'steps', steps: [] },
      leather: {
        saidExtraPercent: '0',
        extra: { extraPercent: '4.5', leastPercent: '-1', mostPercent: '9', runs: 3 },
      },
      hardware: [
        {
          ...{ hardwareId: 7, name: 'Rivet 9 mm', said: 2, found: '2.1', saidLossPercent: '2' },
          losses: { percent: '4.76', needed: 300, taken: 315, runs: 2 },
        },
      ],
    } as unknown as Learned;
    expect(offeredBy(materials)).toMatchObject([
      {
        ...{ what: 'leather', now: 'as the layout', found: 'layout and 4.5\u202f%', changes: true },
        behind: '3 runs, from 1\u202f% less to 9\u202f% more',
      },
      {
        ...{ what: 'hardware', hardwareId: 7, name: 'Rivet 9 mm: lost', now: '2\u202f%' },
        behind: '315 taken for 300 in 2 runs',
      },
    ]);
  });
});
