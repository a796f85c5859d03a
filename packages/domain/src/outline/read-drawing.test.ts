import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { ClosedCurve, DrawingOptions } from './drawing.ts';
import { readDrawing } from './read-drawing.ts';

const svg = (inside: string, head = 'width="200mm" height="100mm" viewBox="0 0 200 100"') =>
  `<?xml version="1.0"?><!-- a drawing --><svg xmlns="http://www.w3.org/2000/svg" ${head}>${inside}</svg>`;

const only = (text: string, options?: DrawingOptions): ClosedCurve => {
  const { closed } = readDrawing(text, options);
  expect(closed).toHaveLength(1);
  return closed[0] as ClosedCurve;
};

const size = ({ width, height }: ClosedCurve) => [
  Math.round(width * 1000) / 1000,
  Math.round(height * 1000) / 1000,
];

describe('the curves of a drawing', () => {
  it.each([
    ['a rectangle', '<rect x="5" y="6" width="80" height="40"/>', 3200, [80, 40]],
    [
      'a rounded one',
      '<rect width="80" height="40" rx="10"/>',
      3200 - (4 - Math.PI) * 100,
      [80, 40],
    ],
    [
      'elliptical corners',
      '<rect width="80" height="40" rx="20" ry="10"/>',
      3200 - (4 - Math.PI) * 200,
      [80, 40],
    ],
    [
      'corners rounder than it is',
      '<rect width="80" height="40" rx="90" ry="90"/>',
      Math.PI * 800,
      [80, 40],
    ],
    ['a circle', '<circle cx="50" cy="50" r="40"/>', Math.PI * 1600, [80, 80]],
    ['an ellipse', '<ellipse cx="50" cy="50" rx="40" ry="10"/>', Math.PI * 400, [80, 20]],
    ['a polygon', '<polygon points="0,0 30,0 30,40"/>', 600, [30, 40]],
    ['a polyline that comes back', '<polyline points="0,0 30,0 30,40 0,0"/>', 600, [30, 40]],
    ['a path', '<path d="M0 0h30v40z"/>', 600, [30, 40]],
    ['relative moves', '<path d="m 10 10 l 30 0 0 40 z"/>', 600, [30, 40]],
    ['arcs', '<path d="M10 50 a40 40 0 0 1 80 0 a40 40 0 0 1-80 0z"/>', Math.PI * 1600, [80, 80]],
    [
      'arcs with their flags run together',
      '<path d="M10 50a40 40 0 0180 0 40 40 0 01-80 0z"/>',
      Math.PI * 1600,
      [80, 80],
    ],
    [
      'an arc too small to reach',
      '<path d="M0 0 A1 1 0 0 1 40 0 Z"/>',
      (Math.PI * 400) / 2,
      [40, 20],
    ],
    // ∫ of a parabola: two thirds of the box around handle and chord, halved.
    ['a quadratic curve', '<path d="M0 0 Q30 60 60 0 Z"/>', (2 / 3) * 60 * 30, [60, 30]],
    // y = 120 t (1 − t) over x = 60 t, integrated.
    ['a cubic curve', '<path d="M0 0 C20 40 40 40 60 0 Z"/>', 1200, [60, 30]],
    ['smooth curves', '<path d="M0 0 Q15 30 30 0 T60 0 V50 H0 Z"/>', 3000, [60, 57.5 + 7.5]],
  ])('are read: %s', (_what, inside, area, [width, height]) => {
    const curve = only(svg(inside));
    // Within the tolerance all the way round.
    expect(Math.abs(curve.area - area)).toBeLessThan(0.01 * curve.edge + 1e-6);
    expect(curve.width).toBeCloseTo(width as number, 1);
    expect(curve.height).toBeCloseTo(height as number, 1);
  });

  it('follow a circle within the stated tolerance', () => {
    const radii = fc.double({ min: 1, max: 400, noNaN: true });
    const tolerances = fc.double({ min: 0.001, max: 1, noNaN: true });
    fc.assert(
      fc.property(radii, tolerances, (r, toleranceMm) => {
        const { points } = only(svg(`<circle r="${r}"/>`), { toleranceMm });
        points.forEach((from, at) => {
          const to = points[(at + 1) % points.length] ?? from;
          expect(Math.hypot(from.x, from.y)).toBeCloseTo(r, 6);
          const sag = r - Math.hypot((from.x + to.x) / 2, (from.y + to.y) / 2);
          expect(sag).toBeLessThanOrEqual(toleranceMm + 1e-9);
        });
      }),
      { numRuns: 50 },
    );
  });

  it('lie where transforms of all groups put them', () => {
    const inside =
      '<g transform="translate(50 20) rotate(90)"><g transform="scale(2,.5)">' +
      '<rect transform="matrix(1 0 0 1 5 4)" width="10" height="8"/></g></g>';
    const { bounds } = only(svg(inside));
    // 20 × 4 at (10, 2), turned by a quarter, then shifted
    expect(bounds.minX).toBeCloseTo(50 - 6, 9);
    expect(bounds.maxX).toBeCloseTo(50 - 2, 9);
    expect(bounds.minY).toBeCloseTo(20 + 10, 9);
    expect(bounds.maxY).toBeCloseTo(20 + 30, 9);
  });

  it('are skewed and turned about a point', () => {
    const skewed = only(svg('<rect transform="skewX(45)" width="10" height="10"/>'));
    expect(skewed.width).toBeCloseTo(20, 9);
    expect(skewed.area).toBeCloseTo(100, 9);
    const turned = only(svg('<rect transform="rotate(180 50 50)" width="10" height="10"/>'));
    expect(turned.bounds.maxX).toBeCloseTo(100, 9);
  });

  it('are copied by use, also from what is only defined', () => {
    const inside =
      '<defs><rect id="a" width="30" height="20"/><g id="b"><use href="#a" x="10"/></g></defs>' +
      '<use xlink:href="#b" transform="scale(2)" y="5"/>';
    expect(only(svg(inside)).bounds).toEqual({ minX: 20, minY: 10, maxX: 80, maxY: 50 });
  });

  it('leave out what is hidden, defined, or clips', () => {
    const hidden =
      '<style>.st0{fill:none} .st1,.st2 { display : none; }</style>' +
      '<defs><circle r="9"/></defs><clipPath><circle r="8"/></clipPath><mask><circle r="7"/></mask>' +
      '<g display="none"><circle r="6"/></g><circle r="5" style="fill:red;display:none"/>' +
      '<circle r="4" class="x st2"/><circle r="3" visibility="hidden"/><metadata><path d="M0 0"/></metadata>' +
      '<circle r="20" class="st0"/>';
    expect(size(only(svg(hidden)))).toEqual([40, 40]);
  });

  it('of a tag are its outline with slot and hole inside, and a line that stays open', () => {
    const inside =
      '<rect id="slot" x="20" y="45" width="4" height="10"/><rect width="110" height="90" x="10" y="5"/>' +
      '<circle cx="100" cy="50" r="3"/><circle cx="100" cy="50" r="1"/><line x1="0" y1="0" x2="3" y2="4"/>' +
      '<text>Room 5</text><rect width="110" height="90" x="10" y="5"/>';
    const { closed, open, likely, leftOut } = readDrawing(svg(inside));
    expect(closed.map(({ id, within }) => [id, within])).toEqual([
      [1, null],
      [0, 1],
      [2, 1],
      [3, 2],
    ]);
    expect(likely).toBe(1);
    expect(open).toMatchObject([{ length: 5, from: { x: 0, y: 0 }, to: { x: 3, y: 4 } }]);
    expect(leftOut).toEqual([
      'Lettering is left out: turn it into curves if it is to be cut.',
      '1 curve is drawn twice, and kept once.',
    ]);
  });

  it('leave out a background measured in per cent', () => {
    const { closed, leftOut } = readDrawing(
      svg('<rect width="100%" height="100%"/><rect width="9" height="9"/>'),
    );
    expect(closed).toHaveLength(1);
    expect(leftOut).toEqual(['What is measured in per cent, as a background is, is left out.']);
  });

  it('have their area times the determinant under any transform', () => {
    const number = fc.integer({ min: -40, max: 40 }).map((tenths) => tenths / 10);
    fc.assert(
      fc.property(fc.tuple(number, number, number, number, number, number), (matrix) => {
        const [a, b, c, d] = matrix;
        const times = Math.abs(a * d - b * c);
        fc.pre(times > 0.05);
        const inside = `<g transform="matrix(${matrix.join(' ')})"><circle cx="3" cy="9" r="5"/></g>`;
        const { area, edge } = only(svg(inside));
        expect(Math.abs(area - times * Math.PI * 25)).toBeLessThan(0.01 * edge);
      }),
    );
  });

  it('saved in pieces are joined where exactly two ends meet', () => {
    const pieces =
      '<line x1="0" y1="0" x2="40" y2="0"/><line x1="40" y1="20" x2="40" y2="0.004"/>' +
      '<path d="M0 20 L0 0"/><path d="M0 20 L40 20"/><path d="M60 0 L80 0 L80 9"/>';
    const { closed, open } = readDrawing(svg(pieces));
    expect(closed).toHaveLength(1);
    expect(closed[0]?.area).toBeCloseTo(800, 0);
    expect(open.map(({ length }) => length)).toEqual([29]);
    const knot = '<path d="M0 0 L10 0"/><path d="M10 0 L20 0"/><path d="M10 0 L10 10"/>';
    expect(readDrawing(svg(knot)).open).toHaveLength(3);
  });
});

