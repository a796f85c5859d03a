import type { Bounds } from '../outline/outline.ts';
import { fullTurn } from './candidates.ts';
import type { Pattern } from './dense-patterns.ts';
import { freeBases } from './free-bases.ts';
import { stripSeeds } from './plan-strip.ts';
import type { NestProblem } from './problem.ts';
import { ringBounds, turned } from './ring.ts';
import { type Base, basesOf, type Shape } from './shape.ts';
import { cellConflict, type StripCell } from './strip-cell.ts';

/** A repeat with its pieces just clear of the strip's lower cut, and the width that they ask for. */
export interface CutCell {
  cell: StripCell;
  widthMm: number;
}

/** Widths tried, as shares of the widest: every repeat is then cut as narrow as it may be. */
const shares = [1, 0.82, 0.64, 0.46, 0.3];
/** So many of the densest repeats of each width, and of all widths together, are kept. */
const [mostOfWidth, mostCells] = [24, 60];
/** Ways to lie that are tried where any angle is allowed. */
const mostFree = 3;

/** Whole rows, along the cuts or across, for the strips that a side is cut into. */
export class CutCells {
  readonly #problem: NestProblem;
  readonly #shape: Shape;
  readonly #widestMm: number;
  readonly #free: readonly Base[];
  readonly #boxes = new Map<number, Bounds>();
  readonly #known = new Map<string, CutCell[]>();

  constructor(problem: NestProblem, shape: Shape, patterns: readonly Pattern[], widestMm: number) {
    this.#problem = problem;
    this.#widestMm = widestMm;
    this.#shape = shape;
    this.#free = freeBases(patterns, shape).slice(0, mostFree);
  }

  /** For cuts along x, the densest first. */
  for(rotations: NestProblem['rotations']): CutCell[] {
    const key = keyOfTurns(rotations);
    const known = this.#known.get(key) ?? this.#densest(rotations);
    this.#known.set(key, known);
    return known;
  }

  #densest(rotations: NestProblem['rotations']): CutCell[] {
    const bases = basesOf(rotations, this.#shape.symmetrical) ?? this.#free;
    const cells = new Map<string, CutCell>();
    for (const share of shares) {
      for (const cut of this.#densestOf(this.#widestMm * share, bases)) {
        if (!cells.has(keyOf(cut))) cells.set(keyOf(cut), cut);
      }
    }
    return densestOf([...cells.values()], mostCells);
  }

  #densestOf(width: number, bases: readonly Base[]): CutCell[] {
    const strip: NestProblem = {
      ...this.#problem,
      trim: this.#clearMm,
      container: { type: 'strip', width },
    };
    const cuts = stripSeeds(strip, this.#shape, bases).map(({ cell, rules }) => ({
      ...this.#narrowed(cell, width),
      rules,
    }));
    return densestOf(cuts, mostOfWidth).filter(
      ({ cell, rules }) => cellConflict(cell, rules) < 1e-5,
    );
  }

  /** To a tenth of a millimetre, as a hand sets a width. */
  #narrowed({ periodMm, pieces }: StripCell, widestMm: number): CutCell {
    const clear = this.#clearMm;
    const low = Math.min(...pieces.map(({ y, rot }) => y + this.#boxOf(rot).minY));
    const high = Math.max(...pieces.map(({ y, rot }) => y + this.#boxOf(rot).maxY));
    const lowered = pieces.map(({ x, y, rot }) => ({ x, y: y - low + clear, rot }));
    const needed = Math.ceil((high - low + 2 * clear) * 10 - 1e-6) / 10;
    return {
      cell: { periodMm, pieces: lowered },
      widthMm: Math.min(widestMm, needed),
    };
  }

  #boxOf(rot: number): Bounds {
    const known = this.#boxes.get(rot) ?? ringBounds([turned(this.#shape.ring, rot)]);
    this.#boxes.set(rot, known);
    return known;
  }

  /** Pieces on both sides of a cut keep their spacing as well. */
  get #clearMm(): number {
    return Math.max(this.#problem.trim ?? 0, this.#problem.gap / 2);
  }
}

const keyOf = ({ cell, widthMm }: CutCell): string =>
  [widthMm, cell.periodMm.toFixed(3), ...cell.pieces.map(({ rot }) => fullTurn(rot))].join(' ');

const keyOfTurns = (rotations: NestProblem['rotations']): string =>
  rotations === 'free'
    ? 'free'
    : rotations
        .map(fullTurn)
        .sort((a, b) => a - b)
        .join(' ');

const areaOf = ({ cell, widthMm }: CutCell): number =>
  (widthMm * cell.periodMm) / cell.pieces.length;

const densestOf = <Cut extends CutCell>(cuts: readonly Cut[], most: number): Cut[] =>
  [...cuts].sort((a, b) => areaOf(a) - areaOf(b)).slice(0, most);
