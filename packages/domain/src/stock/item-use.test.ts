import { describe, expect, it } from 'vitest';
import { dailyUse, itemUse } from './item-use.ts';

const weeks = (each: (week: number) => number, count = 52) =>
  Array.from({ length: count }, (_, at) => each(at));

describe('how an item is used', () => {
  it('is smoothed by the week where nearly every week has some', () => {
    expect(itemUse(weeks(() => 40))).toMatchObject({
      ...{ periodDays: 7, mean: 40, sd: 0, idleShare: 0, method: 'smoothing', forecast: 40 },
      croston: null,
    });
  });

  it('is smoothed by four weeks where weeks are patchy and months are not', () => {
    const use = itemUse(weeks((week) => (week % 4 === 0 ? 100 : 0)));
    expect(use).toMatchObject({ periodDays: 28, method: 'smoothing', mean: 100, forecast: 100 });
    expect(use.series).toHaveLength(13);
    expect(dailyUse(use)).toBeCloseTo(100 / 28, 12);
  });

  it('goes by Croston where it is rare: 120 every twelve weeks', () => {
    const use = itemUse(weeks((week) => (week % 12 === 11 ? 120 : 0), 48));
    expect(use).toMatchObject({
      ...{ periodDays: 28, method: 'croston', idleShare: 8 / 12 },
      croston: { size: 120, interval: 3, forecast: 40 },
    });
  });

  it('leans to what was used of late', () => {
    const use = itemUse(weeks((week) => (week < 40 ? 10 : 50)));
    expect(use.forecast).toBeGreaterThan(use.mean);
    expect(use.forecast).toBeLessThan(50);
  });

  it.each([
    ['nothing is known', []],
    ['nothing was used', weeks(() => 0)],
    ['it is known for seven weeks', weeks(() => 9, 7)],
    ['only the oldest weeks have use', [5, ...weeks(() => 0, 8)]],
  ])('says too little where %s', (_, series) => {
    expect(itemUse(series)).toMatchObject({ method: 'too little', forecast: 0, croston: null });
  });

  it('refuses more than a year, and use below 0', () => {
    expect(() => itemUse(weeks(() => 1, 53))).toThrow('at most 52 weeks');
    expect(() => itemUse([-1])).toThrow('weeks.0');
  });
});
