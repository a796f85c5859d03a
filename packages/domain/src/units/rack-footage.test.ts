import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { formatFootage } from './footage.ts';
import { rackFootage } from './rack-footage.ts';

const ft2 = (feet: number) => (feet * 92903.04).toFixed(3);

describe('an area as the shop says it', () => {
  it.each([
    [24.75, 'tenth', '24.8'],
    [24.75, 'quarter', '24³'],
    [-1.5, 'quarter', '-1²'],
    [-1.5, 'tenth', '-1.5'],
    [0.9, 'quarter', undefined],
    [0, 'tenth', undefined],
  ] as const)('of %s ft² in a %s is %s', (feet, areaShown, text) => {
    expect(rackFootage(ft2(feet), { areaUnit: 'ft2', areaShown })).toBe(text);
  });

  it('reads the same whether it comes or goes, and no other unit knows quarters', () => {
    const areas = fc.integer({ min: 92_904, max: 900_000_000 }).map(String);
    fc.assert(
      fc.property(areas, fc.constantFrom('tenth', 'quarter'), (area, areaShown) => {
        const said = rackFootage(area, { areaUnit: 'ft2', areaShown });
        expect(said).toBe(formatFootage(area, areaShown));
        expect(rackFootage(`-${area}`, { areaUnit: 'ft2', areaShown })).toBe(`-${said}`);
        expect(rackFootage(area, { areaUnit: 'm2', areaShown })).toBeUndefined();
      }),
    );
  });
});
