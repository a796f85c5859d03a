import { grown } from '../outline/clip.ts';
import { minkowskiSum } from './convolution.ts';
import { Edges } from './free-cell.ts';
import type { Pieces } from './envelope.ts';
import type { NestPlacement, Ring } from './problem.ts';
import { isInside, mirroredThroughOrigin, turned } from './ring.ts';
import type { Room } from './room.ts';
import { leastPitch, topOf } from './row-frame.ts';
import { gapFor, type Shape } from './shape.ts';

/** No-fit polygons by the turns of two pieces, and the walls of the room, made when first asked for. */
export class Surroundings {
  readonly room: Room;
  readonly #shape: Shape;
  readonly #gap: number;
  readonly #rings = new Map<string, readonly Ring[]>();
  readonly #noFit = new Map<string, Edges>();
  readonly #tops = new Map<string, Pieces>();
  readonly #walls = new Map<number, Edges>();
  /** no two pieces farther apart than this meet */
  readonly reach: number;

  constructor(room: Room, shape: Shape, gap: number) {
    this.room = room;
    this.#shape = shape;
    this.#gap = gap;
    const size = Math.max(...shape.ring.map(({ x, y }) => Math.hypot(x, y)));
    this.reach = 2 * size + gap + 1e-3;
  }

  /** Where a piece turned by `other` may not lie against one turned by `rot` at the origin. */
  noFit(rot: number, other: number): Edges {
    return remembered(this.#noFit, `${rot} ${other}`, () => new Edges(this.#ringsOf(rot, other)));
  }

  /** How high the one turned by `other` must lie above the one turned by `rot`, by its x. */
  topOf(rot: number, other: number): Pieces {
    return remembered(this.#tops, `${rot} ${other}`, () => topOf(this.#ringsOf(rot, other)));
  }

  /** The least distance along x at which equal pieces can follow each other. */
  leastPitch(rot: number): number {
    return leastPitch(this.#ringsOf(rot, rot));
  }

  #ringsOf(rot: number, other: number): readonly Ring[] {
    return remembered(this.#rings, `${rot} ${other}`, () => {
      const first = turned(this.#gap > 0 ? this.#shape.ring : this.#shape.drawnIn, rot);
      const second = mirroredThroughOrigin(turned(this.#shape.ring, other));
      return grown(minkowskiSum(first, second), gapFor(this.#gap));
    });
  }

  /** The room's edges, turned round: what lies inside them is outside the room. */
  walls(rot: number): Edges {
    return remembered(
      this.#walls,
      rot,
      () => new Edges(this.room.free(rot).map((ring) => [...ring].reverse())),
    );
  }

  /** How far outside the room a piece lies, in mm; 0 inside. */
  outside({ x, y, rot }: NestPlacement): number {
    if (isInside(this.room.free(rot), x, y)) return 0;
    return this.walls(rot).distance(x, y);
  }

  /** How deep one piece reaches into what another must have clear, in mm. */
  depth(a: NestPlacement, b: NestPlacement): number {
    const [dx, dy] = [b.x - a.x, b.y - a.y];
    if (Math.abs(dx) > this.reach || Math.abs(dy) > this.reach) return 0;
    return this.noFit(a.rot, b.rot).depth(dx, dy);
  }
}

function remembered<Key, Value>(known: Map<Key, Value>, key: Key, make: () => Value): Value {
  const found = known.get(key);
  if (found !== undefined) return found;
  const made = make();
  known.set(key, made);
  return made;
}