describe('the size of a drawing', () => {
  const square = '<rect width="96" height="96"/>';
  it.each([
    ['mm', 'width="96mm" height="96mm" viewBox="0 0 96 96"', 96],
    ['cm', 'width="9.6cm" height="9.6cm" viewBox="0 0 96 96"', 96],
    ['in', 'width="2in" height="2in" viewBox="0 0 96 96"', 50.8],
    ['pt', 'width="72pt" height="72pt" viewBox="0 0 96 96"', 25.4],
    ['px', 'width="96px" height="96px" viewBox="0 0 96 96"', 25.4],
    ['mm without a viewBox, where user units are px', 'width="96mm" height="96mm"', 25.4],
    ['a height alone', 'height="50mm" viewBox="0 0 192 96"', 50],
    [
      'the narrower side, where the shapes differ',
      'width="96mm" height="500mm" viewBox="0 0 96 96"',
      96,
    ],
  ])('is told in %s', (_what, head, mm) => {
    const { needsWidth, unit } = readDrawing(svg(square, head));
    expect({ needsWidth, unit }).toEqual({ needsWidth: false, unit: 'mm' });
    expect(only(svg(square, head)).width).toBeCloseTo(mm, 6);
  });

  it.each(['', 'viewBox="0 0 96 96"', 'width="100%" height="100%"', 'width="96" height="96"'])(
    'is asked for where the file says no unit (%s)',
    (head) => {
      const text = svg(`${square}<circle cx="48" cy="48" r="24"/>`, head);
      const drawing = readDrawing(text);
      expect(drawing).toMatchObject({ needsWidth: true, unit: 'drawing units' });
      expect(drawing.closed[0]?.width).toBeCloseTo(96, 9);
      const known = readDrawing(text, { known: { widthMm: 40 } });
      expect(known).toMatchObject({ needsWidth: false, unit: 'mm', tolerance: 0.01 });
      expect(known.closed.map(({ width }) => Math.round(width * 1e6) / 1e6)).toEqual([40, 20]);
      const byHole = readDrawing(text, { known: { widthMm: 40, curve: 1 } });
      expect(byHole.closed[0]?.width).toBeCloseTo(80, 6);
    },
  );

  it('is stretched where preserveAspectRatio says so, and scaled once for an inner svg', () => {
    const head = 'width="100mm" height="30mm" viewBox="0 0 96 96" preserveAspectRatio="none"';
    expect(size(only(svg(square, head)))).toEqual([100, 30]);
    const inner = `<svg x="10" y="20" width="48" height="48" viewBox="0 0 96 96">${square}</svg>`;
    expect(only(svg(inner)).bounds).toEqual({ minX: 10, minY: 20, maxX: 58, maxY: 68 });
  });

  it('must make sense where it is told', () => {
    const text = svg(square, '');
    for (const widthMm of [0, -5, Number.NaN, 6000]) {
      expect(() => readDrawing(text, { known: { widthMm } })).toThrow(
        expect.objectContaining({ field: 'widthMm' }),
      );
    }
    expect(() => readDrawing(text, { known: { widthMm: 40, curve: 7 } })).toThrow('closed curve');
  });
});

