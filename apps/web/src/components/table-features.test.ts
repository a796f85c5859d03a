import { describe, expect, it } from 'vitest';
import { compareValues, holdsWords } from './table-features.ts';

describe('sorting a column', () => {
  it('puts figures by size, negative ones first, and numbers of papers in their order', () => {
    const sort = (values: unknown[]) => [...values].sort(compareValues);
    expect(sort(['168.30', '98.10', '1442.00', '-3.2'])).toEqual([
      '-3.2',
      '98.10',
      '168.30',
      '1442.00',
    ]);
    expect(sort(['OT-118', 'OT-9', 'BR-20'])).toEqual(['BR-20', 'OT-9', 'OT-118']);
    expect(sort(['b', null, 'A'])).toEqual([null, 'A', 'b']);
  });
});

describe('filtering', () => {
  it('finds what was typed, in any case', () => {
    expect(holdsWords('Oak tan russet', ' OAK ')).toBe(true);
    expect(holdsWords(24.75, '4.7')).toBe(true);
    expect(holdsWords(null, 'x')).toBe(false);
  });
});
