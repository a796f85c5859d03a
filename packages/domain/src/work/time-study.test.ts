import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { readingsNeeded, standardTime, studyTimes } from './time-study.ts';

describe('studyTimes', () => {
  it('says mean, spread and how many readings are needed', () => {
    const { mean, sd, needed, count } = studyTimes([10, 12, 14]);
    expect([mean, sd, needed, count]).toEqual([12, 2, 43, 3]);
  });

  it('does not guess a spread from one reading', () => {
    expect(studyTimes([9])).toEqual({ count: 1, mean: 9, sd: null, needed: null });
  });

  it('needs one reading where all are alike', () => expect(studyTimes([5, 5, 5]).needed).toBe(1));

  it('keeps the mean between the readings, and asks for no fewer readings for more precision', () => {
    const someReadings = fc.array(fc.integer({ min: 1, max: 10_000 }), {
      minLength: 2,
      maxLength: 40,
    });
    fc.assert(
      fc.property(someReadings, (readings) => {
        const { mean, needed } = studyTimes(readings);
        expect(mean).toBeGreaterThanOrEqual(Math.min(...readings) - 1e-9);
        expect(mean).toBeLessThanOrEqual(Math.max(...readings) + 1e-9);
        const finer = studyTimes(readings, { within: 0.02, confidence: 0.95 }).needed;
        expect(finer).toBeGreaterThanOrEqual(needed ?? 0);
      }),
    );
  });

  it.each([
    ['readings', []],
    ['readings.1', [3, 0]],
    ['readings.0', [Number.NaN]],
  ])('refuses %s where it makes no sense', (field, readings) => {
    expect(() => studyTimes(readings)).toThrow(expect.objectContaining({ field }));
  });
});

describe('readingsNeeded', () => {
  it.each([
    ['mean', { mean: 0, sd: 1 }, undefined],
    ['sd', { mean: 1, sd: -1 }, undefined],
    ['within', { mean: 1, sd: 1 }, { within: 0, confidence: 0.95 }],
    ['confidence', { mean: 1, sd: 1 }, { within: 0.05, confidence: 1 }],
  ])('refuses %s where it makes no sense', (field, times, precision) => {
    expect(() => readingsNeeded(times, precision)).toThrow(expect.objectContaining({ field }));
  });
});

describe('standardTime', () => {
  it('refuses rest that takes the whole day', () => {
    const whole = { observed: 1, allowance: 1, of: 'working day' } as const;
    expect(() => standardTime(whole)).toThrow(expect.objectContaining({ field: 'allowance' }));
  });
});
