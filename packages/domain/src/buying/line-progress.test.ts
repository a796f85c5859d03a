import fc from 'fast-check';
import { expect, it } from 'vitest';
import { lineProgress } from './line-progress.ts';

it('awaits the rest until the order is closed; then the rest is short', () => {
  const line = { ordered: 1000, received: 600 };
  expect(lineProgress(line, true)).toEqual({ toCome: 400, over: 0, short: 0 });
  expect(lineProgress(line, false)).toEqual({ toCome: 0, over: 0, short: 400 });
});

it('says what came beyond the order', () => {
  const line = { ordered: 1000, received: 1012 };
  expect(lineProgress(line, true)).toEqual({ toCome: 0, over: 12, short: 0 });
});

it('accounts for every piece', () => {
  const quantity = fc.integer({ min: 0, max: Number.MAX_SAFE_INTEGER });
  fc.assert(
    fc.property(quantity, quantity, fc.boolean(), (ordered, received, awaited) => {
      const { toCome, over, short } = lineProgress({ ordered, received }, awaited);
      expect(ordered - received).toBe(toCome + short - over);
      expect(Math.min(toCome, short, over)).toBeGreaterThanOrEqual(0);
    }),
  );
});
