import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { flowTime } from './flow-time.ts';

const someTimes = fc.array(fc.integer({ min: 0, max: 20 }), { minLength: 1, maxLength: 6 });
const aQuantity = fc.integer({ min: 1, max: 120 });

/** Batch by batch and step by step, as it happens on the benches. */
function simulated(quantity: number, times: number[], transfer: number): number {
  const free = times.map(() => 0);
  let end = 0;
  for (let left = quantity; left > 0; left -= transfer) {
    end = 0;
    times.forEach((time, step) => {
      end = Math.max(end, free[step] ?? 0) + time * Math.min(left, transfer);
      free[step] = end;
    });
  }
  return end;
}

describe('flowTime', () => {
  it('is what happens, also where the last batch is smaller', () => {
    fc.assert(
      fc.property(aQuantity, someTimes, aQuantity, (quantity, times, transfer) => {
        const made = flowTime({ quantity, times, transfer });
        expect(made).toBe(simulated(quantity, times, transfer));
      }),
    );
  });

  it('keeps tenths exact', () => {
    expect(flowTime({ quantity: 3, times: [0.1, 0.2], transfer: 1 })).toBe(0.7);
  });

  it.each([
    ['quantity', { quantity: 0 }],
    ['transfer', { transfer: 0 }],
    ['times', { times: [] }],
    ['times.1', { times: [1, -1] }],
    ['times.0', { times: [Number.NaN] }],
  ])('refuses %s where it makes no sense', (field, change) => {
    expect(() => flowTime({ quantity: 10, times: [1, 2], transfer: 5, ...change })).toThrow(
      expect.objectContaining({ field }),
    );
  });
});
