import type { Point } from '../outline/outline.ts';
import type { Pattern } from './dense-patterns.ts';
import { cornerAt } from './ring.ts';
import { rotationalOrder } from './rotational-order.ts';
import type { Base, Shape } from './shape.ts';

/** Angles closer than this, in degrees, are tried once. */
const sameAngle = 0.05;

/** So many of an outline's longest edges are laid along the panel's. */
const longEdges = 3;

/**
 * For pieces that may lie at any angle: as drawn, with a long edge along the panel's, and such that
 * a dense pattern's rows run along it.
 */
export function freeBases(patterns: readonly Pattern[], shape: Shape): Base[] {
  const period = rotationPeriod(shape);
  const bases: Base[] = [];
  for (const angle of [...rowAngles(patterns), ...edgeAngles(shape), 0]) {
    for (const axis of [0, 90]) {
      const rot = axis - angle;
      const known = bases.some((base) => apart(base.rot - rot, period) < sameAngle);
      if (!known) bases.push({ rot, halfTurns: !shape.symmetrical });
    }
  }
  return bases;
}

const degrees = ({ x, y }: Point): number => (Math.atan2(y, x) * 180) / Math.PI;

function rowAngles(patterns: readonly Pattern[]): number[] {
  return patterns.slice(0, 4).flatMap(({ crystal: { along, across } }) => {
    const both = { x: along.x + across.x, y: along.y + across.y };
    return [along, across, both].map(degrees);
  });
}

function edgeAngles({ ring }: Shape): number[] {
  const edges = ring.map((from, at) => {
    const to = cornerAt(ring, at + 1);
    return { x: to.x - from.x, y: to.y - from.y };
  });
  edges.sort((a, b) => Math.hypot(b.x, b.y) - Math.hypot(a.x, a.y));
  return edges.slice(0, longEdges).map(degrees);
}

/** After so many degrees a layout with half-turned pieces is one of the same pieces again. */
export function rotationPeriod({ ring }: Shape): number {
  const order = rotationalOrder(ring);
  return 360 / (order % 2 === 1 ? 2 * order : order);
}

function apart(angle: number, period: number): number {
  const rest = ((angle % period) + period) % period;
  return Math.min(rest, period - rest);
}
