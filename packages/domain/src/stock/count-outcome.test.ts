import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { countOutcome } from './count-outcome.ts';

const amount = fc.integer({ min: 0, max: 10_000_000 });

describe('what a count changes', () => {
  it('is the difference to the books when it was counted', () => {
    const line = { counted: 90, bookThen: 100, onHandNow: 60, reserved: 0 };
    expect(countOutcome(line)).toEqual({ difference: -10, after: 50, missing: 0 });
  });

  it('says how much of what is held is then missing', () => {
    const line = { counted: 30, bookThen: 100, onHandNow: 100, reserved: 80 };
    expect(countOutcome(line)).toMatchObject({ missing: 50 });
  });

  it('does not depend on what moves between counting and posting', () => {
    const moved = fc.integer({ min: -1000, max: 1000 });
    fc.assert(
      fc.property(amount, amount, moved, (counted, bookThen, since) => {
        const { after } = countOutcome({
          counted,
          bookThen,
          onHandNow: bookThen + since,
          reserved: 0,
        });
        expect(after).toBe(counted + since);
      }),
    );
  });

  it('changes nothing where the count agrees', () => {
    fc.assert(
      fc.property(amount, amount, amount, (there, onHandNow, reserved) => {
        const outcome = countOutcome({ counted: there, bookThen: there, onHandNow, reserved });
        expect(outcome.difference).toBe(0);
        expect(outcome.after).toBe(onHandNow);
      }),
    );
  });
});
