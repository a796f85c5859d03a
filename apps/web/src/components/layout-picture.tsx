import type { DrawnSide, StripCuts } from '@hidewright/domain';
import { useId } from 'react';
import { lengthFigure, lengthUnits } from '../lib/units.ts';
import { useWorkshop } from '../lib/workshop.tsx';
import { LayoutPiece } from './layout-piece.tsx';
import { ZoomFrame } from './zoom-frame.tsx';
import { SidePaths } from './side-paths.tsx';
import { usePathBox } from './use-path-box.ts';

export interface Placement {
  x: number;
  y: number;
  /** Degrees, clockwise as drawn. */
  rot: number;
}

interface LayoutPictureProps {
  /** The outline as SVG path data in mm, about the point that placements move. */
  outlinePath: string;
  placements: readonly Placement[];
  widthMm: number;
  heightMm: number;
  /** A side as it was drawn, where it is no rectangle. */
  side?: DrawnSide | undefined;
  /** What is left over and worth keeping. */
  offcut?: { x: number; y: number; widthMm: number; heightMm: number } | null | undefined;
  /** Straight cuts that part it into strips for the press. */
  cuts?: Pick<StripCuts, 'along' | 'at'> | undefined;
  /** How many pieces the spoilage allowance will cost: the last ones are hatched. */
  allowance?: number | undefined;
  /** Along which side the backbone ran. */
  spine?: 'across' | 'down' | undefined;
  /** What is drawn, for the ear: "Layout of Heron crest tags". */
  title: string;
  className?: string | undefined;
}

/** The real layout, to scale: people look at it before they read a number. */
export function LayoutPicture(props: LayoutPictureProps) {
  const {
    outlinePath,
    placements,
    widthMm,
    heightMm,
    allowance = 0,
    spine = 'across',
    side,
    cuts,
    offcut,
    title,
  } = props;
  const { lengthUnit } = useWorkshop();
  const id = useId();
  const [measure, box] = usePathBox(outlinePath);
  const margin = Math.max(widthMm, heightMm) * 0.004;
  const size = [widthMm, heightMm]
    .map((side) => lengthFigure(String(side), lengthUnit))
    .join(' × ');
  const sign = lengthUnits[lengthUnit].sign;
  const firstHatched = placements.length - allowance;
  const hatched = allowance > 0 ? `; ${allowance} hatched for the spoilage allowance` : '';
  return (
    <figure className={props.className}>
      <ZoomFrame label={title} zooms={placements.length > 8}>
        <svg
          role="img"
          aria-labelledby={`${id}-title ${id}-desc`}
          viewBox={`${-margin} ${-margin} ${widthMm + 2 * margin} ${heightMm + 2 * margin}`}
          className="block h-auto max-h-full w-full"
        >
          <title id={`${id}-title`}>{title}</title>
          <desc id={`${id}-desc`}>
            {`${placements.length} pieces from ${size} ${sign}${hatched}; the spine runs ${spine}.`}
          </desc>
          <defs>
            <Hatch id={`${id}-hatch`} spacing={Math.max(box.width, box.height) / 14} />
            <path ref={measure} id={`${id}-outline`} d={outlinePath} />
          </defs>
          {side ? (
            <SidePaths side={side} />
          ) : (
            <rect
              width={widthMm}
              height={heightMm}
              className="fill-panel stroke-edge"
              strokeWidth={1.5}
              vectorEffect="non-scaling-stroke"
            />
          )}
          {offcut && <OffcutMark offcut={offcut} />}
          {placements.map((placement, index) => (
            <LayoutPiece
              key={index}
              number={index + 1}
              placement={placement}
              outlineId={`${id}-outline`}
              hatchId={index >= firstHatched ? `${id}-hatch` : undefined}
              box={box}
            />
          ))}
          {cuts && <CutLines cuts={cuts} widthMm={widthMm} heightMm={heightMm} />}
        </svg>
      </ZoomFrame>
      <figcaption className="mt-2 flex flex-wrap justify-between gap-x-6 text-ink-soft">
        <span>{`${size} ${sign}`}</span>
        <SpineArrow spine={spine} />
      </figcaption>
    </figure>
  );
}

function OffcutMark({ offcut }: { offcut: NonNullable<LayoutPictureProps['offcut']> }) {
  return (
    <rect
      x={offcut.x}
      y={offcut.y}
      width={offcut.widthMm}
      height={offcut.heightMm}
      className="fill-verdigris-pale/60 stroke-verdigris"
      strokeWidth={1.5}
      strokeDasharray="5 3"
      vectorEffect="non-scaling-stroke"
    />
  );
}

interface CutLinesProps {
  cuts: Pick<StripCuts, 'along' | 'at'>;
  widthMm: number;
  heightMm: number;
}

function CutLines({ cuts, widthMm, heightMm }: CutLinesProps) {
  const path = cuts.at.map((at) =>
    cuts.along === 'width' ? `M 0 ${at} H ${widthMm}` : `M ${at} 0 V ${heightMm}`,
  );
  return (
    <path
      d={path.join(' ')}
      className="fill-none stroke-ink"
      strokeWidth={2}
      strokeDasharray="9 4"
      vectorEffect="non-scaling-stroke"
    />
  );
}

function Hatch({ id, spacing }: { id: string; spacing: number }) {
  const step = spacing || 4;
  return (
    <pattern
      id={id}
      width={step}
      height={step}
      patternUnits="userSpaceOnUse"
      patternTransform="rotate(35)"
    >
      <rect width={step} height={step} className="fill-card" />
      <rect width={step * 0.45} height={step} className="fill-russet" />
    </pattern>
  );
}

function SpineArrow({ spine }: { spine: 'across' | 'down' }) {
  return (
    <span className="inline-flex items-center gap-2">
      along the spine
      <svg
        width={spine === 'across' ? 80 : 12}
        height={spine === 'across' ? 12 : 40}
        viewBox={spine === 'across' ? '0 0 80 12' : '0 0 12 40'}
        fill="none"
        stroke="currentColor"
        strokeWidth="1.6"
        strokeLinecap="round"
        strokeLinejoin="round"
        aria-hidden="true"
      >
        <path d={spine === 'across' ? 'M1 6h76M71 2l7 4-7 4' : 'M6 1v36M2 31l4 7 4-7'} />
      </svg>
    </span>
  );
}
