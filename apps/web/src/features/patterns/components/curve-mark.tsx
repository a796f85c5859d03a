import type { ClosedCurve } from '@hidewright/domain';

const pathOf = ({ points }: ClosedCurve): string =>
  `M ${points.map(({ x, y }) => `${x.toFixed(3)} ${y.toFixed(3)}`).join(' L ')} Z`;

interface CurveMarkProps {
  curve: ClosedCurve;
  /** What it is drawn in, at the same scale: all that is listed are then to the same scale as well. */
  within: ClosedCurve;
}

/** A curve of a drawing where it lies, beside its size, which says it all to the ear. */
export function CurveMark({ curve, within }: CurveMarkProps) {
  const { bounds, width, height } = within;
  const margin = Math.max(width, height) * 0.04;
  const view = [
    bounds.minX - margin,
    bounds.minY - margin,
    width + 2 * margin,
    height + 2 * margin,
  ];
  return (
    <svg viewBox={view.join(' ')} className="h-12 w-20 shrink-0" aria-hidden="true">
      {curve !== within && (
        <path
          d={pathOf(within)}
          className="fill-panel stroke-edge"
          strokeWidth={1}
          vectorEffect="non-scaling-stroke"
        />
      )}
      <path
        d={pathOf(curve)}
        className="fill-russet stroke-russet"
        strokeWidth={1}
        vectorEffect="non-scaling-stroke"
      />
    </svg>
  );
}
