import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { packRectangles, type PlacedRectangle, type RectangleSize } from './rectangles.ts';

const tenths = (min: number, max: number) =>
  fc.integer({ min: min * 10, max: max * 10 }).map((value) => value / 10);
const aSize = (min: number, max: number) =>
  fc.record({ width: tenths(min, max), height: tenths(min, max) });

interface Box {
  left: number;
  right: number;
  low: number;
  high: number;
}

function boxOf({ width, height }: RectangleSize, { x, y, turned }: PlacedRectangle): Box {
  const [wide, tall] = turned ? [height, width] : [width, height];
  return { left: x, right: x + wide, low: y, high: y + tall };
}

/** The least distance of two pieces along an axis, below zero where they overlap. */
function leastGap(boxes: Box[]): number {
  let least = Infinity;
  boxes.forEach((a, at) => {
    for (const b of boxes.slice(at + 1)) {
      const apart = Math.max(a.left - b.right, b.left - a.right, a.low - b.high, b.low - a.high);
      least = Math.min(least, apart);
    }
  });
  return least;
}

describe('rectangles in a rectangle', { timeout: 120_000 }, () => {
  it('lie inside, keep their gap, and are no more than the bound', () => {
    fc.assert(
      fc.property(aSize(30, 400), aSize(10, 120), tenths(0, 5), (container, piece, gap) => {
        const { pieces, bound } = packRectangles(container, piece, { gap, steps: 20_000 });
        const boxes = pieces.map((each) => boxOf(piece, each));
        for (const { left, right, low, high } of boxes) {
          expect(Math.min(left, low)).toBeGreaterThanOrEqual(0);
          expect(right).toBeLessThan(container.width + 1e-5);
          expect(high).toBeLessThan(container.height + 1e-5);
        }
        expect(leastGap(boxes)).toBeGreaterThan(gap - 1e-6);
        expect(pieces.length).toBeLessThanOrEqual(bound);
        const area = (piece.width + gap) * (piece.height + gap);
        const room = (container.width + gap) * (container.height + gap);
        expect(bound).toBeLessThanOrEqual(room / area + 1e-6);
      }),
      { numRuns: 150 },
    );
  });

  it('are at least as many as lie the same way, and the same each time', () => {
    fc.assert(
      fc.property(aSize(30, 300), aSize(10, 90), (container, piece) => {
        const once = packRectangles(container, piece, { steps: 5000 });
        const { width, height } = container;
        const lying = Math.floor(width / piece.width) * Math.floor(height / piece.height);
        const standing = Math.floor(width / piece.height) * Math.floor(height / piece.width);
        expect(once.pieces.length).toBeGreaterThanOrEqual(Math.max(lying, standing));
        expect(packRectangles(container, piece, { steps: 5000 })).toEqual(once);
      }),
      { numRuns: 60 },
    );
  });

  it('are as many when container or piece is turned', () => {
    const turned = ({ width, height }: RectangleSize) => ({ width: height, height: width });
    fc.assert(
      fc.property(aSize(30, 200), aSize(20, 90), (container, piece) => {
        const count = packRectangles(container, piece).pieces.length;
        expect(packRectangles(turned(container), piece).pieces).toHaveLength(count);
        expect(packRectangles(container, turned(piece)).pieces).toHaveLength(count);
      }),
      { numRuns: 20 },
    );
  });

  // The pinwheel: two lying and two standing around an empty middle.
  it('turn around an empty middle where that gives one more', () => {
    const { pieces, bound } = packRectangles({ width: 50, height: 50 }, { width: 30, height: 20 });
    expect([pieces.length, bound]).toEqual([4, 4]);
    expect(pieces.filter(({ turned }) => turned)).toHaveLength(2);
  });

  it('need the gap only between them', () => {
    const piece = { width: 30, height: 20 };
    const at = (width: number) => packRectangles({ width, height: 20 }, piece, { gap: 2.5 });
    expect(at(94.9).pieces).toHaveLength(2);
    expect(at(95).pieces).toEqual([
      { x: 0, y: 0, turned: false },
      { x: 32.5, y: 0, turned: false },
      { x: 65, y: 0, turned: false },
    ]);
  });

  it('are honestly none where none fits', () => {
    expect(packRectangles({ width: 20, height: 20 }, { width: 30, height: 5 })).toEqual({
      pieces: [],
      bound: 0,
    });
  });

  it.each([
    ['width', { width: 0, height: 5 }, { width: 3, height: 3 }, 0],
    ['height', { width: 5, height: Number.NaN }, { width: 3, height: 3 }, 0],
    ['pieceWidth', { width: 5, height: 5 }, { width: -3, height: 3 }, 0],
    ['pieceHeight', { width: 5, height: 5 }, { width: 3, height: Infinity }, 0],
    ['gap', { width: 5, height: 5 }, { width: 3, height: 3 }, -1],
  ])('are refused for a %s that makes no sense', (field, container, piece, gap) => {
    expect(() => packRectangles(container, piece, { gap })).toThrow(
      expect.objectContaining({ field }),
    );
  });

  it('are refused beyond 20,000', () => {
    const huge = () => packRectangles({ width: 5000, height: 5000 }, { width: 3, height: 2 });
    expect(huge).toThrow('work out a smaller panel');
  });
});
