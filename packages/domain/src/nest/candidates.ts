import type { Crystal } from './crystal.ts';
import { areaPerPiece } from './crystal.ts';
import { PhaseSearch, type Phase } from './phase.ts';
import type { NestPlacement } from './problem.ts';
import type { Room } from './room.ts';

/** A pattern as it lies in the container, with the turn of its upright pieces. */
export interface Candidate {
  crystal: Crystal;
  rot: number;
  phase: Phase;
}

/** The best candidates seen so far, the first of equals before the others. */
export class Candidates {
  readonly #room: Room;
  readonly #most: number;
  readonly #kept: Candidate[] = [];

  constructor(room: Room, most: number) {
    this.#room = room;
    this.#most = most;
  }

  /** @param tries how many lines of the pattern are looked along, besides the room's corners */
  consider(crystal: Crystal, rot: number, tries: number): void {
    if (!(areaPerPiece(crystal) > 1e-6)) return;
    const free = crystal.members.map(({ turn }) => this.#room.free(fullTurn(rot + turn)));
    if (free.every((rings) => rings.length === 0)) return;
    const phase = new PhaseSearch(crystal, free).best(tries);
    if (phase.count <= this.#worst()) return;
    const after = this.#kept.findIndex((other) => other.phase.count < phase.count);
    this.#kept.splice(after < 0 ? this.#kept.length : after, 0, { crystal, rot, phase });
    if (this.#kept.length > this.#most) this.#kept.pop();
  }

  #worst(): number {
    if (this.#kept.length < this.#most) return 0;
    return this.#kept[this.#kept.length - 1]?.phase.count ?? 0;
  }

  /** Most pieces first. */
  get kept(): readonly Candidate[] {
    return this.#kept;
  }

  placements({ crystal, rot, phase }: Candidate): NestPlacement[] {
    const turns = crystal.members.map(({ turn }) => fullTurn(rot + turn));
    const free = turns.map((turn) => this.#room.free(turn));
    return new PhaseSearch(crystal, free).placements(phase, turns);
  }
}

/** Within [0, 360). */
export const fullTurn = (degrees: number): number => ((degrees % 360) + 360) % 360;
