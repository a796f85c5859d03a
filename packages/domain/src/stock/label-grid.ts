import { InvalidInput } from '../errors/domain-error.ts';

export const labelPages = {
  a4: { widthMm: 210, heightMm: 297 },
  letter: { widthMm: 215.9, heightMm: 279.4 },
} as const;

/** A sheet of labels as its owner measures it, in mm. */
export interface LabelGrid {
  page: keyof typeof labelPages;
  columns: number;
  rows: number;
  widthMm: number;
  heightMm: number;
  /** from the sheet's left and upper edge to the first label */
  leftMm: number;
  topMm: number;
  /** between two labels */
  gapAcrossMm: number;
  gapDownMm: number;
}

export interface LabelSpot {
  /** 0 is the first sheet */
  sheet: number;
  /** its upper left corner, in mm from the sheet's */
  xMm: number;
  yMm: number;
}

/** Hundredths of a millimetre of rounding are no overhang. */
const slackMm = 0.01;

/**
 * Where so many labels lie, row by row, beginning at the `start`-th label (1 or more) of a sheet that was begun.
 * @throws {InvalidInput} where the grid is wider or higher than its sheet, or the sheet has no such label
 */
export function labelSpots(grid: LabelGrid, count: number, start: number): LabelSpot[] {
  const { columns, rows } = grid;
  requireFit('columns', reach(grid.leftMm, columns, grid.widthMm, grid.gapAcrossMm), {
    most: labelPages[grid.page].widthMm,
    words: 'side by side',
  });
  requireFit('rows', reach(grid.topMm, rows, grid.heightMm, grid.gapDownMm), {
    most: labelPages[grid.page].heightMm,
    words: 'one below the other',
  });
  const perSheet = columns * rows;
  if (start < 1 || start > perSheet) {
    throw new InvalidInput('start', `A sheet has ${perSheet} labels: begin at one of them.`);
  }
  return Array.from({ length: count }, (_, at) => {
    const place = start - 1 + at;
    const onSheet = place % perSheet;
    return {
      sheet: Math.floor(place / perSheet),
      xMm: grid.leftMm + (onSheet % columns) * (grid.widthMm + grid.gapAcrossMm),
      yMm: grid.topMm + Math.floor(onSheet / columns) * (grid.heightMm + grid.gapDownMm),
    };
  });
}

const reach = (edge: number, count: number, size: number, gap: number): number =>
  edge + count * size + (count - 1) * gap;

function requireFit(field: string, needs: number, sheet: { most: number; words: string }): void {
  if (needs <= sheet.most + slackMm) return;
  throw new InvalidInput(
    field,
    `So many labels ${sheet.words} need ${Number(needs.toFixed(2))} mm, and the sheet has ${sheet.most} mm. Take fewer, or smaller ones.`,
  );
}
