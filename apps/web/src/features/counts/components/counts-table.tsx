import type { CountCard } from '@hidewright/contract';
import { useInfiniteQuery } from '@tanstack/react-query';
import { useMemo } from 'react';
import type { Column } from '../../../components/column.ts';
import { DataTable } from '../../../components/data-table.tsx';
import { EmptyState } from '../../../components/empty-state.tsx';
import { StateMark } from '../../../components/state-mark.tsx';
import { TextLink } from '../../../components/text-link.tsx';
import { instantText } from '../../../lib/formatting.ts';
import { useWorkshop, type Workshop } from '../../../lib/workshop.tsx';
import { countsQuery } from '../counts.queries.ts';
import { ShowEarlier } from '../../../components/show-earlier.tsx';

const columnsFor = ({ timeZone }: Workshop): Column<CountCard>[] => [
  {
    id: 'title',
    header: 'Counted',
    value: (row) => row.title,
    cell: (row) => <TextLink to={`/stockroom/counts/${row.id}`}>{row.title}</TextLink>,
    onPhone: 'title',
  },
  {
    id: 'state',
    header: 'State',
    value: (row) => row.state,
    cell: (row) => <StateMark state={row.state} />,
  },
  {
    id: 'lines',
    header: 'Lines',
    value: (row) => row.countedCount,
    cell: (row) => `${row.countedCount} of ${row.lineCount}`,
    align: 'right',
  },
  {
    id: 'opened',
    header: 'Opened',
    value: (row) => row.openedAt,
    cell: (row) => `${instantText(row.openedAt, timeZone)}, ${row.openedByName}`,
  },
  {
    id: 'settled',
    header: 'Settled',
    value: (row) => row.settledAt,
    cell: (row) =>
      row.settledAt === null
        ? '–'
        : `${instantText(row.settledAt, timeZone)}, ${row.settledByName ?? ''}`,
    onPhone: 'hidden',
  },
];

/** Every sheet, the newest first. */
export function CountsTable() {
  const workshop = useWorkshop();
  const { data, hasNextPage, fetchNextPage, isFetchingNextPage } = useInfiniteQuery(countsQuery());
  const rows = useMemo(() => data?.pages.flatMap((page) => page.items) ?? [], [data]);
  const columns = useMemo(() => columnsFor(workshop), [workshop]);
  return (
    <DataTable
      label="Count sheets"
      rows={rows}
      rowId={(row) => row.id}
      columns={columns}
      empty={
        <EmptyState title="Nothing was counted yet.">
          Choose a place, and write down what you find there.
        </EmptyState>
      }
      after={
        <ShowEarlier pages={{ hasNextPage, isFetchingNextPage, fetchNextPage }} what="sheets" />
      }
    />
  );
}
