import type { Point } from '@hidewright/domain';
import { useRef, useState, type KeyboardEvent, type PointerEvent } from 'react';
import { SidePaths } from '../../../components/side-paths.tsx';
import { placeOn, strideOf, sumOf } from '../canvas-hand.ts';
import { frameOf, movedBy, type SidePhoto } from '../side-photo.ts';
import { viewBoxOf, type SideSketch } from '../side-sketch.ts';
import { Crosshair } from './crosshair.tsx';
import { PhotoBackdrop } from './photo-backdrop.tsx';

interface PhotoCanvasProps {
  sketch: SideSketch;
  photo: SidePhoto;
  strength: number;
  hand: 'measure' | 'move';
  /** The ends of the line of known length, as far as they are set. */
  line: readonly Point[];
  onLine: (line: Point[]) => void;
  onMove: (photo: SidePhoto) => void;
}

const labels = {
  measure:
    'The photo. Arrow keys move the crosshair, Enter sets an end of the line, Escape drops it.',
  move: 'The photo. Arrow keys move it under the drawing.',
};

/** The photo under the drawing: a line is drawn on it, or it is moved, by mouse, finger or arrow keys. */
export function PhotoCanvas(props: PhotoCanvasProps) {
  const { sketch, photo, strength, hand, line, onLine, onMove } = props;
  const svg = useRef<SVGSVGElement>(null);
  const frame = frameOf(sketch.outline, photo);
  // While a hand drags, what is in sight stays, so that the photo follows it.
  const [held, setHeld] = useState<{ frame: typeof frame; from: Point; photo: SidePhoto }>();
  const seen = held?.frame ?? frame;
  const [cross, setCross] = useState<Point>({
    x: Math.round(frame.x + frame.width / 2),
    y: Math.round(frame.y + frame.height / 2),
  });

  function onKey(event: KeyboardEvent): void {
    const step = strideOf(event);
    if (step && hand === 'move') onMove(movedBy(photo, step.x, step.y));
    else if (step) setCross((at) => sumOf(at, step));
    else if (event.key === 'Enter' && hand === 'measure') onLine(withEnd(line, cross));
    else if (event.key === 'Escape' && line.length > 0) onLine([]);
    else return;
    event.preventDefault();
  }

  function onDown(event: PointerEvent<SVGSVGElement>): void {
    event.currentTarget.setPointerCapture(event.pointerId);
    const at = placeOn(svg.current, event);
    const ends = withEnd(line, at);
    if (hand === 'measure') onLine(ends);
    setHeld({ frame, from: ends[0] ?? at, photo });
  }

  function onDrag(event: PointerEvent): void {
    if (!held) return;
    const at = placeOn(svg.current, event);
    if (hand === 'move') onMove(movedBy(held.photo, at.x - held.from.x, at.y - held.from.y));
    // A hand that taps trembles a little.
    else if (Math.hypot(at.x - held.from.x, at.y - held.from.y) > seen.width / 100)
      onLine([held.from, at]);
  }

  return (
    <svg
      ref={svg}
      viewBox={viewBoxOf(seen)}
      className="block h-auto max-h-[32rem] w-full touch-none rounded bg-paper"
      role="application"
      aria-label={labels[hand]}
      tabIndex={0}
      onKeyDown={onKey}
      onPointerDown={onDown}
      onPointerMove={onDrag}
      onPointerUp={() => setHeld(undefined)}
      onPointerCancel={() => setHeld(undefined)}
    >
      <PhotoBackdrop photo={photo} strength={strength} />
      <SidePaths side={sketch} seeThrough />
      <Line line={line} size={seen.width * 0.006} />
      {hand === 'measure' && <Crosshair at={cross} size={seen.width * 0.02} />}
    </svg>
  );
}

/** A third end begins a new line. */
const withEnd = (line: readonly Point[], at: Point): Point[] =>
  line.length === 1 ? [...line, at] : [at];

function Line({ line, size }: { line: readonly Point[]; size: number }) {
  return (
    <g className="fill-brass stroke-brass" aria-hidden="true">
      {line.length > 1 && (
        <path
          d={`M ${line.map(({ x, y }) => `${x} ${y}`).join(' L ')}`}
          strokeWidth={2.5}
          vectorEffect="non-scaling-stroke"
        />
      )}
      {line.map(({ x, y }, at) => (
        <circle key={at} cx={x} cy={y} r={size} />
      ))}
    </g>
  );
}
