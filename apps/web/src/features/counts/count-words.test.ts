import { describe, expect, it } from 'vitest';
import {
  countedText,
  differencesGo,
  figureOf,
  mayBecomeEntry,
  movedText,
  readEntry,
  whatLies,
} from './count-words.ts';

const blank = { lotId: 1, countedAreaMm2: null, countedQuantity: null, unmeasured: false };

describe('what is typed while counting', () => {
  it('is an area of a lot, as people write it', () => {
    expect(readEntry('24³', true, 'ft2')).toEqual({ areaMm2: '2299350.24' });
    expect(readEntry('24/3', true, 'ft2')).toEqual({ areaMm2: '2299350.24' });
    expect(readEntry('0', true, 'ft2')).toEqual({ areaMm2: '0' });
    expect(readEntry('-2', true, 'ft2')).toMatch(/^Enter the area in ft²/);
  });

  it('is a whole number of pieces of hardware', () => {
    expect(readEntry(' 1,200 ', false, 'ft2')).toEqual({ quantity: 1200 });
    for (const wrong of ['-1', '1.5', '12,5', '1,2', 'many'])
      expect(readEntry(wrong, false, 'ft2')).toMatch(/^Enter how many/);
  });

  it('is asked about where its comma may mean either', () => {
    expect(readEntry('1,250', true, 'ft2')).toBe('Write 1250 or 1.25: 1,250 may mean either.');
    expect(readEntry('24,75', true, 'ft2')).toEqual({ areaMm2: '2299350.24' });
  });

  it('takes the count away when it is emptied', () => {
    expect(readEntry('  ', true, 'ft2')).toEqual({});
  });

  it('is not complained of while it may still become a figure', () => {
    for (const half of ['24.', '24/', '24 3', '24 3/', '.']) {
      expect(readEntry(half, true, 'ft2'), half).toBeTypeOf('string');
      expect(mayBecomeEntry(half, true, 'ft2'), half).toBe(half !== '.');
    }
    for (const none of ['-', '12.', '12.5', 'ten'])
      expect(mayBecomeEntry(none, false, 'ft2'), none).toBe(false);
  });

  it('is shown again as it was typed', () => {
    expect(figureOf({ ...blank, countedAreaMm2: '2299350.24' }, 'ft2')).toBe('24.75');
    expect(figureOf({ ...blank, countedQuantity: 0 }, 'ft2')).toBe('0');
    expect(figureOf(blank, 'ft2')).toBe('');
    expect(countedText(blank, 'ft2')).toBe('not counted');
    expect(countedText({ ...blank, unmeasured: true }, 'ft2')).toBe('hangs there, not measured');
  });
});

describe('what there is to count at a place', () => {
  it('is lots, bins, or both', () => {
    expect(whatLies(1, 0)).toBe('1 lot');
    expect(whatLies(0, 1)).toBe('1 bin');
    expect(whatLies(3, 12)).toBe('3 lots, 12 bins');
  });
});

it('says of what cannot be that it is too many', () => {
  const said = 'That is too many: enter at most 10,000,000.';
  expect(readEntry('9999999999', false, 'ft2')).toBe(said);
  expect(readEntry('123456789', false, 'ft2')).toBe(said);
  expect(readEntry('10000001', false, 'ft2')).toBe(said);
  expect(readEntry('10000000', false, 'ft2')).toEqual({ quantity: 10_000_000 });
});

it('says what moved since it was counted', () => {
  const moved = (movedQuantity: number | null, movedAreaMm2: string | null = null) =>
    movedText({ movedQuantity, movedAreaMm2 }, 'ft2');
  expect(moved(-100)).toBe('100 gone since');
  expect(moved(1200)).toBe('1,200 come since');
  expect(moved(null, '-92903.04')).toBe('1 ft² gone since');
  expect(moved(null)).toBeUndefined();
});

it('says that one difference goes into the ledger, and that two go', () => {
  expect(differencesGo(1, '−2.40 USD')).toBe('1 difference of −2.40 USD goes');
  expect(differencesGo(2, '0.60 USD')).toBe('2 differences of 0.60 USD go');
});