describe('a drawing is refused', () => {
  const entity = '<!DOCTYPE svg [<!ENTITY a "aaaaaaaaaa"><!ENTITY b "&a;&a;&a;&a;">]>';
  it.each([
    ['with a script', svg('<script>alert(1)</script>'), 'holds a script'],
    ['with a script of another kind', svg('<svg:script href="#a"/>'), 'holds a script'],
    [
      'with an event',
      svg('<rect width="9" height="9" onclick="x()"/>'),
      'holds a script (onclick)',
    ],
    ['with a picture', svg('<image href="data:image/png;base64,AAAA"/>'), 'holds a picture'],
    ['with a remote use', svg('<use href="https://example.com/a.svg#b"/>'), 'outside the file'],
    ['with a link', svg('<a xlink:href="javascript:alert(1)"><rect/></a>'), 'outside the file'],
    ['with a remote style', svg('<style>@import "a.css";</style>'), 'outside the file'],
    ['with a remote fill', svg('<rect fill="url(https://example.com/a)"/>'), 'outside the file'],
    ['with a remote font', svg('<style>a{src:url("b.woff")}</style>'), 'outside the file'],
    ['with a style sheet', `<?xml-stylesheet href="a.css"?>${svg('')}`, 'outside the file'],
    ['with entities', `${entity}${svg('<text>&b;</text>')}`, 'document type or entities on line 1'],
    ['that is not SVG', '<html></html>', 'not an SVG drawing'],
    ['that is empty', '', 'not an SVG drawing'],
    ['that is no drawing at all', 'PK\u0003\u0004 and so on < >', 'cannot be read from line 1'],
    ['that breaks off', svg('').slice(0, -6) + '<g>\n<rect', 'cannot be read from line 2'],
    ['that is not closed', svg('').slice(0, -6) + '<g>', 'before its <g> is closed'],
    ['closed the wrong way round', svg('<g></svg>'), 'cannot be read from line 1'],
    ['with a path that says nothing', svg('<path d="M0 0 L oops"/>'), 'A path cannot be read'],
    [
      'with points that are no numbers',
      svg('<polygon points="0,0 NaN,3 4,4"/>'),
      'points of a polygon',
    ],
    ['with a transform of its own', svg('<rect transform="spin(3)"/>'), 'transform “spin(3)”'],
    ['with a radius that is no number', svg('<circle r="wide"/>'), 'r of a circle cannot be read'],
    [
      'that leads to infinity',
      svg('<path d="M0 0 L1e308 1e308 L5e307 0z" transform="scale(1e9)"/>'),
      'beyond all measure',
    ],
    ['that is larger than 5 MB', svg(' '.repeat(5_000_001)), 'larger than 5 MB'],
    [
      'of 100,001 corners',
      svg(`<path d="M0 0${' l1 0 0 1'.repeat(51_000)}z"/>`),
      'more than 100,000 corners',
    ],
    [
      'of 3,000 curves',
      svg(
        '<rect width="5" height="5"/>'.replaceAll('5"', '5"').repeat(1) +
          Array.from({ length: 3000 }, (_, i) => `<circle cx="${i}" r="0.4"/>`).join(''),
      ),
      'more than 2,000 curves',
    ],
    ['of too many elements', svg('<g/>'.repeat(50_001)), 'more than 50000 elements'],
    ['nested too deeply', svg('<g>'.repeat(200) + '</g>'.repeat(200)), 'nested too deeply'],
    [
      'that copies itself',
      svg('<g id="a"><rect width="9" height="9"/><use href="#a"/></g>'),
      'repeats its parts too often',
    ],
    ['that copies copies of copies', svg(multiplied()), 'repeats its parts too often'],
  ])('%s', (_what, text, sentence) => {
    expect(() => readDrawing(text)).toThrow(expect.objectContaining({ field: 'drawing' }));
    expect(() => readDrawing(text)).toThrow(sentence);
  });

  // Quadratic reading of these would take hours: the limit is for hangs only.
  it('and is never read for long, whatever is in it', { timeout: 60_000 }, () => {
    const long = 2_000_000;
    for (const text of [
      svg(`<path d="${'M'.repeat(long)}"/>`),
      svg(`<rect width="${'1'.repeat(long)}"/>`),
      svg(`<rect transform="${'a'.repeat(long)}"/>`),
      svg(`<rect${' '.repeat(long)}`),
      svg(`<rect ${'a'.repeat(long)}`),
      svg(`<style>${'{'.repeat(long)}</style>`),
      svg(`<style>a{${' '.repeat(long)}</style>`),
      svg(`<rect style="${';'.repeat(long)}"/>`),
      svg(`<rect fill="${'url('.repeat(long / 4)}"/>`),
      svg(`<rect fill="url(${' '.repeat(long)}"/>`),
      svg(`<text>${'&'.repeat(long)}</text>`),
      svg(`<rect class="${'& '.repeat(long / 2)}"/>`),
      '<'.repeat(long),
    ]) {
      expect(outcomeOf(text)).toBeDefined();
    }
  });
});

function outcomeOf(text: string): unknown {
  try {
    return readDrawing(text);
  } catch (error) {
    return error;
  }
}

/** Ten copies of ten copies, nine deep. */
function multiplied(): string {
  const level = (depth: number): string =>
    `<g id="l${depth}">${`<use href="#l${depth - 1}"/>`.repeat(10)}</g>`;
  const levels = Array.from({ length: 9 }, (_, at) => level(at + 1)).join('');
  return `<defs><rect id="l0" width="1" height="1"/>${levels}</defs><use href="#l9"/>`;
}
