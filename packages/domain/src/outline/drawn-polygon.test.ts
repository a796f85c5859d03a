import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { layOut } from '../yield/lay-out.ts';
import { layoutFaults } from '../yield/layout-faults.ts';
import { findCrossing } from './crossing.ts';
import { checkOutline } from './check-outline.ts';
import { describeOutline } from './describe-outline.ts';
import { cuttingEdgeMm, isSameHalfTurned, outlineArea, outlineBounds } from './measure.ts';
import { star } from './outline.arbitrary.ts';
import type { DrawnPolygon, Point } from './outline.ts';
import { outlinePath } from './outline-path.ts';
import { outlinePolygon } from './polygon.ts';

const at = (...pairs: [number, number][]): Point[] => pairs.map(([x, y]) => ({ x, y }));
const drawn = (points: Point[], punched?: Point[][]): DrawnPolygon => ({
  shape: 'polygon',
  points,
  punched,
});
const box = (x: number, y: number, width: number, height: number): Point[] =>
  at([x, y], [x + width, y], [x + width, y + height], [x, y + height]);
const ell = drawn(at([100, 50], [140, 50], [140, 60], [110, 60], [110, 80], [100, 80]));
const strap = drawn(box(10, 10, 60, 20), [box(15, 15, 5, 10), box(60, 15, 5, 10).reverse()]);

describe('a drawn polygon', () => {
  it('has the area, edge and box of its corners, about the origin', () => {
    expect(outlineArea(ell)).toBeCloseTo(40 * 10 + 10 * 20, 9);
    expect(cuttingEdgeMm(ell)).toBeCloseTo(2 * (40 + 30), 9);
    expect(outlineBounds(ell)).toEqual({ minX: -20, minY: -15, maxX: 20, maxY: 15 });
    expect(outlinePolygon(ell)[0]).toEqual({ x: -20, y: -15 });
  });

  it('counts its holes in the cutting edge, not in the area, and draws them the other way round', () => {
    expect(outlineArea(strap)).toBeCloseTo(1200, 9);
    expect(cuttingEdgeMm(strap)).toBeCloseTo(160 + 2 * 30, 9);
    expect(outlinePolygon(strap)).toHaveLength(4);
    expect(describeOutline(strap)).toBe('drawn, 60 × 20 mm, 2 holes punched');
    expect(describeOutline(ell)).toBe('drawn, 40 × 30 mm');
    expect(outlinePath(strap)).toBe(
      'M -30 -10 L 30 -10 L 30 10 L -30 10 Z ' +
        'M -25 5 L -20 5 L -20 -5 L -25 -5 Z M 20 5 L 25 5 L 25 -5 L 20 -5 Z',
    );
  });

  it('may be given either way round, anywhere', () => {
    const turned = drawn([...ell.points].reverse().map(({ x, y }) => ({ x: x + 7, y: y - 900 })));
    expect(outlineArea(turned)).toBeCloseTo(outlineArea(ell), 9);
    expect(new Set(outlinePolygon(turned).map(String))).toEqual(
      new Set(outlinePolygon(ell).map(String)),
    );
  });

  it('knows whether half a turn changes it', () => {
    expect(isSameHalfTurned(strap)).toBe(true);
    expect(isSameHalfTurned(ell)).toBe(false);
    expect(isSameHalfTurned(drawn(at([0, 0], [30, 0], [40, 20], [10, 20])))).toBe(true);
  });

  it('is laid out without a fault, holes left out of account', () => {
    const container = { form: 'panel' as const, widthMm: 300, heightMm: 200 };
    for (const outline of [ell, strap]) {
      const input = { outline, spacingMm: 2, trimMm: 3, container };
      const layout = layOut(input);
      expect(layoutFaults(input, layout)).toEqual([]);
      expect(layout.pieces).toBeGreaterThan(30);
    }
  });
});

