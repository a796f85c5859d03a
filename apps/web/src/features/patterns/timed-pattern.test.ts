import type { PatternDefinition } from '@hidewright/contract';
import { describe, expect, it } from 'vitest';
import { inWords, withSeconds } from './timed-pattern.ts';

const definitionOf = (work: PatternDefinition['work']) => ({ work }) as PatternDefinition;
const cut = {
  ...{ name: 'Cut', setupMinutes: '5', secondsPerUnit: '12', per: 'piece' as const },
  rejectPercent: '2',
};

describe('a step that was timed', () => {
  it('takes the seconds, and the others keep theirs', () => {
    const steps = definitionOf({ kind: 'steps', steps: [cut, { ...cut, name: 'Pack' }] });
    const definition = withSeconds(steps, 1, 7.456);
    expect([0, 1].map((step) => inWords({ definition }, step))).toEqual([
      '12 s per piece',
      '7.46 s per piece',
    ]);
  });

  it('makes the minutes per 100 where the pattern has one figure', () => {
    const one = definitionOf({ kind: 'minutesPer100', minutes: '180', rejectPercent: '10' });
    expect(withSeconds(one, 0, 90.5).work).toMatchObject({ minutes: '150.83' });
  });
});
