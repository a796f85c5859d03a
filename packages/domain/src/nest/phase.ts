import type { Crystal } from './crystal.ts';
import { mostAtOnce } from './most-at-once.ts';
import type { Ring, NestPlacement } from './problem.ts';

/** How a pattern lies over a room: its origin as shares of its steps, and what it then gives. */
export interface Phase {
  count: number;
  u: number;
  v: number;
}

/** A piece of a pattern: which member, and how many steps along and across from the origin. */
export interface Cellmate {
  member: number;
  u: number;
  v: number;
}

/** A room's edges in steps of the pattern, one list per member: u0, v0, u1, v1. */
type Edges = Float64Array;

/** Counts the pieces that a pattern gives in a room and finds how it must lie to give most. */
export class PhaseSearch {
  readonly #members: readonly Edges[];
  readonly #crystal: Crystal;
  /** whether the steps from along to across turn clockwise, which turns the room's rings round */
  readonly #leftHanded: boolean;
  readonly #starts: Float64Array;
  readonly #ends: Float64Array;

  /** @param free for each of the pattern's members, the region that its origin may take */
  constructor(crystal: Crystal, free: readonly (readonly Ring[])[]) {
    this.#crystal = crystal;
    this.#members = crystal.members.map(({ at }, member) =>
      edgesOf(crystal, free[member] ?? [], at.x, at.y),
    );
    const { along, across } = crystal;
    this.#leftHanded = along.x * across.y - along.y * across.x < 0;
    const most = this.#members.reduce((sum, edges) => sum + crossingsOf(edges), 0);
    this.#starts = new Float64Array(most);
    this.#ends = new Float64Array(most);
  }

  /**
   * The best along every line: exact in one direction, in the other at what is tried.
   * @param lines further lines to look along, as shares of a step across
   */
  best(tries: number, lines: readonly number[] = []): Phase {
    let best: Phase = { count: 0, u: 0, v: 0 };
    const look = (v: number) => {
      const phase = this.#alongLine(v - Math.floor(v));
      if (phase.count > best.count) best = phase;
    };
    for (const v of [...lines, ...this.#corners()]) look(v);
    for (let at = 0; at < tries; at += 1) look((at + 0.5) / tries);
    for (let step = 0.25; tries > 0 && step > 0.05; step /= 2) {
      const { v } = best;
      for (const side of [-step, step]) look(v + side / tries);
    }
    return best;
  }

  /** The pieces that lie in the room. */
  mates({ u, v }: Phase): Cellmate[] {
    return this.#members.flatMap((edges, member) => {
      const found: Cellmate[] = [];
      for (const [line, from, to] of spans(edges, v)) {
        for (let i = Math.ceil(from - u); i <= to - u; i += 1)
          found.push({ member, u: i, v: line });
      }
      return found;
    });
  }

  /** The places of all pieces, row by row. */
  placements(phase: Phase, turns: readonly number[]): NestPlacement[] {
    const { along, across, members } = this.#crystal;
    return this.mates(phase).map((mate) => {
      const [a, b] = [mate.u + phase.u, mate.v + phase.v];
      const { x, y } = members[mate.member]?.at ?? { x: 0, y: 0 };
      return {
        x: x + a * along.x + b * across.x,
        y: y + a * along.y + b * across.y,
        rot: turns[mate.member] ?? 0,
      };
    });
  }

  /** Lines through (all but through) the room's corners if it has few, else through small parts. */
  #corners(): number[] {
    return this.#members.flatMap((edges) => {
      if (edges.length > 4 * 8) return linesThroughSmall(edges);
      return Array.from(
        { length: edges.length / 4 },
        (_, at) => edges[at * 4 + 1] as number,
      ).flatMap((v) => [v + nudge, v - nudge]);
    });
  }

  /** Every crossing to the right adds all pieces up to it, every one to the left takes them away. */
  #alongLine(v: number): Phase {
    const [starts, ends] = [this.#starts, this.#ends];
    let [base, left, right] = [0, 0, 0];
    for (const edges of this.#members) {
      for (let at = 0; at < edges.length; at += 4) {
        const [v0, v1] = [edges[at + 1] as number, edges[at + 3] as number];
        const up = v1 > v0;
        const high = up ? v1 : v0;
        let line = Math.ceil((up ? v0 : v1) - v) + v;
        if (line >= high) continue;
        const u0 = edges[at] as number;
        const slope = ((edges[at + 2] as number) - u0) / (v1 - v0);
        for (; line < high; line += 1) {
          const u = u0 + (line - v0) * slope;
          const whole = Math.floor(u);
          if (up === this.#leftHanded) {
            base -= u > whole ? whole : whole - 1;
            if (u > whole) starts[left++] = u - whole;
          } else {
            base += whole;
            ends[right++] = u - whole;
          }
        }
      }
    }
    const { gain, u } = mostAtOnce(starts.subarray(0, left).sort(), ends.subarray(0, right).sort());
    return { count: base + gain, u, v };
  }
}

