import type { DrawnSide } from '@hidewright/domain';

/** A closed curve through points, as SVG path data. */
const curvePath = (points: readonly { x: number; y: number }[]): string =>
  `M ${points.map(({ x, y }) => `${x} ${y}`).join(' L ')} Z`;

interface SidePathsProps {
  side: DrawnSide;
  /** Over a photo. */
  seeThrough?: boolean | undefined;
}

/** The edge of a side and its flaws. */
export function SidePaths({ side: { outline, flaws }, seeThrough }: SidePathsProps) {
  return (
    <>
      <path
        d={curvePath(outline)}
        className={seeThrough ? 'fill-none stroke-verdigris' : 'fill-panel stroke-edge'}
        strokeWidth={seeThrough ? 2.5 : 1.5}
        vectorEffect="non-scaling-stroke"
      />
      {flaws.map((flaw, at) => (
        <path
          key={at}
          d={curvePath(flaw)}
          className="fill-oxblood/30 stroke-oxblood"
          strokeWidth={1.5}
          vectorEffect="non-scaling-stroke"
        />
      ))}
    </>
  );
}
