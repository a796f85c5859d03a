import type { Decimal } from 'decimal.js';
import type { NestWastes } from '../nest/bounds.ts';
import { Exact, toAtMost } from '../numbers/decimal-text.ts';
import { type DrawnSide, drawnAreaMm2 } from '../leather/drawn-side.ts';
import type { Container, Lie } from './layout.ts';

/** Area of what is cut from, in mm²; of an endless strip that of one period. */
export function areaOfContainer(container: Container, periodMm: number): Decimal {
  const other = container.form === 'panel' ? container.heightMm : (container.lengthMm ?? periodMm);
  return new Exact(container.widthMm).times(other);
}

/** Area within the edge in mm², flaws included, to a thousandth. */
export function areaOfSide({ outline }: DrawnSide): Decimal {
  return new Exact(drawnAreaMm2(outline).toFixed(3));
}

type Shares = Pick<
  Lie,
  | 'containerAreaMm2'
  | 'pieceAreaMm2'
  | 'yieldPercent'
  | 'areaPerPieceMm2'
  | 'wasteBetweenPercent'
  | 'edgeWastePercent'
>;

/**
 * Where the leather goes. The cell is what one piece takes in the middle of the pattern: cell less
 * piece is lost between pieces, as the parallelogram method of the trade reckons it (Russ & Small,
 * 1922, from a summary); what the cells do not cover is lost along edges and flaws.
 */
export function sharesOf(
  area: Decimal,
  pieceAreaMm2: number,
  pieces: number,
  wastes: NestWastes | null,
): Shares {
  return {
    containerAreaMm2: toAtMost(area, 3),
    pieceAreaMm2: toAtMost(new Exact(pieceAreaMm2), 3),
    yieldPercent: area.isZero() ? '0' : percent(pieceAreaMm2 * pieces, area),
    areaPerPieceMm2: pieces === 0 ? null : toAtMost(area.div(pieces), 3),
    wasteBetweenPercent:
      wastes && atLeastZero(wastes.perCellMm2 / (wastes.perCellMm2 + pieceAreaMm2)),
    edgeWastePercent: wastes && atLeastZero(wastes.edgesMm2 / area.toNumber()),
  };
}

const percent = (part: number, whole: Decimal) =>
  toAtMost(new Exact(part).div(whole).times(100), 2);

/** Pieces at an edge may lie closer than the cell, whose spacing ends with them. */
const atLeastZero = (share: number) => toAtMost(new Exact(Math.max(0, share)).times(100), 2);
