import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { drawnAreaMm2, soundAreaMm2, soundSide, usualSide } from './drawn-side.ts';

const square = [
  { x: 0, y: 0 },
  { x: 100, y: 0 },
  { x: 100, y: 100 },
  { x: 0, y: 100 },
];

describe('soundSide', () => {
  it('keeps a sound drawing, in whole micrometres', () => {
    const flaw = [
      { x: 10.00049, y: 10 },
      { x: 20, y: 10 },
      { x: 10, y: 20 },
    ];
    const { outline, flaws } = soundSide({ outline: square, flaws: [flaw] });
    expect(outline).toEqual(square);
    expect(flaws[0]?.[0]).toEqual({ x: 10, y: 10 });
  });

  it.each([
    ['outline', { outline: square.slice(0, 2), flaws: [] }, 'at least three corners'],
    ['outline', { outline: [...square.slice(0, 3), { x: NaN, y: 1 }], flaws: [] }, 'within'],
    [
      'flaws.0',
      { outline: square, flaws: [[0, 2, 1, 3].map((at) => square[at] ?? { x: 0, y: 0 })] },
      'crosses itself near x 50, y 50 mm',
    ],
    ['flaws', { outline: square, flaws: Array.from({ length: 61 }, () => square) }, 'at most 60'],
  ])('refuses what is none, naming %s', (field, side, sentence) => {
    expect(() => soundSide(side)).toThrow(expect.objectContaining({ field }));
    expect(() => soundSide(side)).toThrow(sentence);
  });
});

it('starts from a sound side of the area given', () => {
  fc.assert(
    fc.property(fc.double({ min: 1e5, max: 5e6, noNaN: true }), (area) => {
      const outline = usualSide(area);
      expect(drawnAreaMm2(outline) / area).toBeCloseTo(1, 4);
      expect(soundSide({ outline, flaws: [] }).outline).toEqual(outline);
    }),
  );
});

describe('what is sound of a drawn side', () => {
  const box = (x: number, y: number, width: number, height: number) => [
    { x, y },
    { x: x + width, y },
    { x: x + width, y: y + height },
    { x, y: y + height },
  ];
  const outline = box(0, 0, 1000, 1000);

  it('loses a flaw once, however often it is drawn and whichever way round', () => {
    const flaw = box(100, 100, 300, 400);
    const flaws = [flaw, [...flaw].reverse(), box(200, 100, 200, 400)];
    expect(soundAreaMm2({ outline, flaws })).toBeCloseTo(880_000, 3);
    expect(soundAreaMm2({ outline: [...outline].reverse(), flaws })).toBeCloseTo(880_000, 3);
  });

  it('loses nothing to what lies over the edge', () => {
    expect(soundAreaMm2({ outline, flaws: [box(900, 0, 300, 1000)] })).toBeCloseTo(900_000, 3);
    expect(soundAreaMm2({ outline, flaws: [box(1100, 0, 300, 300)] })).toBeCloseTo(1_000_000, 3);
    expect(soundAreaMm2({ outline, flaws: [] })).toBe(1_000_000);
  });
});
