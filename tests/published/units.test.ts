import { convert, readFootage } from '@hidewright/domain';
import { describe, expect, it } from 'vitest';

describe('ounce and iron', () => {
  // ASTM D1814-70 (2000), §1.2: ounce 0.396 mm (1/64 in), iron 0.53 mm (1/48 in).
  it('are those of the thickness standard', () => {
    expect(convert(1, 'oz', 'mm').toNumber()).toBe(0.396875);
    expect(convert(1, 'iron', 'mm').toDecimalPlaces(7).toNumber()).toBe(0.5291667);
  });

  // GNU units 2.22, definitions.units: shoeiron 1|48 inch, shoeounce 1|64 inch.
  it('convert as GNU units does', () => {
    expect(convert(8, 'oz', 'mm').toNumber()).toBe(3.175);
    expect(convert(12, 'iron', 'mm').toNumber()).toBe(6.35);
    expect(convert(12, 'iron', 'oz').toNumber()).toBe(16);
    expect(convert(1, 'oz', 'iron').toNumber()).toBe(0.75);
  });
});

describe('square foot', () => {
  // NIST Special Publication 811, appendix B.8 (from memory): 1 ft² = 0.09290304 m², exactly.
  it('is 9.290304 dm² exactly', () => {
    expect(convert(1, 'ft2', 'm2').toFixed()).toBe('0.09290304');
    expect(convert(1, 'ft2', 'dm2').toFixed()).toBe('9.290304');
    expect(convert(1, 'dm2', 'ft2').toDecimalPlaces(9).toNumber()).toBe(0.107639104);
    expect(convert(1, 'm2', 'ft2').toDecimalPlaces(7).toNumber()).toBe(10.7639104);
    expect(convert(10, 'dm2', 'ft2').toDecimalPlaces(6).toNumber()).toBe(1.076391);
  });

  // Etherington & Roberts, Bookbinding and the Conservation of Books (1982), s.v. footage: hides are
  // marked to a quarter of a foot, "4/1" for 4 1/4.
  it('comes in quarters of 2.322576 dm²', () => {
    expect(readFootage('4/1')?.toFixed()).toBe('4.25');
    const quarter = readFootage('4/1')?.minus(4) ?? '0';
    expect(convert(quarter, 'ft2', 'dm2').toFixed()).toBe('2.322576');
  });
});
