import { PassThrough } from 'node:stream';
import { buffer } from 'node:stream/consumers';
import ExcelJS from 'exceljs';

/** How a column is typed: text stays text whatever it begins with, numbers and days are real ones. */
type Kind = 'text' | 'count' | 'money' | 'price' | 'measure' | 'percent' | 'day';

export interface SheetColumn {
  title: string;
  width: number;
  kind: Kind;
}

export type SheetCell = string | number | null;

const formats: Record<Kind, string> = {
  text: '@',
  count: '#,##0',
  money: '#,##0.00',
  price: '#,##0.00##',
  measure: '#,##0.###',
  percent: '0.####',
  day: 'yyyy-mm-dd',
};

export const column = (title: string, kind: Kind, width = 14): SheetColumn => ({
  title,
  kind,
  width,
});

export type Book = ExcelJS.stream.xlsx.WorkbookWriter;

/** A workbook of the pages that `fill` writes. */
export async function workbook(creator: string, fill: (book: Book) => void): Promise<Uint8Array> {
  const out = new PassThrough();
  const bytes = buffer(out);
  const book = new ExcelJS.stream.xlsx.WorkbookWriter({
    stream: out,
    useStyles: true,
    useSharedStrings: true,
  });
  book.creator = creator;
  fill(book);
  await book.commit();
  return bytes;
}

/** One page with its head row, then rows alone. */
export function writePage(
  book: Book,
  name: string,
  columns: readonly SheetColumn[],
  rows: readonly (readonly SheetCell[])[],
): void {
  const page = book.addWorksheet(name, { views: [{ state: 'frozen', ySplit: 1 }] });
  page.columns = columns.map(({ title, width, kind }) => ({
    header: title,
    width,
    style: { numFmt: formats[kind] },
  }));
  page.getRow(1).font = { bold: true };
  page.getRow(1).commit();
  for (const cells of rows) {
    page.addRow(cells.map((cell, at) => typed(cell, columns[at]?.kind ?? 'text'))).commit();
  }
  page.commit();
}

function typed(cell: SheetCell, kind: Kind): ExcelJS.CellValue {
  if (cell === null || cell === '') return null;
  if (kind === 'text') return String(cell);
  if (kind === 'day') return new Date(`${cell}T00:00:00Z`);
  return Number(cell);
}
