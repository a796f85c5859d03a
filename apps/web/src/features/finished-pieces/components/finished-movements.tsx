import type { FinishedMovement } from '@hidewright/contract';
import { useInfiniteQuery } from '@tanstack/react-query';
import { useMemo } from 'react';
import type { Column } from '../../../components/column.ts';
import { DataTable } from '../../../components/data-table.tsx';
import { EmptyState } from '../../../components/empty-state.tsx';
import { TextLink } from '../../../components/text-link.tsx';
import { countText, instantText, moneyText } from '../../../lib/formatting.ts';
import { useWorkshop, type Workshop } from '../../../lib/workshop.tsx';
import { finishedMovementsQuery } from '../finished-pieces.queries.ts';
import { movedWords } from '../finished-words.ts';
import { ShowEarlier } from '../../../components/show-earlier.tsx';

function columnsFor(
  { currency, timeZone, today }: Workshop,
  withValues: boolean,
): Column<FinishedMovement>[] {
  const value: Column<FinishedMovement> = {
    id: 'value',
    header: `At cost, ${currency}`,
    value: (row) => row.value,
    cell: (row) => row.value !== undefined && moneyText(row.value),
    align: 'right',
  };
  return [
    {
      id: 'at',
      header: 'When',
      value: (row) => row.at,
      cell: (row) => instantText(row.at, timeZone, today),
      onPhone: 'title',
    },
    { id: 'kind', header: 'What', value: (row) => movedWords[row.kind] },
    {
      id: 'quantity',
      header: 'How many',
      value: (row) => row.quantity,
      cell: (row) => `${row.quantity > 0 ? '+' : ''}${countText(row.quantity)}`,
      align: 'right',
    },
    ...(withValues ? [value] : []),
    {
      id: 'reason',
      header: 'Why',
      value: (row) => row.reason,
      cell: (row) => <Why row={row} />,
    },
    { id: 'by', header: 'By', value: (row) => row.actorName },
  ];
}

function Why({ row: { reason, invoice } }: { row: FinishedMovement }) {
  if (!invoice) return reason || '–';
  return (
    <>
      {reason},{' '}
      <TextLink to={`/books/invoices/${invoice.id}`}>{invoice.number ?? 'draft invoice'}</TextLink>
    </>
  );
}

/** What came to the shelf and left it: nothing in it is ever changed. */
export function FinishedMovements({ id }: { id: number }) {
  const workshop = useWorkshop();
  const { data, hasNextPage, fetchNextPage, isFetchingNextPage } = useInfiniteQuery(
    finishedMovementsQuery(id),
  );
  const rows = useMemo(() => data?.pages.flatMap((page) => page.items) ?? [], [data]);
  const withValues = rows.some((row) => row.value !== undefined);
  const columns = useMemo(() => columnsFor(workshop, withValues), [workshop, withValues]);
  return (
    <DataTable
      label="Came and left"
      rows={rows}
      rowId={(row) => row.id}
      columns={columns}
      empty={<EmptyState title="Nothing has moved yet." />}
      after={<ShowEarlier pages={{ hasNextPage, isFetchingNextPage, fetchNextPage }} what="ones" />}
    />
  );
}
