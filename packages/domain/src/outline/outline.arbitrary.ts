import fc from 'fast-check';
import type { Outline, Point } from './outline.ts';

const mm = (min: number, max: number) =>
  fc.integer({ min: min * 4, max: max * 4 }).map((quarters) => quarters / 4);

const share = fc.integer({ min: 0, max: 20 }).map((twentieths) => twentieths / 20);

/** For the tests: outlines of the sizes that small leather goods have. */
export const anOutline: fc.Arbitrary<Outline> = fc.oneof(
  mm(12, 120).map((diameterMm): Outline => ({ shape: 'round', diameterMm })),
  fc
    .tuple(mm(10, 150), mm(10, 150))
    .map(([widthMm, heightMm]): Outline => ({ shape: 'oval', widthMm, heightMm })),
  fc.tuple(mm(10, 150), mm(10, 150), share).map(([widthMm, heightMm, round]): Outline => ({
    shape: 'rectangle',
    widthMm,
    heightMm,
    cornerRadiusMm: (Math.min(widthMm, heightMm) / 2) * round,
  })),
  aTag(),
  aStar(),
);

/** For the tests: tags with necks of all kinds. */
function aTag(): fc.Arbitrary<Outline> {
  return fc
    .tuple(
      mm(30, 150),
      mm(15, 80),
      fc.integer({ min: 2, max: 16 }),
      fc.integer({ min: 3, max: 18 }),
      share,
    )
    .map(([lengthMm, widthMm, neckLength, neckWidth, round]): Outline => {
      const neckLengthMm = (lengthMm * neckLength) / 20;
      const neckWidthMm = (widthMm * neckWidth) / 20;
      const most = Math.min(widthMm, lengthMm - neckLengthMm) / 2;
      return {
        shape: 'tag',
        lengthMm,
        widthMm,
        neckLengthMm,
        neckWidthMm,
        cornerRadiusMm: most * round,
      };
    });
}

/** Corners at growing angles and any distance: convex or deeply notched, and never crossing itself. */
function aStar(): fc.Arbitrary<Outline> {
  return fc
    .array(mm(8, 60), { minLength: 3, maxLength: 14 })
    .map((radii): Outline => ({ shape: 'polygon', points: star(radii) }));
}

/** The corners lie in the middle of equal sectors, so that the origin is inside. */
export function star(radii: readonly number[]): Point[] {
  return radii.map((radius, at) => {
    const angle = (2 * Math.PI * (at + 0.5)) / radii.length;
    return { x: radius * Math.cos(angle), y: radius * Math.sin(angle) };
  });
}
