import {
  columnFilteringFeature,
  createFilteredRowModel,
  createSortedRowModel,
  globalFilteringFeature,
  rowSortingFeature,
  tableFeatures,
} from '@tanstack/react-table';
import { isFigure } from '../lib/units.ts';

const collator = new Intl.Collator('en', { numeric: true, sensitivity: 'base' });

/** Figures by size, words by the alphabet with their numbers in order; what is empty comes first. */
export function compareValues(left: unknown, right: unknown): number {
  const [a, b] = [String(left ?? ''), String(right ?? '')];
  if (isFigure(a) && isFigure(b)) return Number(a) - Number(b);
  return collator.compare(a, b);
}

/** Every word that was typed must be somewhere in the cell. */
export function holdsWords(value: unknown, typed: string): boolean {
  const text = String(value ?? '').toLocaleLowerCase();
  return text.includes(typed.trim().toLocaleLowerCase());
}

export const features = tableFeatures({
  columnFilteringFeature,
  globalFilteringFeature,
  rowSortingFeature,
  filteredRowModel: createFilteredRowModel(),
  sortedRowModel: createSortedRowModel(),
  filterFns: {
    words: (row, columnId, typed: string) => holdsWords(row.getValue(columnId), typed),
  },
  sortFns: {
    values: (a, b, columnId) => compareValues(a.getValue(columnId), b.getValue(columnId)),
  },
});
export type Features = typeof features;
