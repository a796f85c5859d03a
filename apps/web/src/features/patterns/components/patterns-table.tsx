import type { PatternSummary } from '@hidewright/contract';
import type { ReactNode } from 'react';
import type { Column } from '../../../components/column.ts';
import { DataTable } from '../../../components/data-table.tsx';
import { StateMark } from '../../../components/state-mark.tsx';
import { TextLink } from '../../../components/text-link.tsx';
import { percentText } from '../../../lib/formatting.ts';
import { piecesWords } from '../layout-words.ts';
import { OutlineMark } from './outline-mark.tsx';

const columns: Column<PatternSummary>[] = [
  {
    id: 'name',
    header: 'Pattern',
    value: (row) => row.name,
    cell: (row) => (
      <span className="inline-flex items-center gap-3 align-middle">
        <OutlineMark path={row.outlinePath} />
        <TextLink to={`/pattern-room/patterns/${row.id}`}>{row.name}</TextLink>
      </span>
    ),
    onPhone: 'title',
  },
  { id: 'description', header: 'Outline', value: (row) => row.description },
  { id: 'leather', header: 'Leather', value: (row) => row.leatherName },
  {
    id: 'pieces',
    header: 'Pieces',
    value: (row) => row.pieces,
    cell: (row) => (row.pieces === null ? '–' : piecesWords(row.pieces, row.form)),
    align: 'right',
  },
  {
    id: 'yield',
    header: 'Yield',
    value: (row) => row.yieldPercent,
    cell: (row) => (row.yieldPercent === null ? '–' : percentText(row.yieldPercent)),
    align: 'right',
  },
  {
    id: 'version',
    header: 'Version',
    value: (row) => row.versionNumber,
    align: 'right',
    onPhone: 'hidden',
  },
  {
    id: 'standing',
    header: 'Standing',
    value: (row) => (row.active ? 'in use' : 'put away'),
    cell: (row) => <StateMark state={row.active ? 'in use' : 'put away'} />,
    onPhone: 'hidden',
  },
];

export function PatternsTable({
  rows,
  empty,
}: {
  rows: readonly PatternSummary[];
  empty: ReactNode;
}) {
  return (
    <DataTable
      label="Patterns"
      rows={rows}
      rowId={(row) => row.id}
      columns={columns}
      empty={empty}
      filterLabel="Filter patterns"
      sortedBy={{ id: 'name' }}
    />
  );
}
