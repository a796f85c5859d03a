import type { Point } from '../outline/outline.ts';
import { grown, unionPositive } from '../outline/clip.ts';
import { convolution } from './convolution.ts';
import type { NestProblem, Ring } from './problem.ts';
import { counterClockwise, mirroredThroughOrigin, ringBounds, signedArea, turned } from './ring.ts';
import type { Shape } from './shape.ts';

/** Where the pieces may lie: the places that a piece's origin may take, by its turn. */
export class Room {
  readonly #shape: Shape;
  readonly #container: readonly Ring[];
  readonly #flaws: readonly Ring[];
  readonly #isBox: boolean;
  readonly #free = new Map<number, readonly Ring[]>();

  constructor(problem: NestProblem, shape: Shape, stripLengthMm = 0) {
    const { container, trim = 0, holes = [], flawClearance = 0 } = problem;
    this.#shape = shape;
    this.#isBox = container.type !== 'polygon' && holes.length === 0;
    const points =
      container.type === 'polygon'
        ? counterClockwise(container.points)
        : container.type === 'rect'
          ? box(container.w, container.h)
          : box(stripLengthMm, container.width);
    this.#container = this.#isBox ? [trimmedBox(points, trim)] : grown([points], -trim);
    this.#flaws = grown(holes.map(counterClockwise), flawClearance);
  }

  /** Area of the container within its trim, flaws and all. */
  get areaMm2(): number {
    return this.#container.reduce((sum, ring) => sum + signedArea(ring), 0);
  }

  /** The region, counter-clockwise outside and clockwise holes, a slack larger than what fits. */
  free(rot: number): readonly Ring[] {
    const known = this.#free.get(rot);
    if (known) return known;
    const free = this.#isBox ? this.#freeInBox(rot) : this.#freeInPolygon(rot);
    this.#free.set(rot, free);
    return free;
  }

  #freeInBox(rot: number): Ring[] {
    const piece = ringBounds([turned(this.#shape.ring, rot)]);
    const inner = ringBounds(this.#container);
    const { slack } = this.#shape;
    const [minX, maxX] = [inner.minX - piece.minX - slack, inner.maxX - piece.maxX + slack];
    const [minY, maxY] = [inner.minY - piece.minY - slack, inner.maxY - piece.maxY + slack];
    if (!(minX < maxX && minY < maxY)) return [];
    return [box(maxX - minX, maxY - minY).map(({ x, y }) => ({ x: x + minX, y: y + minY }))];
  }

  /**
   * What is left of a large box after the piece, turned through its origin, has been swept along
   * the container's edge and over the flaws.
   */
  #freeInPolygon(rot: number): Ring[] {
    const piece = mirroredThroughOrigin(turned(this.#shape.drawnIn, rot));
    const swept = [
      ...this.#container.flatMap((ring) => convolution([...ring].reverse(), piece)),
      ...this.#flaws.flatMap((ring) => convolution(ring, piece)),
    ];
    if (this.#container.length === 0) return [];
    const { minX, minY, maxX, maxY } = ringBounds([...this.#container, ...swept]);
    const around = box(maxX - minX + 2, maxY - minY + 2).map(({ x, y }) => ({
      x: x + minX - 1,
      y: y + minY - 1,
    }));
    const rings = unionPositive([around, ...swept]);
    const outer = Math.max(...rings.map(signedArea));
    return rings.filter((ring) => signedArea(ring) !== outer).map((ring) => ring.reverse());
  }
}

const box = (w: number, h: number): Point[] => [
  { x: 0, y: 0 },
  { x: w, y: 0 },
  { x: w, y: h },
  { x: 0, y: h },
];

function trimmedBox(points: Ring, trim: number): Ring {
  const { maxX, maxY } = ringBounds([points]);
  const inner = box(maxX - 2 * trim, maxY - 2 * trim);
  return inner.map(({ x, y }) => ({ x: x + trim, y: y + trim }));
}
