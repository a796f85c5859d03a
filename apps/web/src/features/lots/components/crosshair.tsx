import type { Point } from '@hidewright/domain';

/** Where the arrow keys have led to. */
export function Crosshair({ at: { x, y }, size }: { at: Point; size: number }) {
  return (
    <path
      d={`M ${x - size} ${y} H ${x + size} M ${x} ${y - size} V ${y + size}`}
      className="fill-none stroke-ink"
      strokeWidth={1.5}
      vectorEffect="non-scaling-stroke"
      aria-hidden="true"
    />
  );
}
