import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { countByWeight } from './count-by-weight.ts';

const weighing = {
  sampleCount: 10,
  sampleGrams: '12.5',
  allGrams: '337.5',
  tareGrams: '25',
  scaleStepGrams: '0.1',
};

describe('counting by weight', () => {
  it('divides what all weigh by what one weighs, and says how sure that is', () => {
    // 312.5 g at 1.25 g; ± 0.05 g on ten is 0.4 %, one piece and a half of 250
    expect(countByWeight(weighing)).toEqual({
      count: 250,
      atLeast: 249,
      atMost: 251,
      sentence:
        'About 250 pieces: by this scale anything from 249 to 251. Weigh more pieces as the sample to be surer.',
    });
  });

  it('is certain where the scale is fine enough', () => {
    const fine = countByWeight({ ...weighing, sampleGrams: '50', allGrams: '425', tareGrams: '0' });
    expect(fine).toMatchObject({ count: 85, atLeast: 85, atMost: 85 });
    expect(fine.sentence).toBe('85 pieces, certain to the piece by this scale.');
    expect(countByWeight({ ...weighing, allGrams: '25' }).count).toBe(0);
  });

  it('says so where no whole number of pieces weighs that', () => {
    // 15.9 g at 1.8 g each are 8.8 pieces, and a scale of 0.01 g is not that wrong.
    const mixed = { sampleGrams: '18', allGrams: '35.9', tareGrams: '20', scaleStepGrams: '0.01' };
    expect(countByWeight({ ...weighing, ...mixed })).toEqual({
      count: 9,
      atLeast: 8,
      atMost: 9,
      sentence:
        'Between 8 and 9 pieces: no whole number weighs that. Empty the tub of anything else, and weigh both again.',
    });
    const walked = { sampleGrams: '18', allGrams: '179', tareGrams: '20' };
    expect(countByWeight({ ...weighing, ...walked })).toMatchObject({ atLeast: 88, atMost: 89 });
  });

  it('gives no count that the scale would not have shown', () => {
    const near = { sampleGrams: '1.0', allGrams: '8.45', tareGrams: '0', scaleStepGrams: '0.1' };
    const { count, atLeast, atMost } = countByWeight({ ...weighing, ...near });
    expect([atLeast <= count, count <= atMost]).toEqual([true, true]);
  });

  it.each([
    [{ sampleCount: 0 }, 'sampleCount'],
    [{ sampleGrams: '0' }, 'sampleGrams'],
    [{ sampleGrams: '0.05' }, 'sampleGrams'],
    [{ sampleGrams: '-3' }, 'sampleGrams'],
    [{ allGrams: '24' }, 'allGrams'],
    [{ tareGrams: 'NaN' }, 'tareGrams'],
    [{ scaleStepGrams: '0' }, 'scaleStepGrams'],
  ])('refuses %j', (wrong, field) => {
    expect(() => countByWeight({ ...weighing, ...wrong })).toThrow(
      expect.objectContaining({ field }),
    );
  });

  it('has the true count within its range, whatever the scale rounds', () => {
    fc.assert(
      fc.property(
        fc.integer({ min: 0, max: 3000 }),
        fc.integer({ min: 200, max: 90000 }),
        fc.integer({ min: 5, max: 50 }),
        fc.integer({ min: 0, max: 500_000 }),
        (count, milligrams, sampleCount, tub) => {
          const shown = (exact: number) => (Math.round(exact / 100) / 10).toFixed(1);
          const found = countByWeight({
            sampleCount,
            sampleGrams: shown(milligrams * sampleCount),
            allGrams: shown(milligrams * count + tub),
            tareGrams: shown(tub),
            scaleStepGrams: '0.1',
          });
          expect(found.atLeast).toBeLessThanOrEqual(count);
          expect(found.atMost).toBeGreaterThanOrEqual(count);
        },
      ),
    );
  });
});