describe('a polygon that no die can cut', () => {
  it.each([
    [
      'crosses itself',
      at([0, 0], [40, 30], [40, 0], [0, 30]),
      'crosses itself near x 20.0, y 15.0 mm',
    ],
    [
      'touches itself',
      at([0, 0], [40, 0], [40, 40], [20, 0], [0, 40]),
      'touches itself near x 20.0, y 0.0 mm',
    ],
    [
      'doubles back',
      at([0, 0], [40, 0], [40, 40], [40, 10], [0, 10]),
      'touches itself near x 40.0',
    ],
    ['has two corners', at([0, 0], [40, 0]), 'at least three corners'],
    ['has no area', at([0, 0], [40, 0], [20, 0]), 'encloses almost nothing'],
    [
      'is smaller than a millimetre',
      box(3, 4, 0.9, 20),
      'near x 3.0, y 4.0 mm encloses almost nothing',
    ],
    ['is larger than 5 m', box(0, 0, 20, 5001), 'at most 5000 mm'],
    [
      'has a corner that is no number',
      at([0, 0], [Number.NaN, 0], [9, 9]),
      'Corner 2 of the outline',
    ],
    ['has a corner at infinity', at([0, 0], [9, Infinity], [9, 9]), 'Corner 2 of the outline'],
    ['has 100,000 corners', star(Array.from({ length: 100_000 }, () => 50)), 'has 100000 corners'],
  ])('because it %s', (_what, points, sentence) => {
    const check = () => checkOutline(drawn(points));
    expect(check).toThrow(expect.objectContaining({ field: 'points' }));
    expect(check).toThrow(sentence);
  });

  it.each([
    ['lies outside', [box(200, 10, 5, 5)], 'Hole 1 near x 200.0, y 10.0 mm lies outside'],
    ['crosses the edge', [box(68, 12, 5, 5)], 'The hole 1 crosses the outline near x 70.0'],
    ['touches the edge', [box(65, 12, 5, 5)], 'The hole 1 touches the outline near x 70.0'],
    [
      'crosses another',
      [box(20, 12, 5, 5), box(22, 14, 5, 5)],
      'The hole 2 crosses the hole 1 near',
    ],
    [
      'lies in another',
      [box(20, 12, 9, 9), box(22, 14, 2, 2)],
      'Hole 2 near x 22.0, y 14.0 mm lies within hole 1',
    ],
    [
      'is a pinprick',
      [box(20, 12, 0.1, 0.1)],
      'The hole 1 near x 20.0, y 12.0 mm encloses almost nothing',
    ],
  ])('because a hole %s', (_what, punched, sentence) => {
    const check = () => checkOutline(drawn(box(10, 10, 60, 20), punched));
    expect(check).toThrow(expect.objectContaining({ field: 'punched' }));
    expect(check).toThrow(sentence);
  });

  it('is told from a sound one as by looking at every pair of its sides', () => {
    const corner = fc.record({ x: fc.nat(9), y: fc.nat(9) });
    fc.assert(
      fc.property(fc.uniqueArray(corner, { minLength: 3, maxLength: 7, selector }), (points) => {
        expect(findCrossing([points]) === null).toBe(isSimple(points));
      }),
      { numRuns: 2000 },
    );
  });
});

const selector = ({ x, y }: Point) => `${x} ${y}`;

/** Every two sides have no place in common but the corner between neighbours; places by solving for both shares. */
function isSimple(points: Point[]): boolean {
  const sides = points.map((from, at) => [from, points[(at + 1) % points.length]] as const);
  return sides.every(([a, b], i) =>
    sides.every(([c, d], j) => {
      if (i >= j || !b || !d) return true;
      const shared = [a, b].filter((point) => point === c || point === d);
      return commonPlaces(a, b, c, d) <= shared.length;
    }),
  );
}

/** 0, 1 or 2 (a whole stretch). */
function commonPlaces(a: Point, b: Point, c: Point, d: Point): number {
  const [ux, uy, vx, vy] = [b.x - a.x, b.y - a.y, d.x - c.x, d.y - c.y];
  const [wx, wy] = [c.x - a.x, c.y - a.y];
  const det = ux * vy - uy * vx;
  if (det !== 0) {
    const [s, t] = [(wx * vy - wy * vx) / det, (wx * uy - wy * ux) / det];
    return s >= 0 && s <= 1 && t >= 0 && t <= 1 ? 1 : 0;
  }
  if (wx * uy - wy * ux !== 0) return 0;
  const along = (p: Point) => ((p.x - a.x) * ux + (p.y - a.y) * uy) / (ux * ux + uy * uy);
  const [from, to] = [along(c), along(d)].sort((p, q) => p - q) as [number, number];
  if (to < 0 || from > 1) return 0;
  return to === 0 || from === 1 ? 1 : 2;
}
