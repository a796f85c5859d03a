import { describe, expect, it } from 'vitest';
import { askFor, plainGrids } from './label-choice.ts';

describe('a sheet of tags', () => {
  it('can be printed on every plain grid', () => {
    for (const { measures } of plainGrids)
      expect(askFor([3, 4], [1], measures)).toMatchObject({
        query: { lots: '3,4', hardware: '1' },
      });
  });

  it('says what must change first', () => {
    const [{ measures } = { measures: {} as never }] = plainGrids;
    expect(askFor([], [], measures)).toEqual({ wrong: 'Choose at least one lot or bin.' });
    expect(askFor([1], [], { ...measures, widthMm: 'wide' })).toEqual({
      wrong: 'Enter the width of a label in mm.',
    });
    expect(askFor([1], [], { ...measures, columns: '4' })).toMatchObject({
      wrong: expect.stringContaining('the sheet has 210 mm'),
    });
  });
});
