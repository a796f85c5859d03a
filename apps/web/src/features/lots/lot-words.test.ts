import { describe, expect, it } from 'vitest';
import { depthOf, formText } from './lot-words.ts';

describe('the form of a lot', () => {
  it('is a word, or how many of what size', () => {
    expect(formText({ form: 'side', pieces: 1, widthMm: null, heightMm: null }, 'in')).toBe('side');
    const bundle = { form: 'panel', pieces: 12, widthMm: '279.4', heightMm: '330.2' } as const;
    expect(formText(bundle, 'in')).toBe('12 panels, 11 × 13 in');
    expect(formText({ ...bundle, form: 'belly', heightMm: null }, 'in')).toBe('12 bellies');
  });
});

describe('how deep a lot lies in its family', () => {
  it('counts the cuts back to the one that came in', () => {
    const lots = [
      { lotId: 1, parentId: null },
      { lotId: 2, parentId: 1 },
      { lotId: 3, parentId: 2 },
    ];
    expect(lots.map(({ lotId }) => depthOf(lots, lotId))).toEqual([0, 1, 2]);
  });
});
