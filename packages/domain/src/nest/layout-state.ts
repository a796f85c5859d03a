import { grown } from './clip.ts';
import { minkowskiSum } from './convolution.ts';
import { Edges } from './free-cell.ts';
import type { NestPlacement } from './problem.ts';
import { isInside, mirroredThroughOrigin, turned } from './ring.ts';
import type { Room } from './room.ts';
import { gapFor, type Shape } from './shape.ts';

/** No-fit polygons by the turns of two pieces, and the walls of the room, made when first asked for. */
export class Surroundings {
  readonly room: Room;
  readonly #shape: Shape;
  readonly #gap: number;
  readonly #noFit = new Map<string, Edges>();
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
    const key = `${rot} ${other}`;
    const known = this.#noFit.get(key);
    if (known) return known;
    const first = turned(this.#gap > 0 ? this.#shape.ring : this.#shape.drawnIn, rot);
    const second = mirroredThroughOrigin(turned(this.#shape.ring, other));
    const made = new Edges(grown(minkowskiSum(first, second), gapFor(this.#gap)));
    this.#noFit.set(key, made);
    return made;
  }

  /** The room's edges, turned round: what lies inside them is outside the room. */
  walls(rot: number): Edges {
    const known = this.#walls.get(rot);
    if (known) return known;
    const made = new Edges(this.room.free(rot).map((ring) => [...ring].reverse()));
    this.#walls.set(rot, made);
    return made;
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
