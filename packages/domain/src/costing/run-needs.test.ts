import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { priceRun } from '../pricing/price-run.ts';
import { aFullRun } from '../pricing/run.arbitrary.ts';
import { runNeeds } from './run-needs.ts';

describe('what a run takes, before any price', () => {
  it('is what its numbers say at each quantity', () => {
    fc.assert(
      fc.property(aFullRun, (input) => {
        for (const rung of priceRun(input).breaks) {
          const { cutCount, containers, hardwareCounts, leatherAreaMm2, benchMinutes } = runNeeds(
            input,
            rung.quantity,
          );
          expect(rung).toMatchObject({
            ...{ cutCount, containers, hardwareCounts, leatherAreaMm2, benchMinutes },
          });
        }
      }),
      { numRuns: 40 },
    );
  });

  it('is refused for no pieces', () => {
    const [input] = fc.sample(aFullRun, 1);
    expect(() => input && runNeeds(input, 0)).toThrow('quantity');
  });
});
