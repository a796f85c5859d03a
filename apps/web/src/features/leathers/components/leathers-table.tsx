import type { Leather } from '@hidewright/contract';
import { useMemo, type ReactNode } from 'react';
import type { Column } from '../../../components/column.ts';
import { DataTable } from '../../../components/data-table.tsx';
import { TextLink } from '../../../components/text-link.tsx';
import { askedPriceText, rackAreaText } from '../../../lib/formatting.ts';
import { areaUnits } from '../../../lib/units.ts';
import { useWorkshop, type Workshop } from '../../../lib/workshop.tsx';
import { weightText } from '../../../lib/weight-words.ts';

function columnsFor(workshop: Workshop, withPrices: boolean): Column<Leather>[] {
  const { areaUnit, currency } = workshop;
  const area = (areaMm2: string) => rackAreaText(areaMm2, workshop);
  const price: Column<Leather> = {
    id: 'price',
    header: `Price, ${currency} per ${areaUnits[areaUnit].sign}`,
    value: (row) => row.pricePerFt2,
    cell: (row) => row.pricePerFt2 !== undefined && askedPriceText(row.pricePerFt2, areaUnit),
    align: 'right',
  };
  return [
    {
      id: 'name',
      header: 'Leather',
      value: (row) => row.name,
      cell: (row) => <TextLink to={`/stockroom/leather/${row.id}`}>{row.name}</TextLink>,
      onPhone: 'title',
    },
    {
      id: 'kind',
      header: 'Kind',
      value: (row) => [row.tannage, row.colour, row.finish].filter(Boolean).join(', '),
    },
    { id: 'weight', header: 'Weight', value: (row) => row.weightLowOz, cell: weightText },
    {
      id: 'onHand',
      header: 'On hand',
      value: (row) => row.onHandAreaMm2,
      cell: (row) => area(row.onHandAreaMm2),
      align: 'right',
    },
    {
      id: 'free',
      header: 'Free',
      value: (row) => row.freeAreaMm2,
      cell: (row) => area(row.freeAreaMm2),
      align: 'right',
    },
    {
      id: 'onOrder',
      header: 'On order',
      value: (row) => row.onOrderAreaMm2,
      cell: (row) => area(row.onOrderAreaMm2),
      align: 'right',
    },
    ...(withPrices ? [price] : []),
    { id: 'supplier', header: 'Supplier', value: (row) => row.supplierName, onPhone: 'hidden' },
  ];
}

interface LeathersTableProps {
  rows: readonly Leather[];
  empty: ReactNode;
}

export function LeathersTable({ rows, empty }: LeathersTableProps) {
  const workshop = useWorkshop();
  const withPrices = rows.some((row) => row.pricePerFt2 !== undefined);
  const columns = useMemo(() => columnsFor(workshop, withPrices), [workshop, withPrices]);
  return (
    <DataTable
      label="Leather"
      rows={rows}
      rowId={(row) => row.id}
      columns={columns}
      empty={empty}
      filterLabel="Filter leather"
      sortedBy={{ id: 'name' }}
    />
  );
}
