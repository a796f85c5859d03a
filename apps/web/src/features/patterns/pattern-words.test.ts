import type { PatternDefinition } from '@hidewright/contract';
import { describe, expect, it } from 'vitest';
import { optionWords } from './pattern-words.ts';

const names = new Map([
  [2, 'Buckle'],
  [4, 'D-ring'],
  [5, 'Snap'],
]);
const step = { name: 'Cut', setupMinutes: '5', secondsPerUnit: '12', per: 'piece' as const };
const work: PatternDefinition['work'] = { kind: 'steps', steps: [{ ...step, rejectPercent: '2' }] };

describe('an option in words', () => {
  it('says from which step on what it adds is needed', () => {
    const swaps = [
      { hardwareId: 2, byHardwareId: 4, perPiece: 1 },
      { hardwareId: null, byHardwareId: 5, perPiece: 2, fromStep: 0 },
    ];
    expect(optionWords({ name: 'Ringed', swaps }, names, work)).toBe(
      'Ringed: 1 × D-ring in place of Buckle; 2 × Snap more, from step 1 Cut on',
    );
  });
});
