import svgpath from 'svgpath';
import type { Point } from '../outline.ts';
import { endpointArc } from './endpoint-arc.ts';
import { refusal } from './refusal.ts';
import type { Segment, Stroke } from './stroke.ts';

/**
 * The lines of an SVG path's data, one for each part of it. Arcs stay true arcs.
 * @throws InvalidInput where it cannot be read
 */
export function pathStrokes(data: string): Stroke[] {
  const strokes: Stroke[] = [];
  let stroke: Stroke | null = null;
  readPath(data).iterate(([command, ...numbers], _index, x, y) => {
    const here = { x, y };
    if (command === 'M') {
      stroke = null;
      return;
    }
    // After a closed part the next one begins where that began.
    if (stroke === null || stroke.closed) {
      stroke = { from: here, segments: [], closed: false };
      strokes.push(stroke);
    }
    if (command === 'Z' || command === 'z') stroke.closed = true;
    else stroke.segments.push(segmentOf(command, numbers as number[], here));
  });
  return strokes.filter(({ segments }) => segments.length > 0);
}

function readPath(data: string): ReturnType<typeof svgpath> {
  const path = svgpath(data) as ReturnType<typeof svgpath> & { err?: string };
  if (!path.err) return path.abs().unshort();
  throw refusal(`A path cannot be read: “${data.trim().slice(0, 40)}”. Save the drawing again.`);
}

function segmentOf(command: string, n: number[], here: Point): Segment {
  const point = (at: number): Point => ({ x: n[at] as number, y: n[at + 1] as number });
  switch (command) {
    case 'H':
      return { kind: 'line', to: { x: n[0] as number, y: here.y } };
    case 'V':
      return { kind: 'line', to: { x: here.x, y: n[0] as number } };
    case 'C':
      return { kind: 'cubic', handles: [point(0), point(2)], to: point(4) };
    case 'Q':
      return { kind: 'quadratic', handle: point(0), to: point(2) };
    case 'A': {
      const [radiusX = 0, radiusY = 0, degrees = 0, large, sweep] = n;
      const shape = { radiusX, radiusY, tilt: (degrees * Math.PI) / 180 };
      return endpointArc(here, point(5), shape, { large: large === 1, sweep: sweep === 1 });
    }
    default:
      return { kind: 'line', to: point(0) };
  }
}
