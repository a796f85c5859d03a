import { workbook, writePage, type SheetCell, type SheetColumn } from './sheet-pages.ts';

/** A list as it stands on a screen, for a spreadsheet. */
export interface ListSheet {
  workshopName: string;
  pages: {
    name: string;
    columns: readonly SheetColumn[];
    rows: readonly (readonly SheetCell[])[];
  }[];
}

export function drawListSheet({ workshopName, pages }: ListSheet): Promise<Uint8Array> {
  return workbook(workshopName, (book) => {
    for (const { name, columns, rows } of pages) writePage(book, name, columns, rows);
  });
}
