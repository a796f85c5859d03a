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

describe('what the runs offer', () => {
  it('is each step’s time and rejects, with what stands behind them', () => {
    expect(offeredBy({ by: 'steps', steps } as Learned)).toEqual([
      {
        ...{ what: 'minutes', step: 1, name: 'Stamp: time', changes: true },
        now: '12 s',
        found: '14.5 s per strike',
        behind: '200 strikes in 3 runs, setup stays at 5 min',
      },
      {
        ...{ what: 'rejects', step: 1, name: 'Stamp: rejects', changes: false },
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
    } as Learned;
    expect(offeredBy(one)).toEqual([
      {
        ...{ what: 'minutes', step: null, name: 'Minutes per 100', changes: true },
        now: '180 min',
        found: '158.04 min',
        behind: '56 pieces in 1 run',
      },
    ]);
  });
});
