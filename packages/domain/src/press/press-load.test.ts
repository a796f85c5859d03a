import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { leastSpacing, pressLoad, takesPanel, widestStripMm } from './press-load.ts';

const press = {
  bedWidthMm: 500,
  bedDepthMm: 400,
  throatMm: 300,
  ruleMm: 1000,
  reliefAreaMm2: 2000,
};

describe('pressLoad', () => {
  it.each([
    [500, 'with ease'],
    [501, 'well enough'],
    [850, 'well enough'],
    [851, 'near its limit'],
    [1000, 'near its limit'],
    [1001, 'too much'],
  ])('says of %s mm on 1000: %s', (cuttingEdgeMm, word) => {
    expect(pressLoad(press, { cuttingEdgeMm, reliefAreaMm2: null })).toEqual({
      rule: { asked: cuttingEdgeMm, manages: 1000, share: cuttingEdgeMm / 1000, word },
      relief: null,
    });
  });

  it('says nothing where the owner gave no figure, and refuses one that is none', () => {
    const strike = { cuttingEdgeMm: 300, reliefAreaMm2: 900 };
    expect(pressLoad({ ...press, ruleMm: null }, strike)).toMatchObject({
      rule: null,
      relief: { share: 0.45, word: 'with ease' },
    });
    expect(() => pressLoad({ ...press, ruleMm: 0 }, strike)).toThrow('more than 0');
  });
});

describe('the bed', () => {
  it('takes strips up to the throat, or the bed where it is open', () => {
    expect(widestStripMm(press)).toBe(300);
    expect(widestStripMm({ ...press, throatMm: null })).toBe(400);
  });

  it('takes a panel whichever way round it is given', () => {
    const side = fc.integer({ min: 1, max: 800 });
    fc.assert(
      fc.property(side, side, (a, b) => {
        expect(takesPanel(press, a, b)).toBe(takesPanel(press, b, a));
        expect(takesPanel(press, a, b)).toBe(Math.min(a, b) <= 300 && Math.max(a, b) <= 500);
      }),
    );
  });
});

it('the least spacing is the larger of rule and border, and says which', () => {
  expect(leastSpacing({ ruleThicknessMm: 1.4, borderMm: 3 })).toEqual({ mm: 3, because: 'border' });
  expect(leastSpacing({ ruleThicknessMm: 1.4, borderMm: null })).toEqual({
    mm: 1.4,
    because: 'rule',
  });
  expect(leastSpacing({ ruleThicknessMm: null, borderMm: null })).toEqual({ mm: 0, because: null });
});
