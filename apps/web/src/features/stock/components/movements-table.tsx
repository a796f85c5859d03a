import type { StockMovement } from '@hidewright/contract';
import { useInfiniteQuery } from '@tanstack/react-query';
import { useMemo } from 'react';
import type { Column } from '../../../components/column.ts';
import { DataTable } from '../../../components/data-table.tsx';
import { EmptyState } from '../../../components/empty-state.tsx';
import { TextLink } from '../../../components/text-link.tsx';
import { instantText, moneyText } from '../../../lib/formatting.ts';
import { useWorkshop, type Workshop } from '../../../lib/workshop.tsx';
import { movementWords, signedText } from '../movement-words.ts';
import { movementsQuery, type Asked } from '../stock.queries.ts';
import { ShowEarlier } from '../../../components/show-earlier.tsx';

const itemColumn: Column<StockMovement> = {
  id: 'item',
  header: 'Of',
  value: (row) => row.lotTag ?? row.hardwareName,
  cell: (row) =>
    row.lotId === null ? (
      <TextLink to={`/stockroom/hardware/${row.hardwareId}`}>{row.hardwareName}</TextLink>
    ) : (
      <TextLink to={`/stockroom/lots/${row.lotId}`}>{row.lotTag}</TextLink>
    ),
};

function columnsFor(
  workshop: Workshop,
  { withValues, mixed }: { withValues: boolean; mixed: boolean },
): Column<StockMovement>[] {
  const { currency, timeZone, today } = workshop;
  const value: Column<StockMovement> = {
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
    ...(mixed ? [itemColumn] : []),
    { id: 'kind', header: 'What', value: (row) => movementWords[row.kind] },
    {
      id: 'quantity',
      header: 'How much',
      value: (row) => row.areaMm2 ?? row.quantity,
      cell: (row) => signedText(row, workshop),
      align: 'right',
    },
    ...(withValues ? [value] : []),
    {
      id: 'for',
      header: 'For',
      value: (row) => row.jobNumber ?? row.purchaseOrderNumber,
      cell: (row) => row.jobNumber ?? row.purchaseOrderNumber ?? '–',
    },
    { id: 'reason', header: 'Why', value: (row) => row.reason, cell: (row) => row.reason || '–' },
    { id: 'by', header: 'By', value: (row) => row.actorName },
  ];
}

interface MovementsTableProps {
  item: Asked;
  /** Of more than one item: then each row says which. */
  mixed?: boolean | undefined;
  /** Where the list can be had as a spreadsheet. */
  sheetAddress?: string | undefined;
}

/** The ledger of what is asked for: nothing in it is ever changed. */
export function MovementsTable({ item, mixed = false, sheetAddress }: MovementsTableProps) {
  const workshop = useWorkshop();
  const { data, hasNextPage, fetchNextPage, isFetchingNextPage } = useInfiniteQuery(
    movementsQuery(item),
  );
  const rows = useMemo(() => data?.pages.flatMap((page) => page.items) ?? [], [data]);
  const withValues = rows.some((row) => row.value !== undefined);
  const columns = useMemo(
    () => columnsFor(workshop, { withValues, mixed }),
    [workshop, withValues, mixed],
  );
  return (
    <DataTable
      label="Movements"
      rows={rows}
      rowId={(row) => row.id}
      columns={columns}
      sheetAddress={sheetAddress}
      empty={
        <EmptyState title={mixed ? 'Nothing like that has moved.' : 'Nothing has moved yet.'}>
          What comes in, is taken by a job or is counted is written here.
        </EmptyState>
      }
      after={
        <ShowEarlier pages={{ hasNextPage, isFetchingNextPage, fetchNextPage }} what="movements" />
      }
    />
  );
}
