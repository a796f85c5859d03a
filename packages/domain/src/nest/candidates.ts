import { areaPerPiece, type Crystal } from './crystal.ts';
import { deepestConflict } from './crystal-faults.ts';
import { PhaseSearch, type Phase } from './phase.ts';
import type { NestPlacement, Ring } from './problem.ts';
import { ringBounds, turned } from './ring.ts';
import type { Room } from './room.ts';
import type { NoFitPair } from './row-frame.ts';

/** A pattern as it lies in the container, with the turn of its upright pieces. */
export interface Candidate {
  crystal: Crystal;
  rot: number;
  phase: Phase;
}

/** The best candidates seen so far, the first of equals before the others. */
export class Candidates {
  readonly #room: Room;
  readonly #noFit: NoFitPair;
  readonly #kept: Candidate[] = [];
  readonly #runnersUp = new Map<string, Candidate>();
  readonly #below: number;

  /** @param below by how many fewer pieces than the best others are remembered as well */
  constructor(room: Room, noFit: NoFitPair, below = 0) {
    this.#room = room;
    this.#noFit = noFit;
    this.#below = below;
  }

  /**
   * Keeps a pattern that gives more than the best so far and can be cut.
   * @param tries how many lines of the pattern are looked along, besides the room's corners
   */
  consider(crystal: Crystal, rot: number, tries: number, lines: readonly number[] = []): void {
    if (!(areaPerPiece(crystal) > 1e-6)) return;
    const free = this.#freeFor(crystal, rot);
    if (free.every((rings) => rings.length === 0)) return;
    if (mostInBox(crystal, free) <= this.most - this.#below) return;
    const phase = new PhaseSearch(crystal, free).best(tries, lines);
    if (phase.count > this.most - this.#below) this.#remember({ crystal, rot, phase });
    if (phase.count <= this.most || !this.#canBeCut(crystal, rot)) return;
    this.#kept.unshift({ crystal, rot, phase });
  }

  /** The most pieces so far. */
  get most(): number {
    return this.#kept[0]?.phase.count ?? 0;
  }

  /** Most pieces first. */
  get kept(): readonly Candidate[] {
    return this.#kept;
  }

  /** What gives all but as many, one of each density, most pieces first. */
  runnersUp(most: number): Candidate[] {
    return [...this.#runnersUp.values()]
      .filter(({ phase }) => phase.count > this.most - this.#below)
      .sort((a, b) => b.phase.count - a.phase.count)
      .filter(({ crystal, rot }) => this.#canBeCut(crystal, rot))
      .slice(0, most);
  }

  #remember(candidate: Candidate): void {
    const { crystal, phase } = candidate;
    const key = `${phase.count} ${areaPerPiece(crystal).toFixed(0)} ${crystal.members.length}`;
    if (!this.#runnersUp.has(key)) this.#runnersUp.set(key, candidate);
  }

  placements({ crystal, rot, phase }: Candidate): NestPlacement[] {
    const turns = crystal.members.map(({ turn }) => fullTurn(rot + turn));
    return new PhaseSearch(crystal, this.#freeFor(crystal, rot)).placements(phase, turns);
  }

  #freeFor(crystal: Crystal, rot: number) {
    return crystal.members.map(({ turn }) => this.#room.free(fullTurn(rot + turn)));
  }

  #canBeCut(crystal: Crystal, rot: number): boolean {
    const lying = (rings: readonly Ring[]) => rings.map((ring) => turned(ring, rot));
    const { same, turned: halfTurned } = this.#noFit;
    const noFit = { same: lying(same), turned: halfTurned && lying(halfTurned) };
    return deepestConflict(crystal, noFit) < 1e-5;
  }
}

/**
 * For rows along an edge of a box, the most pieces that any way of laying the pattern could give;
 * otherwise no bound.
 */
function mostInBox(
  { along, across, members }: Crystal,
  free: readonly (readonly Ring[])[],
): number {
  const lying = Math.abs(along.y) < 1e-9;
  if (!lying && Math.abs(along.x) > 1e-9) return Infinity;
  return members.reduce((sum, _, member) => {
    const rings = free[member] ?? [];
    if (rings.length !== 1 || rings[0]?.length !== 4) return rings.length === 0 ? sum : Infinity;
    const { minX, minY, maxX, maxY } = ringBounds(rings);
    const [long, wide] = lying ? [maxX - minX, maxY - minY] : [maxY - minY, maxX - minX];
    const [pitch, step] = lying ? [along.x, across.y] : [along.y, across.x];
    return sum + Math.floor(1 + long / Math.abs(pitch)) * Math.floor(1 + wide / Math.abs(step));
  }, 0);
}

/** Within [0, 360). */
export const fullTurn = (degrees: number): number => ((degrees % 360) + 360) % 360;
