import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { costOfKept } from './finished-cost.ts';

describe('what pieces that stay cost', () => {
  it('is their share of what the run took, seconds no less than good ones', () => {
    expect(costOfKept({ cost: 10_800, made: 54, overs: 3, seconds: 1 })).toEqual({
      overs: 600,
      seconds: 200,
    });
    expect(costOfKept({ cost: 100, made: 3, overs: 1, seconds: 1 })).toEqual({
      overs: 33,
      seconds: 34,
    });
  });

  it('is all of it where all stay, and never a cent beside the share of both', () => {
    const run = fc.record({
      cost: fc.nat(1_000_000),
      ordered: fc.nat(500),
      overs: fc.nat(50),
      seconds: fc.nat(50),
    });
    fc.assert(
      fc.property(run, ({ cost, ordered, overs, seconds }) => {
        const made = ordered + overs + seconds;
        const kept = costOfKept({ cost, made, overs, seconds });
        const both = kept.overs + kept.seconds;
        expect(kept.overs).toBeGreaterThanOrEqual(0);
        expect(kept.seconds).toBeGreaterThanOrEqual(0);
        if (made > 0) {
          expect(Math.abs(both * made - cost * (overs + seconds))).toBeLessThanOrEqual(made / 2);
        }
        if (ordered === 0 && made > 0) expect(both).toBe(cost);
      }),
    );
  });

  it('is refused for more than came out', () => {
    expect(() => costOfKept({ cost: 1, made: 1, overs: 1, seconds: 1 })).toThrow(
      expect.objectContaining({ field: 'made' }),
    );
  });
});
