import { InvalidInput } from '@hidewright/domain';
import { describe, expect, it } from 'vitest';
import { waysFor, type Steps } from './ways.ts';

const step = { setupMinutes: '0', secondsPerUnit: '10', per: 'piece', rejectPercent: '0' } as const;
const press: Steps = [
  { ...step, name: 'Case', per: 'panel', secondsPerUnit: '40', longestWait: '30' },
  { ...step, name: 'Stamp', setupMinutes: '10', secondsPerUnit: '9' },
];
const asked = { pieces: 50, transfer: 10, handlingSeconds: 12, hands: 'one' } as const;

describe('ways of working', () => {
  it('cost 12 s more for each piece finished singly at the second press: 10 min on 50', () => {
    // Common practice, no source.
    const [single, batches, byStep] = waysFor(press, 10, asked);
    expect(single).toMatchObject({ name: 'one at a time', batch: 1, handlingSeconds: 600 });
    expect(batches).toMatchObject({ name: 'in batches of 10', batch: 10, handlingSeconds: 60 });
    expect(byStep).toMatchObject({ name: 'step by step', batch: 50, handlingSeconds: 12 });
    // 4 s a piece at the panel and 9 s at the press: 650 s, set up in 600 s.
    expect(byStep?.elapsedMinutes).toBeCloseTo((600 + 650 + 12) / 60, 9);
  });

  it('warn where damp pieces would dry before their turn, and only there', () => {
    // The last of 300 waits for 299 × 9 s: 44.9 min.
    const all = waysFor(press, 10, { ...asked, pieces: 300 });
    expect(all.map(({ cautions }) => cautions)).toEqual([
      [],
      [],
      ['would lie longer than 30 min after Case'],
    ]);
    // Handing on counts: 198 × 9 + 12 s is just in time, one piece more is not.
    expect(waysFor(press, 10, { ...asked, pieces: 199 })[2]?.cautions).toEqual([]);
    expect(waysFor(press, 10, { ...asked, pieces: 200 })[2]?.cautions).toHaveLength(1);
  });

  it('warn where pieces pile up before the slower of two people', () => {
    // Somebody cases one every 4 s, somebody else stamps one every 9 + 12 s.
    const [single] = waysFor(press, 10, { ...asked, pieces: 200, hands: 'each' });
    expect(single?.cautions).toEqual(['would lie longer than 30 min after Case']);
  });

  it('count a step for the whole run as setting up', () => {
    const whole: Steps = [
      ...press,
      { ...step, name: 'Press dry', per: 'run', secondsPerUnit: '120' },
    ];
    const minutes = (steps: Steps) => waysFor(steps, 10, { ...asked, handlingSeconds: 0 })[2];
    expect(minutes(whole)?.elapsedMinutes).toBeCloseTo(
      (minutes(press)?.elapsedMinutes ?? 0) + 2,
      9,
    );
  });

  it('cannot be told for half a piece', () => {
    expect(() => waysFor(press, 10, { ...asked, transfer: 0.5 })).toThrow(InvalidInput);
  });
});
