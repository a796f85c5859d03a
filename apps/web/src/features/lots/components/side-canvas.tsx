import type { Point } from '@hidewright/domain';
import { useRef, useState, type KeyboardEvent, type PointerEvent } from 'react';
import { SidePaths } from '../../../components/side-paths.tsx';
import { placeOn, strideOf, sumOf } from '../canvas-hand.ts';
import { frameOf, type SidePhoto } from '../side-photo.ts';
import { viewBoxOf, type SideSketch } from '../side-sketch.ts';
import { Crosshair } from './crosshair.tsx';
import { PhotoBackdrop } from './photo-backdrop.tsx';

interface SideCanvasProps {
  sketch: SideSketch;
  /** Which part the hand works on. */
  works: 'flaws' | 'edge';
  /** Under the drawing, while it is shown. */
  photo: SidePhoto | undefined;
  /** How strong it is, in per cent. */
  strength: number;
  onCorner: (at: Point) => void;
  onClose: () => void;
  onDrop: () => void;
  onMoveCorner: (at: number, to: Point) => void;
}

/** The side, to be drawn on: with mouse or finger around a flaw, or with a crosshair that the arrow keys move. */
export function SideCanvas(props: SideCanvasProps) {
  const { sketch, works, photo, strength, onCorner, onClose, onDrop } = props;
  const svg = useRef<SVGSVGElement>(null);
  const box = frameOf(sketch.outline, photo);
  const [cross, setCross] = useState<Point>({
    x: Math.round(box.x + box.width / 2),
    y: Math.round(box.y + box.height / 2),
  });
  const [drawing, setDrawing] = useState(false);
  const place = (event: PointerEvent): Point => placeOn(svg.current, event);

  function move(event: KeyboardEvent): void {
    const step = strideOf(event);
    if (step) setCross((at) => sumOf(at, step));
    else if (event.key === 'Enter') onCorner(cross);
    else if (event.key === ' ') onClose();
    else if (event.key === 'Escape' && sketch.underWay.length > 0) onDrop();
    else return;
    event.preventDefault();
  }

  return (
    <svg
      ref={svg}
      viewBox={viewBoxOf(box)}
      className="block h-auto max-h-[32rem] w-full touch-none rounded bg-paper"
      role={works === 'flaws' ? 'application' : 'group'}
      aria-label={
        works === 'flaws'
          ? 'The side. Arrow keys move the crosshair, Enter marks a corner of a flaw, Space closes it, Escape drops it.'
          : 'The side. Each corner of its edge can be moved with the arrow keys.'
      }
      tabIndex={works === 'flaws' ? 0 : undefined}
      onKeyDown={works === 'flaws' ? move : undefined}
      onPointerDown={(event) => {
        if (works !== 'flaws') return;
        event.currentTarget.setPointerCapture(event.pointerId);
        setDrawing(true);
        onCorner(place(event));
      }}
      onPointerMove={(event) => drawing && onCorner(place(event))}
      onPointerUp={() => {
        if (!drawing) return;
        setDrawing(false);
        onClose();
      }}
    >
      {photo && <PhotoBackdrop photo={photo} strength={strength} />}
      <SidePaths side={sketch} seeThrough={photo !== undefined} />
      {sketch.underWay.length > 0 && (
        <path
          d={`M ${sketch.underWay.map(({ x, y }) => `${x} ${y}`).join(' L ')}`}
          className="fill-none stroke-oxblood"
          strokeWidth={2}
          strokeDasharray="5 3"
          vectorEffect="non-scaling-stroke"
        />
      )}
      {works === 'flaws' ? (
        <Crosshair at={cross} size={box.width * 0.02} />
      ) : (
        <Corners {...props} size={box.width * 0.009} place={place} />
      )}
    </svg>
  );
}

interface CornersProps extends SideCanvasProps {
  size: number;
  place: (event: PointerEvent) => Point;
}

function Corners({ sketch, size, place, onMoveCorner }: CornersProps) {
  return sketch.outline.map((corner, at) => (
    <circle
      key={at}
      cx={corner.x}
      cy={corner.y}
      r={size}
      role="button"
      tabIndex={0}
      aria-label={`Corner ${at + 1}: ${corner.x}, ${corner.y} mm`}
      className="cursor-move fill-verdigris stroke-card"
      strokeWidth={1.5}
      vectorEffect="non-scaling-stroke"
      onPointerDown={(event) => event.currentTarget.setPointerCapture(event.pointerId)}
      onPointerMove={(event) => {
        if (event.currentTarget.hasPointerCapture(event.pointerId)) onMoveCorner(at, place(event));
      }}
      onKeyDown={(event) => {
        const step = strideOf(event);
        if (!step) return;
        event.preventDefault();
        onMoveCorner(at, sumOf(corner, step));
      }}
    />
  ));
}
