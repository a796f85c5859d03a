import { Exact, readWhole, toAtMost } from '../numbers/decimal-text.ts';
import { checkContainer } from './check-layout-input.ts';
import type { Layout } from './layout.ts';

/**
 * A layout counted by hand: 'I get 21 from 11 × 13 in'. It has no picture.
 * @throws InvalidInput
 */
export function handCount({
  pieces,
  widthMm,
  heightMm,
}: {
  pieces: number;
  widthMm: number;
  heightMm: number;
}): Layout {
  readWhole(pieces, 'pieces', 1, 20_000);
  const container = { form: 'panel' as const, widthMm, heightMm };
  checkContainer(container);
  const area = new Exact(widthMm).times(heightMm);
  return {
    by: 'hand count',
    pieces,
    placements: [],
    pitchMm: null,
    rowStepMm: null,
    shiftMm: null,
    rows: null,
    piecesPerRow: null,
    rowPieces: null,
    turned: 'none',
    container,
    containerAreaMm2: toAtMost(area, 3),
    pieceAreaMm2: null,
    yieldPercent: null,
    areaPerPieceMm2: toAtMost(area.div(pieces), 3),
    wasteBetweenPercent: null,
    edgeWastePercent: null,
    offcut: null,
    boundPieces: null,
    piecesInRows: null,
    mmPerPiece: null,
    period: null,
  };
}
