import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { checkOutline } from './check-outline.ts';
import { describeOutline } from './describe-outline.ts';
import { cuttingEdgeMm, outlineArea, outlineBounds } from './measure.ts';
import { anOutline } from './outline.arbitrary.ts';
import type { Outline, Point } from './outline.ts';
import { outlinePath } from './outline-path.ts';
import { outlinePolygon } from './polygon.ts';

const tag: Outline = {
  shape: 'tag',
  lengthMm: 110,
  widthMm: 60,
  neckLengthMm: 30,
  neckWidthMm: 22,
  cornerRadiusMm: 8,
};

function shoelace(polygon: Point[]): number {
  return polygon.reduce((sum, from, at) => {
    const to = polygon[(at + 1) % polygon.length] as Point;
    return sum + (from.x * to.y - to.x * from.y) / 2;
  }, 0);
}

function perimeter(polygon: Point[]): number {
  return polygon.reduce((sum, from, at) => {
    const to = polygon[(at + 1) % polygon.length] as Point;
    return sum + Math.hypot(to.x - from.x, to.y - from.y);
  }, 0);
}

describe('the polygon of an outline', { timeout: 60_000 }, () => {
  it('is counter-clockwise, has nearly the area and edge of the curve, and its box', () => {
    fc.assert(
      fc.property(anOutline, (outline) => {
        const polygon = outlinePolygon(outline);
        const edge = cuttingEdgeMm(outline);
        expect(Math.abs(shoelace(polygon) - outlineArea(outline))).toBeLessThan(edge * 0.011);
        expect(perimeter(polygon)).toBeGreaterThan(edge * 0.995);
        expect(perimeter(polygon)).toBeLessThan(edge + 0.1);
        const { minX, minY, maxX, maxY } = outlineBounds(outline);
        expect(Math.min(...polygon.map(({ x }) => x))).toBeCloseTo(minX, 2);
        expect(Math.max(...polygon.map(({ y }) => y))).toBeCloseTo(maxY, 2);
        // A drawn polygon is moved by whole micrometres.
        expect(Math.abs(minX + maxX)).toBeLessThan(0.0011);
        expect(Math.abs(minY + maxY)).toBeLessThan(0.0011);
      }),
    );
  });

  it('has whole micrometres and no point twice in a row', () => {
    fc.assert(
      fc.property(anOutline, (outline) => {
        const polygon = outlinePolygon(outline);
        polygon.forEach((point, at) => {
          expect(Math.round(point.x * 1000) / 1000).toBe(point.x);
          expect(point).not.toEqual(polygon[(at + 1) % polygon.length]);
        });
      }),
    );
  });
});

describe('measures', () => {
  it('are those of the textbook', () => {
    expect(outlineArea({ shape: 'round', diameterMm: 95 })).toBeCloseTo((Math.PI * 95 * 95) / 4, 9);
    expect(cuttingEdgeMm({ shape: 'round', diameterMm: 95 })).toBeCloseTo(Math.PI * 95, 9);
    const rectangle: Outline = {
      shape: 'rectangle',
      widthMm: 80,
      heightMm: 50,
      cornerRadiusMm: 10,
    };
    expect(outlineArea(rectangle)).toBeCloseTo(4000 - (4 - Math.PI) * 100, 9);
    expect(cuttingEdgeMm(rectangle)).toBeCloseTo(260 - 80 + 20 * Math.PI, 9);
    expect(outlineArea({ shape: 'oval', widthMm: 60, heightMm: 90 })).toBeCloseTo(
      Math.PI * 1350,
      9,
    );
  });

  it('of a sharp tag are those of body, shoulder and neck', () => {
    const sharp: Outline = { ...tag, cornerRadiusMm: 0 };
    // body 61 × 60, shoulder (45°) 19 long from 60 to 22, neck 30 × 22
    expect(outlineArea(sharp)).toBeCloseTo(61 * 60 + (19 * (60 + 22)) / 2 + 30 * 22, 9);
  });
});

describe('checkOutline', () => {
  it.each([
    ['diameterMm', { shape: 'round', diameterMm: 0 }],
    ['diameterMm', { shape: 'round', diameterMm: Number.NaN }],
    ['heightMm', { shape: 'oval', widthMm: 5, heightMm: 6000 }],
    ['cornerRadiusMm', { shape: 'rectangle', widthMm: 50, heightMm: 20, cornerRadiusMm: 10.5 }],
    ['cornerRadiusMm', { shape: 'rectangle', widthMm: 50, heightMm: 20, cornerRadiusMm: -1 }],
    ['neckWidthMm', { ...tag, neckWidthMm: 60 }],
    ['neckLengthMm', { ...tag, neckLengthMm: 110 }],
    ['cornerRadiusMm', { ...tag, cornerRadiusMm: 31 }],
    ['shape', { shape: 'star' }],
  ])('names %s', (field, outline) => {
    expect(() => checkOutline(outline as Outline)).toThrow(expect.objectContaining({ field }));
  });
});

describe('outlines in words and pictures', () => {
  it('says what it is', () => {
    expect(describeOutline({ shape: 'round', diameterMm: 95 })).toBe('round, 95 mm');
    expect(describeOutline(tag)).toBe('tag, 110 × 60 mm, neck 30 × 22 mm');
  });

  it('draws a closed path', () => {
    expect(outlinePath({ shape: 'round', diameterMm: 95 })).toBe(
      'M 47.5 0 A 47.5 47.5 0 0 1 -47.5 0 A 47.5 47.5 0 0 1 47.5 0 Z',
    );
    fc.assert(
      fc.property(anOutline, (outline) => {
        expect(outlinePath(outline)).toMatch(/^M [-\d.]+ [-\d.]+( [LA]( [-\d.]+)+)+ Z$/);
      }),
    );
  });
});
