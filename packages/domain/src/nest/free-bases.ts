import type { Pattern } from './dense-patterns.ts';
import type { Base } from './shape.ts';

/** For pieces that may lie at any angle: such that a dense pattern's rows run along the edges. */
export function freeBases(patterns: readonly Pattern[]): Base[] {
  const bases: Base[] = [];
  for (const { crystal } of patterns.slice(0, 4)) {
    const { along, across } = crystal;
    const steps = [along, across, { x: along.x + across.x, y: along.y + across.y }];
    for (const { x, y } of steps) {
      const angle = (Math.atan2(y, x) * 180) / Math.PI;
      for (const axis of [0, 90]) bases.push({ rot: axis - angle, halfTurns: true });
    }
  }
  return bases;
}
