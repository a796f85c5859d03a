import { describe, expect, it } from 'vitest';
import { cuttingEdgeMm, outlineArea, outlineBounds } from './measure.ts';
import { holesWithin, outlineFromDrawing } from './outline-from-drawing.ts';
import { readDrawing } from './read-drawing.ts';

const drawing = readDrawing(
  '<svg width="200mm" height="100mm" viewBox="0 0 200 100">' +
    '<rect x="10" y="5" width="110" height="90" rx="8"/>' +
    '<rect x="20" y="45" width="4" height="10"/><circle cx="100" cy="50" r="3"/>' +
    '<circle cx="100" cy="50" r="1"/><rect x="150" y="5" width="40" height="40"/></svg>',
);

describe('the outline chosen in a drawing', () => {
  it('is the curve with the holes kept, about the origin', () => {
    expect(holesWithin(drawing, 0).map(({ id }) => id)).toEqual([1, 2, 3]);
    const outline = outlineFromDrawing(drawing, 0, [1]);
    expect(outlineArea(outline)).toBeCloseTo(110 * 90 - (4 - Math.PI) * 64, 0);
    expect(cuttingEdgeMm(outline)).toBeCloseTo(400 - 64 + 16 * Math.PI + 28, 1);
    expect(outlineBounds(outline)).toEqual({ minX: -55, minY: -45, maxX: 55, maxY: 45 });
    expect(outline.punched?.[0]).toContainEqual({ x: -45, y: -5 });
    expect(outlineFromDrawing(drawing, 4)).toEqual({
      shape: 'polygon',
      points: [
        { x: -20, y: -20 },
        { x: 20, y: -20 },
        { x: 20, y: 20 },
        { x: -20, y: 20 },
      ],
    });
  });

  it('keeps only holes that lie in it, and none within another', () => {
    expect(() => outlineFromDrawing(drawing, 0, [4])).toThrow('lie in the chosen curve');
    expect(outlineFromDrawing(drawing, 0, [3]).punched).toHaveLength(1);
    expect(() => outlineFromDrawing(drawing, 0, [2, 3])).toThrow('lies within hole 1');
    expect(() => outlineFromDrawing(drawing, 9)).toThrow(
      expect.objectContaining({ field: 'curve' }),
    );
  });

  it('needs a size', () => {
    const text = '<svg><rect width="30" height="20"/></svg>';
    expect(() => outlineFromDrawing(readDrawing(text), 0)).toThrow('Write how wide the piece is');
    const known = readDrawing(text, { known: { widthMm: 60 } });
    expect(outlineArea(outlineFromDrawing(known, 0))).toBeCloseTo(2400, 3);
  });

  it('leaves out corners in a straight line and lines that double back', () => {
    const text =
      '<svg width="99mm" viewBox="0 0 99 99"><path d="M0 0 L10 0 L30 0 L60 0 L40 0 L40 10 L40 30 L0 30z"/></svg>';
    expect(outlineFromDrawing(readDrawing(text), 0).points).toHaveLength(4);
  });

  it('names the place in the drawing where it crosses itself', () => {
    const text =
      '<svg width="99mm" viewBox="0 0 99 99"><path d="M10 10 L50 40 L50 10 L10 40z"/></svg>';
    expect(() => outlineFromDrawing(readDrawing(text), 0)).toThrow(
      'The outline crosses itself near x 30.0, y 25.0 mm.',
    );
  });
});
