import type { nestAnswer, NestBounds } from '@hidewright/domain';

/** What one case of the yield bench gave, beside its file's reference figures. */
export interface YieldRow {
  id: string;
  reference: Record<string, number>;
  bound: NestBounds;
  line: ReturnType<typeof nestAnswer>;
  ms: { regular: number; best: number; calibration: number };
}

const headings = [
  ['case', 'regular', 'ref', 'best', 'ref', 'bound', 'density', 'ref'],
  ['ms regular', '÷ loop', 'ms best', '÷ loop'],
].flat();

/** The table for people, on standard error. */
export function printYieldTable(rows: readonly YieldRow[]): void {
  const all = [headings, ...rows.map(cellsOf)];
  const widths = headings.map((_, column) => Math.max(...all.map((row) => row[column]!.length)));
  for (const row of all) {
    const cells = row.map((cell, at) =>
      at === 0 ? cell.padEnd(widths[0]!) : cell.padStart(widths[at]!),
    );
    console.error(cells.join('  '));
  }
}

function cellsOf({ id, reference, bound, line, ms }: YieldRow): string[] {
  const text = (value: number | null | undefined, places = 0) => value?.toFixed(places) ?? '';
  const strip = line.mmPerPiece !== undefined;
  return [
    id,
    strip ? text(line.mmPerPiece, 4) : text(line.regular.placements.length),
    strip ? text(reference['mm_per_piece'], 4) : text(reference['regular']),
    strip ? lengthPerPiece(line) : text(line.placements.length),
    text(reference['best']),
    strip ? text(bound.mmPerPiece, 4) : text(bound.pieces),
    text(line.density, 6),
    text(reference['plane_density'], 6),
    text(ms.regular),
    text(ms.regular / ms.calibration, 1),
    text(ms.best),
    text(ms.best / ms.calibration, 1),
  ];
}

/** Of a strip, the best is how many pieces in a row were laid. */
const lengthPerPiece = ({ placements }: YieldRow['line']): string => `${placements.length} pcs`;
