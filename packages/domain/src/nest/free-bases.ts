import type { Pattern } from './dense-patterns.ts';
import { rotationalOrder } from './rotational-order.ts';
import type { Base, Shape } from './shape.ts';

/** Angles closer than this, in degrees, are tried once. */
const sameAngle = 0.05;

/** For pieces that may lie at any angle: such that a dense pattern's rows run along the edges. */
export function freeBases(patterns: readonly Pattern[], shape: Shape): Base[] {
  const period = rotationPeriod(shape);
  const bases: Base[] = [];
  for (const { crystal } of patterns.slice(0, 4)) {
    const { along, across } = crystal;
    const steps = [along, across, { x: along.x + across.x, y: along.y + across.y }];
    for (const { x, y } of steps) {
      const angle = (Math.atan2(y, x) * 180) / Math.PI;
      for (const axis of [0, 90]) {
        const rot = axis - angle;
        const known = bases.some((base) => apart(base.rot - rot, period) < sameAngle);
        if (!known) bases.push({ rot, halfTurns: !shape.symmetrical });
      }
    }
  }
  return bases;
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