/** Parts of a room lower than this, in steps, could be missed by lines that are spread evenly. */
const small = 0.6;

/** Lines low, in the middle and high through every closed part of a room that is small. */
function linesThroughSmall(edges: Edges): number[] {
  const lines: number[] = [];
  let [low, high] = [Infinity, -Infinity];
  for (let at = 0; at < edges.length; at += 4) {
    low = Math.min(low, edges[at + 1] as number);
    high = Math.max(high, edges[at + 1] as number);
    const isLast =
      at + 4 >= edges.length || edges[at + 4] !== edges[at + 2] || edges[at + 5] !== edges[at + 3];
    if (!isLast) continue;
    if (high - low < small) {
      for (const share of [0.02, 0.2, 0.5, 0.8, 0.98]) lines.push(low + share * (high - low));
    }
    [low, high] = [Infinity, -Infinity];
  }
  return lines;
}

/** In shares of a step: within what the room is drawn larger by. */
const nudge = 1e-9;

function edgesOf({ along, across }: Crystal, rings: readonly Ring[], x: number, y: number): Edges {
  const cross = along.x * across.y - along.y * across.x;
  const edges: number[] = [];
  for (const ring of rings) {
    const inSteps = ring.map((point) => {
      const [dx, dy] = [point.x - x, point.y - y];
      return [
        (dx * across.y - dy * across.x) / cross,
        (along.x * dy - along.y * dx) / cross,
      ] as const;
    });
    let from = inSteps[inSteps.length - 1];
    for (const to of inSteps) {
      if (from) edges.push(from[0], from[1], to[0], to[1]);
      from = to;
    }
  }
  return Float64Array.from(edges);
}

/** At most so many times whole lines cross the edges. */
function crossingsOf(edges: Edges): number {
  let sum = 0;
  for (let at = 0; at < edges.length; at += 4) {
    sum += Math.ceil(Math.abs((edges[at + 3] as number) - (edges[at + 1] as number))) + 1;
  }
  return sum;
}

/** The stretches of the lines v, v + 1, … that lie in the room: line, from u, to u. */
function spans(edges: Edges, v: number): [line: number, from: number, to: number][] {
  const lines: number[][] = [];
  let first = Infinity;
  for (let at = 1; at < edges.length; at += 2) first = Math.min(first, edges[at] as number);
  first = Math.floor(first - v);
  for (let at = 0; at < edges.length; at += 4) {
    const [v0, v1] = [edges[at + 1] as number, edges[at + 3] as number];
    const [low, high] = v0 < v1 ? [v0, v1] : [v1, v0];
    for (let line = Math.ceil(low - v); line + v < high; line += 1) {
      const [u0, u1] = [edges[at] as number, edges[at + 2] as number];
      const u = u0 + ((line + v - v0) / (v1 - v0)) * (u1 - u0);
      (lines[line - first] ??= []).push(u);
    }
  }
  const found: [number, number, number][] = [];
  lines.forEach((us, line) => {
    if (us.length > 2) us.sort((a, b) => a - b);
    for (let at = 0; at + 1 < us.length; at += 2) {
      const [a, b] = [us[at] as number, us[at + 1] as number];
      found.push([line + first, Math.min(a, b), Math.max(a, b)]);
    }
  });
  return found;
}
