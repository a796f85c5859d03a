import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { convert, isUnit, type Unit, units } from './convert.ts';

const lengths: Unit[] = ['mm', 'in', 'oz', 'iron'];
const areas: Unit[] = ['ft2', 'dm2', 'm2', 'mm2'];

describe('convert', () => {
  it('comes back to the same value, whatever the unit between', () => {
    const pair = fc
      .constantFrom(lengths, areas)
      .chain((kind) => fc.tuple(fc.constantFrom(...kind), fc.constantFrom(...kind)));
    fc.assert(
      fc.property(pair, fc.integer({ min: 0, max: 1e9 }), ([from, to], value) => {
        const back = convert(convert(value, from, to), to, from);
        expect(back.toDecimalPlaces(25).toNumber()).toBe(value);
      }),
    );
  });

  it('refuses to turn an area into a length', () => {
    for (const length of lengths) {
      for (const area of areas) {
        expect(() => convert(1, length, area)).toThrow('choose two units of the same kind');
        expect(() => convert(1, area, length)).toThrow('choose two units of the same kind');
      }
    }
  });

  it('knows its units and no names of the object itself', () => {
    expect(units.every(isUnit)).toBe(true);
    expect(isUnit('toString')).toBe(false);
  });
});
