import { type Pieces, upperEnvelope } from './envelope.ts';

/** A row above a row: how far it must be stepped, by how far it is shifted along. */
export interface Step {
  shift: number;
  height: number;
}

/**
 * The least step from one row to the next as a function of the shift, which repeats with the pitch:
 * the highest of what every piece of the lower row asks for.
 */
export class StepCurve {
  readonly pitch: number;
  readonly #pieces: Pieces;

  constructor(above: Pieces, pitch: number) {
    this.pitch = pitch;
    this.#pieces = upperEnvelope(folded(above, pitch));
  }

  /** The least step in mm for a shift in mm; 0 where the row can slip into the other's gaps. */
  at(shift: number): number {
    const x = shift - Math.floor(shift / this.pitch) * this.pitch;
    return Math.min(this.#beside(x, -1), this.#beside(x, 1));
  }

  /** The places where the step is least among its neighbours, lowest first. */
  minima(): Step[] {
    const pieces = this.#pieces;
    const found: Step[] = this.#gaps();
    for (let at = 0; at < pieces.length; at += 4) {
      const [x0, y0, y1] = [pieces[at], pieces[at + 1], pieces[at + 3]] as [number, number, number];
      const before = (at === 0 ? pieces[pieces.length - 1] : pieces[at - 1]) as number;
      const next = (at + 5 < pieces.length ? pieces[at + 5] : pieces[1]) as number;
      const x1 = pieces[at + 2] as number;
      if (y0 <= before + 1e-9 && y0 <= y1 + 1e-9)
        found.push({ shift: x0, height: Math.max(0, y0) });
      if (y1 <= next + 1e-9 && y1 <= y0 + 1e-9) found.push({ shift: x1, height: Math.max(0, y1) });
    }
    return distinct(found.sort((a, b) => a.height - b.height || a.shift - b.shift));
  }

  #gaps(): Step[] {
    const pieces = this.#pieces;
    const gaps: Step[] = [];
    let end = 0;
    for (let at = 0; at <= pieces.length; at += 4) {
      const start = at < pieces.length ? (pieces[at] as number) : this.pitch;
      if (start > end + 1e-7) {
        for (const shift of [end, (start + end) / 2, start]) gaps.push({ shift, height: 0 });
      }
      end = at < pieces.length ? (pieces[at + 2] as number) : end;
    }
    return gaps;
  }

  /** The value just left or just right of a place, by bisection. */
  #beside(x: number, side: -1 | 1): number {
    const pieces = this.#pieces;
    let [low, high] = [0, pieces.length / 4];
    while (low < high) {
      const middle = (low + high) >> 1;
      const end = pieces[middle * 4 + 2] as number;
      if (side > 0 ? end <= x + 1e-10 : end < x - 1e-10) low = middle + 1;
      else high = middle;
    }
    const at = low * 4;
    if (at < pieces.length) return this.#value(x, at);
    return side > 0 && pieces.length > 0 ? this.#value(x - this.pitch, 0) : 0;
  }

  #value(x: number, at: number): number {
    const pieces = this.#pieces;
    const [x0, y0] = [pieces[at] as number, pieces[at + 1] as number];
    const [x1, y1] = [pieces[at + 2] as number, pieces[at + 3] as number];
    if (x < x0 - 1e-9) return 0;
    return Math.max(0, y0 + ((y1 - y0) * (x - x0)) / (x1 - x0));
  }
}

/** Every piece moved by whole pitches into [0, pitch], cut where it passes an end. */
function folded(above: Pieces, pitch: number): number[] {
  const inside: number[] = [];
  for (let at = 0; at < above.length; at += 4) {
    const [x0, y0] = [above[at] as number, above[at + 1] as number];
    const [x1, y1] = [above[at + 2] as number, above[at + 3] as number];
    const slope = (y1 - y0) / (x1 - x0);
    for (let turn = Math.floor(x0 / pitch); turn * pitch < x1; turn += 1) {
      const [from, to] = [Math.max(x0, turn * pitch), Math.min(x1, (turn + 1) * pitch)];
      if (to - from < 1e-10) continue;
      const [a, b] = [from - turn * pitch, to - turn * pitch];
      inside.push(a, y0 + slope * (from - x0), b, y0 + slope * (to - x0));
    }
  }
  return inside;
}

function distinct(steps: Step[]): Step[] {
  return steps.filter((step, at) =>
    steps.slice(0, at).every(({ shift }) => Math.abs(shift - step.shift) > 1e-7),
  );
}
