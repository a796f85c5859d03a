import type { Placement } from './layout-picture.tsx';
import type { PathBox } from './use-path-box.ts';

interface LayoutPieceProps {
  number: number;
  placement: Placement;
  outlineId: string;
  /** Given for a piece that the spoilage allowance will cost. */
  hatchId: string | undefined;
  box: PathBox;
}

/** One piece where it will be cut, with its number upright whichever way it lies. */
export function LayoutPiece({ number, placement, outlineId, hatchId, box }: LayoutPieceProps) {
  const { x, y, rot } = placement;
  const turned = Math.abs((((rot % 360) + 360) % 360) - 180) < 90;
  const [middleX, middleY] = [box.x + box.width / 2, box.y + box.height / 2];
  const size = Math.min(
    Math.min(box.width, box.height) * 0.36,
    Math.max(box.width, box.height) * 0.14,
  );
  return (
    <g transform={`translate(${x} ${y}) rotate(${rot})`}>
      <use
        href={`#${outlineId}`}
        fill={hatchId ? `url(#${hatchId})` : 'var(--color-russet)'}
        fillOpacity={turned && !hatchId ? 0.88 : 1}
        className="stroke-card"
        strokeWidth={1}
        vectorEffect="non-scaling-stroke"
      />
      {size > 0 && (
        <text
          x={middleX}
          y={middleY}
          fontSize={size}
          fontWeight={600}
          textAnchor="middle"
          dominantBaseline="central"
          transform={`rotate(${-rot} ${middleX} ${middleY})`}
          className={hatchId ? 'fill-ink stroke-card' : 'fill-card'}
          strokeWidth={hatchId ? size * 0.22 : 0}
          paintOrder="stroke"
          aria-hidden="true"
        >
          {number}
        </text>
      )}
    </g>
  );
}
