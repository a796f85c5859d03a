import { planRegular, type NestProblem } from '@hidewright/domain';
import { describe, expect, it } from 'vitest';

type Corner = [x: number, y: number];
const ringOf = (corners: readonly Corner[]) => corners.map(([x, y]) => ({ x, y }));

const regular = (corners: number, radius: number) =>
  Array.from({ length: corners }, (_, at) => ({
    x: radius * Math.cos((2 * Math.PI * at) / corners),
    y: radius * Math.sin((2 * Math.PI * at) / corners),
  }));

function plan(outline: NestProblem['outline'], w: number, h: number, turns: number[] = [0, 180]) {
  return planRegular({ outline, container: { type: 'rect', w, h }, gap: 0, rotations: turns });
}

describe('the densest double lattice', () => {
  // G. Kuperberg & W. Kuperberg, "Double-lattice packings of convex bodies in the plane", Discrete &
  // Computational Geometry 5 (1990) 389–397: area over twice the least extensive parallelogram; the
  // pentagon's is the densest of all packings (Hales & Kusner, arXiv 1602.07220). Recomputed.
  it.each([
    [3, 1],
    [4, 1],
    [5, (5 - Math.sqrt(5)) / 3],
    [6, 1],
    [7, 0.892690686],
    [8, (4 + 4 * Math.SQRT2) / (5 + 4 * Math.SQRT2)],
    [9, 0.901030078],
    [10, 0.913719988],
    [12, 0.92820323],
    [15, 0.90471736],
  ])('of a regular %i-gon covers %d of the plane', (corners, density) => {
    const found = plan(regular(corners, 20), 200, 200).planeDensity;
    expect(found / density).toBeGreaterThan(0.9999);
    expect(found / density).toBeLessThan(1.000001);
  });

  // Any triangle and any quadrilateral tiles by half turns about the middles of its sides
  // (Grünbaum & Shephard, Tilings and Patterns, 1987, §1, from memory); so does the house.
  it.each<[string, Corner[]]>([
    [
      'a scalene triangle',
      [
        [0, 0],
        [70, 10],
        [20, 55],
      ],
    ],
    [
      'a quadrilateral',
      [
        [0, 0],
        [63, 8],
        [50, 51],
        [-9, 35],
      ],
    ],
    [
      'an arrowhead',
      [
        [0, 0],
        [60, 30],
        [0, 60],
        [20, 30],
      ],
    ],
    [
      'a house',
      [
        [0, 0],
        [40, 0],
        [40, 40],
        [20, 60],
        [0, 40],
      ],
    ],
  ])('of %s covers the whole plane', (_, corners) => {
    expect(plan(ringOf(corners), 300, 300).planeDensity).toBeCloseTo(1, 4);
  });
});

/** Squares of 10 mm; densities with half turns and the most that fit, by integer programming (checks §1.2). */
const polyominoes: [name: string, corners: Corner[], density: number][] = [
  [
    'L-tromino',
    [
      [0, 0],
      [20, 0],
      [20, 10],
      [10, 10],
      [10, 20],
      [0, 20],
    ],
    1,
  ],
  [
    'T-tetromino',
    [
      [0, 0],
      [30, 0],
      [30, 10],
      [20, 10],
      [20, 20],
      [10, 20],
      [10, 10],
      [0, 10],
    ],
    1,
  ],
  [
    'P-pentomino',
    [
      [0, 0],
      [20, 0],
      [20, 20],
      [10, 20],
      [10, 30],
      [0, 30],
    ],
    1,
  ],
  [
    'L of 6 × 2 and 2 × 4',
    [
      [0, 0],
      [60, 0],
      [60, 20],
      [20, 20],
      [20, 60],
      [0, 60],
    ],
    1,
  ],
];

describe('polyominoes', () => {
  it.each(polyominoes)('%s covers %d of the plane', (_, corners, density) => {
    expect(plan(ringOf(corners), 200, 200).planeDensity / density).toBeGreaterThan(0.999);
  });

  it.each([
    [20, 30, 2],
    [30, 30, 2],
    [40, 40, 5],
    [50, 60, 10],
    [70, 70, 16],
  ])('L-trominoes in %i × %i mm are at most %i', (w, h, most) => {
    const { placements } = plan(ringOf(polyominoes[0]![1]), w, h, [0, 90, 180, 270]);
    expect(placements.length).toBeLessThanOrEqual(most);
    expect(placements.length).toBeGreaterThanOrEqual(Math.floor(most * 0.75));
  });
});

describe('round pieces', () => {
  const round = (d: number) => regular(96, d / 2);

  // Square and hexagonal rows by their counting formulas, recomputed; the upper bound is Groemer
  // 1960 / Oler 1961, from memory: (2/√3) A/d² + P/(2d) + 1 of the centres' room.
  it.each([
    [100, 100, 10, 105],
    [80, 80, 10, 68],
    [200, 100, 10, 215],
    [300, 200, 25, 104],
    [300, 200, 30, 67],
    [600, 300, 38, 126],
    [100, 20, 10, 20],
  ])('from %i × %i mm, %i mm across, are at least %i', (w, h, d, least) => {
    const pieces = plan(round(d), w, h).placements.length;
    const [a, b] = [w - d, h - d];
    expect(pieces).toBeGreaterThanOrEqual(least);
    // A polygon of 96 corners is a trifle smaller than its circle.
    const most = ((2 / Math.sqrt(3)) * a * b) / (d * d) + (a + b) / d + 1;
    expect(pieces).toBeLessThanOrEqual(most * 1.01);
  });

  // Füredi, "The densest packing of equal circles into a parallel strip", Discrete & Computational
  // Geometry 6 (1991), from memory: two rows in a strip of d (1 + √3/2) need d/2 per piece.
  it('need half a diameter each in a strip for two rows', () => {
    const width = 30 * (1 + Math.sqrt(3) / 2);
    const strip: NestProblem = {
      outline: round(30),
      container: { type: 'strip', width },
      gap: 0,
      rotations: [0],
    };
    expect(planRegular(strip).mmPerPiece).toBeCloseTo(15, 2);
  });
});

describe('alternating rows in a strip as high as the piece', () => {
  // Triangles of base b: floor(2L/b) − 1; isosceles trapezoids of bases a > c:
  // floor((L − (a − c)/2) / ((a + c)/2)). Recomputed.
  it.each([
    [10, 2, 9],
    [40, 8, 9],
    [300, 40, 14],
    [70, 30, 3],
  ])('%i mm long, of triangles of base %i give %i', (length, base, count) => {
    const triangle = ringOf([
      [0, 0],
      [base, 0],
      [base / 2, 25],
    ]);
    expect(plan(triangle, length, 25).placements).toHaveLength(count);
  });

  it.each([
    [100, 30, 10, 4],
    [60, 25, 15, 2],
    [24, 25, 15, 0],
  ])('%i mm long, of trapezoids of bases %d and %d give %i', (length, a, c, count) => {
    const trapezoid = ringOf([
      [0, 0],
      [a, 0],
      [(a + c) / 2, 25],
      [(a - c) / 2, 25],
    ]);
    expect(plan(trapezoid, length, 25).placements).toHaveLength(count);
  });
});
