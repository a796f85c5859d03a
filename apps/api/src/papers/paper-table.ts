import { ink, inkSoft, sheet, stitchAcross, type Paper } from './paper.ts';

interface PaperColumn<Name extends string> {
  name: Name;
  title: string;
  /** From the sheet's left margin, in points. */
  at: number;
  width: number;
}

type Cells<Name extends string> = Record<Name, string>;

/**
 * Rows under their heads, on as many pages as they take, the heads again on each. What a row is about stands in the
 * first column, figures stand to the right; each may run over several lines.
 * @returns where the last row ends, from the top of the page
 */
export function drawTable<Name extends string>(
  paper: Paper,
  columns: readonly PaperColumn<Name>[],
  rows: readonly Cells<Name>[],
  top: number,
): number {
  let y = drawHeads(paper, columns, top);
  for (const row of rows) {
    if (y + rowHeight(paper, columns, row) > sheet.bottom) {
      paper.addPage();
      y = drawHeads(paper, columns, sheet.top);
    }
    y = drawRow(paper, columns, row, { y, colour: ink }) + 6;
  }
  return y;
}

function rowHeight<Name extends string>(
  paper: Paper,
  columns: readonly PaperColumn<Name>[],
  cells: Cells<Name>,
): number {
  paper.font('plain').fontSize(10);
  return Math.max(
    ...columns.map(({ name, width }) => paper.heightOfString(cells[name], { width })),
  );
}

function drawHeads<Name extends string>(
  paper: Paper,
  columns: readonly PaperColumn<Name>[],
  y: number,
): number {
  const titles = Object.fromEntries(columns.map(({ name, title }) => [name, title])) as Cells<Name>;
  const below = drawRow(paper, columns, titles, { y, colour: inkSoft });
  stitchAcross(paper, below + 4);
  return below + 12;
}

function drawRow<Name extends string>(
  paper: Paper,
  columns: readonly PaperColumn<Name>[],
  cells: Cells<Name>,
  { y, colour }: { y: number; colour: string },
): number {
  let lowest = y;
  paper.font('plain').fontSize(10).fillColor(colour);
  columns.forEach(({ name, at, width }, place) => {
    const align = place === 0 ? 'left' : 'right';
    paper.text(cells[name], sheet.left + at, y, { width, align });
    lowest = Math.max(lowest, paper.y);
  });
  return lowest;
}
