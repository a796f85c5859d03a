import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { outlineBounds } from './measure.ts';
import { anOutline } from './outline.arbitrary.ts';
import type { DrawnPolygon, Outline, Point } from './outline.ts';
import { outlinePolygon } from './polygon.ts';
import { readDrawing } from './read-drawing.ts';
import { safeLine } from './safe-line.ts';
import { templateSvg } from './template.ts';

const coaster: Outline = { shape: 'round', diameterMm: 95 };
const corners = (...pairs: [number, number][]): Point[] => pairs.map(([x, y]) => ({ x, y }));
const strap: DrawnPolygon = {
  shape: 'polygon',
  points: corners([0, 0], [200, 0], [200, 30], [0, 30]),
  punched: [corners([10, 10], [15, 10], [15, 20], [10, 20])],
};
const options = { name: 'Strap', safeMarginMm: 3 };

describe('a template', () => {
  it('read as a drawing again has the outline and its holes at their size, and rulers as long as they say', () => {
    const drawing = readDrawing(templateSvg(strap, options));
    expect(drawing).toMatchObject({ unit: 'mm', needsWidth: false });
    const [cut] = drawing.closed;
    expect([cut?.width, cut?.height]).toEqual([200, 30]);
    const holes = drawing.closed.filter(({ within, width }) => within !== null && width === 5);
    expect(holes.map(({ height }) => height)).toEqual([10]);
    const lengths = drawing.open.map(({ length }) => Math.round(length * 1000) / 1000);
    expect(lengths).toContain(50);
    expect(lengths).toContain(50.8);
  });

  it('is as large in mm as in its own units, whatever the outline', () => {
    fc.assert(
      fc.property(anOutline, (outline) => {
        const svg = templateSvg(outline, options);
        const head = /width="([\d.]+)mm" height="([\d.]+)mm" viewBox="\S+ \S+ (\S+) (\S+)"/.exec(
          svg,
        );
        expect(head?.slice(1, 3)).toEqual(head?.slice(3, 5));
        const { minX, maxX } = outlineBounds(outline);
        const widths = readDrawing(svg).closed.map(({ width }) => width);
        expect(Math.max(...widths)).toBeCloseTo(maxX - minX, 1);
      }),
      { numRuns: 30 },
    );
  });

  it('holds the name as text, whatever is in it', () => {
    const svg = templateSvg(coaster, { ...options, name: '<script>"Tom & Co"</script>' });
    expect(svg).toContain('&lt;script&gt;&quot;Tom &amp; Co&quot;&lt;/script&gt;');
    expect(() => readDrawing(svg)).not.toThrow();
  });
});

describe('the safe line', () => {
  it('of a round is a smaller round', () => {
    const points = safeLine(coaster, 3).flat();
    for (const { x, y } of points) expect(Math.hypot(x, y)).toBeCloseTo(44.5, 1);
    expect(lengthOf(safeLine(coaster, 3))).toBeCloseTo(2 * Math.PI * 44.5, 0);
  });

  it('of a strap has no gaps', () => {
    const { punched: _, ...whole } = strap;
    expect(lengthOf(safeLine(whole, 3))).toBeCloseTo(2 * (194 + 24), 1);
    expect(safeLine(whole, 3).flat().length).toBeLessThan(12);
  });

  it('is none, at once, where an outline is crinkled beyond sense', () => {
    const crinkle = Array.from({ length: 2990 }, (_, at) => ({ x: at % 2 ? 400 : 0, y: at / 10 }));
    const points = [...crinkle, ...corners([600, 299], [600, -5])];
    expect(safeLine({ shape: 'polygon', points }, 3).flat().length).toBeLessThan(20_000);
  });

  it('of a strap goes round its hole', () => {
    const points = safeLine(strap, 3).flat();
    const xs = points.map(({ x }) => x);
    expect(Math.min(...xs)).toBeCloseTo(-97, 6);
    expect(Math.max(...xs)).toBeCloseTo(97, 6);
    expect(points.some(({ x, y }) => Math.abs(x + 87.5) < 2.6 && Math.abs(y - 8) < 0.1)).toBe(true);
  });

  it('keeps its distance from the whole edge', () => {
    fc.assert(
      fc.property(anOutline, fc.integer({ min: 1, max: 9 }), (outline, margin) => {
        const edge = outlinePolygon(outline);
        const apart = safeLine(outline, margin)
          .flat()
          .flatMap((point) => edge.map(({ x, y }) => Math.hypot(x - point.x, y - point.y)));
        const least = apart.reduce((a, b) => Math.min(a, b), Infinity);
        expect(least).toBeGreaterThan(margin - 0.02);
      }),
      { numRuns: 60 },
    );
  });

  it('is none where the outline is too narrow, and must make sense', () => {
    expect(safeLine({ shape: 'oval', widthMm: 50, heightMm: 6 }, 3)).toEqual([]);
    for (const margin of [0, -1, Number.NaN, 101]) {
      expect(() => safeLine(coaster, margin)).toThrow('safe margin');
    }
  });
});

const lengthOf = (lines: Point[][]): number =>
  lines.reduce((sum, line) => {
    const apart = line.slice(1).map((to, at) => {
      const from = line[at] as Point;
      return Math.hypot(to.x - from.x, to.y - from.y);
    });
    return sum + apart.reduce((a, b) => a + b, 0);
  }, 0);
