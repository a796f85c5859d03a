import { Exact, toAtMost } from '../numbers/decimal-text.ts';
import { outlineArea } from '../outline/measure.ts';
import { outlinePolygon } from '../outline/polygon.ts';
import { bestRows, type Area, type Found } from './best-rows.ts';
import { checkLayoutInput, checkPieceCount } from './check-layout-input.ts';
import type { Container, Layout, LayoutInput } from './layout.ts';
import { place } from './place.ts';
import { pieceBound } from './piece-bound.ts';

/**
 * Lays copies of an outline on a panel or a strip in regular rows, by the real clearance between
 * the curves, and keeps the arrangement that gives most. The same input always gives the same
 * layout; an outline that does not fit gives none. Curves are followed within 0.01 mm; spacing is
 * kept within 0.001 mm of the polygon.
 * @throws InvalidInput · NotWorkable beyond 20,000 pieces
 */
export function layOut(input: LayoutInput): Layout {
  checkLayoutInput(input);
  const { outline, spacingMm, container } = input;
  const polygon = outlinePolygon(outline);
  const pieceArea = outlineArea(outline);
  const strip = container.form === 'strip';
  const endless = strip ? bestRows(outline, polygon, spacingMm, endlessArea(input)) : null;
  const period = endless && periodOf(endless);
  const size = sizeOf(container, period?.mm ?? 0);
  const bound = pieceBound(input, pieceArea, size);
  checkPieceCount(bound);
  const found =
    strip && container.lengthMm === undefined
      ? endless
      : bestRows(outline, polygon, spacingMm, areaOf(input, size));
  return {
    ...arrangement(found),
    ...shares(found, size, pieceArea),
    by: 'rows',
    container,
    boundPieces: bound,
    mmPerPiece: period && Math.round((period.mm / period.pieces) * 1e4) / 1e4,
    period,
  };
}

interface Size {
  x: number;
  y: number;
}

function sizeOf(container: Container, periodMm: number): Size {
  return container.form === 'panel'
    ? { x: container.widthMm, y: container.heightMm }
    : { x: container.lengthMm ?? periodMm, y: container.widthMm };
}

function areaOf({ trimMm }: LayoutInput, size: Size): Area {
  const [width, height] = [size.x - 2 * trimMm, size.y - 2 * trimMm];
  return { width, height, trimX: trimMm, trimY: trimMm };
}

const endlessArea = ({ trimMm, container }: LayoutInput): Area => ({
  width: Infinity,
  height: container.widthMm - 2 * trimMm,
  trimX: 0,
  trimY: trimMm,
});

function periodOf({ piece, fit, setting }: Found): { mm: number; pieces: number } {
  const { periodX, periodY } = fit.cell;
  const mm = setting.upright ? periodY : periodX;
  return { mm: Math.round(mm * 1e4) / 1e4, pieces: place(piece, fit, setting).placements.length };
}

type Arrangement = Pick<
  Layout,
  'pieces' | 'placements' | 'pitchMm' | 'rowStepMm' | 'shiftMm' | 'rows' | 'piecesPerRow' | 'turned'
>;

function arrangement(found: Found | null): Arrangement {
  if (!found) {
    const nothing = { pitchMm: null, rowStepMm: null, shiftMm: null, rows: 0, piecesPerRow: 0 };
    return { pieces: 0, placements: [], turned: 'none', ...nothing };
  }
  const { cell } = found.fit;
  const { placements, rows, piecesPerRow } = place(found.piece, found.fit, found.setting);
  return {
    pieces: placements.length,
    placements,
    pitchMm: tidy((cell.periodX * cell.rowsInCell) / cell.members.length),
    rowStepMm: tidy(cell.periodY / cell.rowsInCell),
    shiftMm: tidy(((cell.shift % cell.periodX) + cell.periodX) % cell.periodX),
    rows,
    piecesPerRow,
    turned: cell.turned,
  };
}

const tidy = (value: number): number => Math.round(value * 1e4) / 1e4;

function shares(found: Found | null, size: Size, pieceArea: number) {
  const pieces = found ? place(found.piece, found.fit, found.setting).placements.length : 0;
  const area = new Exact(size.x).times(size.y);
  const used = new Exact(pieceArea).times(pieces);
  return {
    containerAreaMm2: toAtMost(area, 3),
    pieceAreaMm2: toAtMost(new Exact(pieceArea), 3),
    yieldPercent: area.isZero() ? '0' : toAtMost(used.div(area).times(100), 2),
    areaPerPieceMm2: pieces === 0 ? null : toAtMost(area.div(pieces), 3),
  };
}
