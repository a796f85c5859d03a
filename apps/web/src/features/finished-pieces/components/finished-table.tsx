import type { FinishedPiece } from '@hidewright/contract';
import { useInfiniteQuery } from '@tanstack/react-query';
import { useMemo } from 'react';
import { Button } from '../../../components/button.tsx';
import type { Column } from '../../../components/column.ts';
import { DataTable } from '../../../components/data-table.tsx';
import { EmptyState } from '../../../components/empty-state.tsx';
import { TextLink } from '../../../components/text-link.tsx';
import { countText, moneyText } from '../../../lib/formatting.ts';
import { sumMoney } from '../../../lib/sum-money.ts';
import { useWorkshop } from '../../../lib/workshop.tsx';
import { finishedPiecesQuery } from '../finished-pieces.queries.ts';

function columnsFor(currency: string, withValues: boolean): Column<FinishedPiece>[] {
  const value: Column<FinishedPiece> = {
    id: 'value',
    header: `At cost, ${currency}`,
    value: (row) => row.value,
    cell: (row) => row.value !== undefined && moneyText(row.value),
    align: 'right',
    total: (rows) => sumMoney(rows.map((row) => row.value ?? '0')),
  };
  return [
    {
      id: 'name',
      header: 'Pattern',
      value: (row) => [row.patternName, row.option].filter(Boolean).join(', '),
      cell: (row) => (
        <TextLink to={`/stockroom/finished/${row.id}`}>
          {[row.patternName, row.option].filter(Boolean).join(', ')}
        </TextLink>
      ),
      onPhone: 'title',
    },
    { id: 'sort', header: 'Sort', value: (row) => row.sort },
    {
      id: 'mark',
      header: 'With the mark of',
      value: (row) => row.customerName,
      cell: (row) => row.customerName ?? 'nobody',
    },
    { id: 'place', header: 'Place', value: (row) => row.place, cell: (row) => row.place || '–' },
    {
      id: 'onHand',
      header: 'On the shelf',
      value: (row) => row.onHand,
      cell: (row) => countText(row.onHand),
      align: 'right',
      total: (rows) => countText(rows.reduce((sum, { onHand }) => sum + onHand, 0)),
    },
    ...(withValues ? [value] : []),
  ];
}

/** Finished pieces, kind by kind. */
export function FinishedTable() {
  const { currency } = useWorkshop();
  const { data, hasNextPage, fetchNextPage, isFetchingNextPage } =
    useInfiniteQuery(finishedPiecesQuery());
  const rows = useMemo(() => data?.pages.flatMap((page) => page.items) ?? [], [data]);
  const withValues = rows.some((row) => row.value !== undefined);
  const columns = useMemo(() => columnsFor(currency, withValues), [currency, withValues]);
  return (
    <DataTable
      label="Finished pieces"
      rows={rows}
      rowId={(row) => row.id}
      columns={columns}
      empty={
        <EmptyState title="No finished pieces are on the shelf.">
          A job that makes more than is ordered puts them here when it is finished, and its seconds.
          What was there before can be put on the shelf by hand.
        </EmptyState>
      }
      after={
        hasNextPage && (
          <div className="mt-4 text-center">
            <Button busy={isFetchingNextPage} onClick={() => void fetchNextPage()}>
              Show more
            </Button>
          </div>
        )
      }
    />
  );
}
