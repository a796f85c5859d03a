import type { ReactNode } from 'react';

/** One column of a table: what it holds, how it looks, what a person would add up. */
export interface Column<Row> {
  id: string;
  header: string;
  /** What it is sorted and filtered by; decimal texts sort as numbers. */
  value: (row: Row) => string | number | null | undefined;
  /** How it is shown; its value, if not said. */
  cell?: ((row: Row) => ReactNode) | undefined;
  /** Figures stand at the right. */
  align?: 'left' | 'right' | undefined;
  /** In the totals row, over the rows that the filter leaves. */
  total?: ((rows: readonly Row[]) => ReactNode) | undefined;
  sortable?: boolean | undefined;
  /** On a phone a row is a card: this column is its title, or is left out. */
  onPhone?: 'title' | 'line' | 'hidden' | undefined;
}
