import { mostAtOnce } from './most-at-once.ts';
import type { NestPlacement, Ring } from './problem.ts';
import { ringBounds } from './ring.ts';
import type { StripCell } from './strip-cell.ts';

/** A room is looked at in so many bands, so that a line meets only the edges near it. */
const bands = 96;

/** The edges of a room that lines along x meet: x0, y0, x1, y1 each, by the band that they reach. */
class BandedEdges {
  readonly #minY: number;
  readonly #bandMm: number;
  readonly #edges: Float64Array[];

  constructor(rings: readonly Ring[]) {
    const { minY, maxY } = ringBounds(rings);
    this.#minY = minY;
    this.#bandMm = Math.max(1e-9, (maxY - minY) / bands);
    const lists = Array.from({ length: rings.length > 0 ? bands + 1 : 0 }, (): number[] => []);
    for (const ring of rings) {
      let from = ring[ring.length - 1];
      for (const to of ring) {
        if (from && from.y !== to.y) {
          const [low, high] = from.y < to.y ? [from.y, to.y] : [to.y, from.y];
          for (let band = this.#bandOf(low); band <= this.#bandOf(high); band += 1) {
            lists[band]?.push(from.x, from.y, to.x, to.y);
          }
        }
        from = to;
      }
    }
    this.#edges = lists.map((list) => Float64Array.from(list));
  }

  near(y: number): Float64Array {
    return this.#edges[this.#bandOf(y)] ?? noEdges;
  }

  #bandOf(y: number): number {
    return Math.floor((y - this.#minY) / this.#bandMm);
  }
}

const noEdges = new Float64Array(0);

/** How a repeat lies in its strip: shifted by a share of its period, and what it then gives. */
export interface StripPhase {
  count: number;
  u: number;
}

/** Counts what the repeats of a strip give in a room that is no strip, and finds where they give most. */
export class FreeLines {
  readonly #free: (rot: number) => readonly Ring[];
  readonly #edges = new Map<number, BandedEdges>();
  #starts = new Float64Array(64);
  #ends = new Float64Array(64);

  /** @param free the region that the origin of a piece of a turn may take */
  constructor(free: (rot: number) => readonly Ring[]) {
    this.#free = free;
  }

  /** The most pieces that a repeat gives which begins at a height: exact. */
  best({ periodMm, pieces }: StripCell, base: number): StripPhase {
    let [sum, left, right] = [0, 0, 0];
    for (const { x, y, rot } of pieces) {
      const line = base + y;
      const edges = this.#edgesOf(rot).near(line);
      this.#makeRoom(left, right, edges.length / 4);
      for (let at = 0; at < edges.length; at += 4) {
        const [y0, y1] = [edges[at + 1] as number, edges[at + 3] as number];
        if (y0 > line === y1 > line) continue;
        const x0 = edges[at] as number;
        const u =
          (x0 + ((line - y0) / (y1 - y0)) * ((edges[at + 2] as number) - x0) - x) / periodMm;
        const whole = Math.floor(u);
        // Counter-clockwise rings have their inside to the left of what runs up.
        if (y1 > y0) {
          sum += whole;
          this.#ends[right++] = u - whole;
        } else {
          sum -= u > whole ? whole : whole - 1;
          if (u > whole) this.#starts[left++] = u - whole;
        }
      }
    }
    const [starts, ends] = [this.#starts.subarray(0, left), this.#ends.subarray(0, right)];
    const { gain, u } = mostAtOnce(starts.sort(), ends.sort());
    return { count: sum + gain, u };
  }

  /** The pieces that lie in the room. */
  placements({ periodMm, pieces }: StripCell, base: number, u: number): NestPlacement[] {
    return pieces.flatMap(({ x, y, rot }) => {
      const found: NestPlacement[] = [];
      for (const [from, to] of this.#spans(rot, base + y)) {
        const last = (to - x) / periodMm - u;
        for (let i = Math.ceil((from - x) / periodMm - u); i <= last; i += 1) {
          found.push({ x: x + (i + u) * periodMm, y: base + y, rot });
        }
      }
      return found;
    });
  }

  #spans(rot: number, line: number): [from: number, to: number][] {
    const edges = this.#edgesOf(rot).near(line);
    const xs: number[] = [];
    for (let at = 0; at < edges.length; at += 4) {
      const [x0, y0, x1, y1] = edges.subarray(at, at + 4) as unknown as [
        number,
        number,
        number,
        number,
      ];
      if (y0 > line !== y1 > line) xs.push(x0 + ((line - y0) / (y1 - y0)) * (x1 - x0));
    }
    xs.sort((a, b) => a - b);
    return Array.from({ length: xs.length >> 1 }, (_, at) => [
      xs[2 * at] as number,
      xs[2 * at + 1] as number,
    ]);
  }

  #edgesOf(rot: number): BandedEdges {
    const known = this.#edges.get(rot);
    if (known) return known;
    const edges = new BandedEdges(this.#free(rot));
    this.#edges.set(rot, edges);
    return edges;
  }

  #makeRoom(left: number, right: number, more: number): void {
    const needed = Math.max(left, right) + more;
    if (needed <= this.#starts.length) return;
    const [starts, ends] = [this.#starts, this.#ends];
    this.#starts = new Float64Array(2 * needed);
    this.#ends = new Float64Array(2 * needed);
    this.#starts.set(starts);
    this.#ends.set(ends);
  }
}
