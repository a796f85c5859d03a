import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { flowTime } from './flow-time.ts';
import { waysOfWorking } from './ways-of-working.ts';

const steps = [
  { secondsPerPiece: 8, setupMinutes: 5 },
  { secondsPerPiece: 12, setupMinutes: 10 },
];

describe('ways of working', () => {
  it('costs ten minutes of handling to finish fifty pieces one at a time', () => {
    // Common practice, no source: about 12 s of extra handling for each piece at the second press.
    const [singly, together] = waysOfWorking({
      pieces: 50,
      steps,
      handlingSeconds: 12,
      batches: [1, 50],
      hands: 'one',
    });
    expect(singly?.handlingSeconds).toBe(600);
    expect(together?.handlingSeconds).toBe(12);
    expect((singly?.elapsedMinutes ?? 0) - (together?.elapsedMinutes ?? 0)).toBeCloseTo(9.8, 9);
    expect(singly?.firstReadyMinutes).toBeLessThan(together?.firstReadyMinutes ?? 0);
  });

  it('agrees with the flow time where somebody stands at each step', () => {
    const time = fc.integer({ min: 0, max: 60 });
    fc.assert(
      fc.property(
        fc.integer({ min: 1, max: 90 }),
        fc.array(time, { minLength: 1, maxLength: 4 }),
        fc.integer({ min: 1, max: 90 }),
        (pieces, times, transfer) => {
          const [way] = waysOfWorking({
            pieces,
            steps: times.map((secondsPerPiece) => ({ secondsPerPiece, setupMinutes: 0 })),
            handlingSeconds: 0,
            batches: [transfer],
            hands: 'each',
          });
          expect((way?.elapsedMinutes ?? 0) * 60).toBeCloseTo(
            flowTime({ quantity: pieces, times, transfer }),
            6,
          );
        },
      ),
    );
  });

  it('is refused without steps, or with none in a batch', () => {
    const input = { pieces: 5, steps, handlingSeconds: 0, batches: [0], hands: 'one' as const };
    expect(() => waysOfWorking(input)).toThrow('batches.0');
    expect(() => waysOfWorking({ ...input, steps: [] })).toThrow('at least one step');
  });
});
