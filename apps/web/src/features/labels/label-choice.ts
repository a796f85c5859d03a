import type { printLabels } from '@hidewright/contract';
import { labelSheet, type QueryInputOf } from '@hidewright/contract';
import type { labelPages } from '@hidewright/domain';
import { labelSpots, DomainError } from '@hidewright/domain';

/** The measures of a sheet, as they were typed. */
export type SheetMeasures = Record<
  | 'page'
  | 'columns'
  | 'rows'
  | 'widthMm'
  | 'heightMm'
  | 'leftMm'
  | 'topMm'
  | 'gapAcrossMm'
  | 'gapDownMm'
  | 'start',
  string
>;

const grid = (page: keyof typeof labelPages, measures: number[]): SheetMeasures => {
  const [columns, rows, widthMm, heightMm, leftMm, topMm, gapAcrossMm, gapDownMm] = measures.map(
    String,
  ) as [string, string, string, string, string, string, string, string];
  const at = { columns, rows, widthMm, heightMm, leftMm, topMm, gapAcrossMm, gapDownMm };
  return { page, ...at, start: '1' };
};

/** Plain grids to begin with; whoever has other sheets types their measures. */
export const plainGrids: readonly { label: string; measures: SheetMeasures }[] = [
  { label: 'A4, two by six, to cut apart', measures: grid('a4', [2, 6, 90, 44, 12, 12, 6, 2]) },
  { label: 'A4, three by nine, small', measures: grid('a4', [3, 9, 60, 28, 12, 14, 3, 2]) },
  {
    label: 'Letter, two by five, to cut apart',
    measures: grid('letter', [2, 5, 92, 48, 13, 14, 6, 2]),
  },
];

/** What to ask for; or the first thing that must change. */
export function askFor(
  lots: readonly number[],
  hardware: readonly number[],
  measures: SheetMeasures,
): { query: QueryInputOf<typeof printLabels> } | { wrong: string } {
  const typed = { ...measures, lots: lots.join(','), hardware: hardware.join(',') };
  const parsed = labelSheet.safeParse(typed);
  if (!parsed.success) return { wrong: parsed.error.issues[0]?.message ?? 'Check the measures.' };
  const count = lots.length + hardware.length;
  if (count === 0) return { wrong: 'Choose at least one lot or bin.' };
  try {
    labelSpots(parsed.data, count, parsed.data.start);
  } catch (error) {
    if (error instanceof DomainError) return { wrong: error.message };
    throw error;
  }
  return { query: typed as unknown as QueryInputOf<typeof printLabels> };
}
