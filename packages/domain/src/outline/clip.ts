import { Clipper, EndType, FillRule, JoinType, type Path64, type Paths64 } from 'clipper2-ts';
import type { Point } from './outline.ts';
import { turnedRing, type Ring } from './ring.ts';

/** Whole numbers that clipping works in, per mm: a ten-millionth of a millimetre. */
const perMm = 1e7;
/** Round corners are followed within this, in mm: a tenth of what a checker allows for spacing. */
const arcMm = 8e-5;

const toPath = (ring: Ring): Path64 =>
  ring.map(({ x, y }) => ({ x: Math.round(x * perMm), y: Math.round(y * perMm) }));

const toRing = (path: Path64): Point[] => path.map(({ x, y }) => ({ x: x / perMm, y: y / perMm }));

/** Everything around which the rings run more often counter-clockwise than clockwise. */
export function unionPositive(rings: readonly Ring[]): Point[][] {
  return Clipper.union(rings.map(toPath), FillRule.Positive).map(toRing);
}

/**
 * The region grown by `mm` with round corners, followed within `withinMm`; shrunk where `mm` is
 * negative. Outer rings run counter-clockwise, holes clockwise.
 */
export function grown(rings: readonly Ring[], mm: number, withinMm = arcMm): Point[][] {
  if (mm === 0) return rings.map((ring) => [...ring]);
  const paths: Paths64 = rings.map(toPath);
  return Clipper.inflatePaths(
    paths,
    mm * perMm,
    JoinType.Round,
    EndType.Polygon,
    2,
    withinMm * perMm,
  ).map(toRing);
}

/** Area in mm² that two simple polygons, both counter-clockwise, have in common. */
export function commonArea(a: Ring, b: Ring): number {
  const common = Clipper.intersect([toPath(a)], [toPath(b)], FillRule.Positive);
  return common.reduce((sum, path) => sum + Clipper.area(path), 0) / (perMm * perMm);
}

/** Area in mm² of a simple polygon without whatever others cover of it, whichever way round they all run. */
export function areaWithout(ring: Ring, others: readonly Ring[]): number {
  const left = Clipper.difference(
    [toPath(ring)],
    others.map((each) => toPath(turnedRing(each, 'counter-clockwise'))),
    FillRule.NonZero,
  );
  return Math.abs(left.reduce((sum, path) => sum + Clipper.area(path), 0)) / (perMm * perMm);
}
