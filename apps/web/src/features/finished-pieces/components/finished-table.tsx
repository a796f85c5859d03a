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
import { finishedPiecesQuery, shelfAsked } from '../finished-pieces.queries.ts';
import { finishedName } from '../finished-words.ts';

function columnsFor(
  currency: string,
  withValues: boolean,
  sellTo: string | undefined,
): Column<FinishedPiece>[] {
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
    ...(sellTo === undefined ? [] : [sellColumn(sellTo)]),
  ];
}

const sellColumn = (sellTo: string): Column<FinishedPiece> => ({
  id: 'sell',
  header: 'Sale',
  value: () => '',
  cell: (row) =>
    row.onHand > 0 && (
      <TextLink to={`/stockroom/finished/${row.id}/sell${sellTo}`}>
        Sell<span className="sr-only"> {finishedName(row)}</span>
      </TextLink>
    ),
  align: 'right',
  sortable: false,
});

interface FinishedTableProps {
  /** Only what this customer could have. */
  forCustomer?: number | undefined;
  sells: boolean;
}

/** Finished pieces, kind by kind; whoever sells goes on from a row. */
export function FinishedTable({ forCustomer, sells }: FinishedTableProps) {
  const { currency } = useWorkshop();
  const { data, hasNextPage, fetchNextPage, isFetchingNextPage } = useInfiniteQuery(
    finishedPiecesQuery(shelfAsked(forCustomer)),
  );
  const rows = useMemo(() => data?.pages.flatMap((page) => page.items) ?? [], [data]);
  const withValues = rows.some((row) => row.value !== undefined);
  const sellTo = sells ? (forCustomer ? `?customer=${forCustomer}` : '') : undefined;
  const columns = useMemo(
    () => columnsFor(currency, withValues, sellTo),
    [currency, withValues, sellTo],
  );
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
