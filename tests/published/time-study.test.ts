import { readingsNeeded, standardTime } from '@hidewright/domain';
import { describe, expect, it } from 'vitest';

describe('how many readings', () => {
  // Sample size n = (z s / (h x̄))² with s = 1, x̄ = 3, h = 5 % and z = 1.96: 170.74, so 171; from
  // memory of the textbooks' formula, recomputed.
  it('a spread of a third of the mean asks for 171 at 5 % and 95 %', () => {
    expect(readingsNeeded({ mean: 3, sd: 1 })).toBe(171);
  });
});

describe('standard time', () => {
  // Work study, International Labour Office (from memory): basic time = observed time × rating;
  // 800 s at a rating of 110 are 880 s, and 15 % of the basic minute make it 1.15.
  it('of 800 s at a rating of 110 is 880 s', () => {
    expect(standardTime({ observed: 800, rating: 1.1, allowance: 0 })).toBeCloseTo(880, 9);
  });

  it('of a basic minute with 15 % for rest is 1.15', () => {
    expect(standardTime({ observed: 1, allowance: 0.15 })).toBeCloseTo(1.15, 12);
  });

  // The same 15 % as a share of the working day, as is usual in the United States (from memory).
  it('of a basic minute with 15 % of the day for rest is 1.1765', () => {
    const minute = standardTime({ observed: 1, allowance: 0.15, of: 'working day' });
    expect(minute).toBeCloseTo(1.1765, 4);
  });
});
