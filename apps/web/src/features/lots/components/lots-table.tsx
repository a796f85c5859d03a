import type { Lot } from '@hidewright/contract';
import { Decimal } from 'decimal.js';
import { useMemo, type ReactNode } from 'react';
import type { Column } from '../../../components/column.ts';
import { DataTable } from '../../../components/data-table.tsx';
import { TextLink } from '../../../components/text-link.tsx';
import { rackAreaText, dayText, moneyText } from '../../../lib/formatting.ts';
import { useWorkshop, type Workshop } from '../../../lib/workshop.tsx';
import { formText } from '../lot-words.ts';

const sumOf = (values: readonly string[]) => Decimal.sum(0, ...values).toFixed();

/** What is on the rack, and what of it is out. */
function OnHand({ lot, area }: { lot: Lot; area: (areaMm2: string) => string }) {
  if (lot.outFor.length === 0) return area(lot.onHandAreaMm2);
  const out = sumOf(lot.outFor.map(({ areaMm2 }) => areaMm2));
  return (
    <>
      {area(lot.onHandAreaMm2)}
      <span className="block text-sm text-ink-soft">{area(out)} out</span>
    </>
  );
}

interface Shown {
  leather: boolean;
  values: boolean;
}

function columnsFor(workshop: Workshop, shown: Shown): Column<Lot>[] {
  const { lengthUnit, currency, today } = workshop;
  const area = (areaMm2: string) => rackAreaText(areaMm2, workshop);
  const value: Column<Lot> = {
    id: 'value',
    header: `Left at cost, ${currency}`,
    value: (row) => row.valueOnHand,
    cell: (row) => row.valueOnHand !== undefined && moneyText(row.valueOnHand),
    align: 'right',
    total: (rows) => moneyText(sumOf(rows.map((row) => row.valueOnHand ?? '0'))),
  };
  const leather: Column<Lot> = {
    id: 'leather',
    header: 'Leather',
    value: (row) => row.leatherName,
  };
  return [
    {
      id: 'tag',
      header: 'Tag',
      value: (row) => row.tag,
      cell: (row) => <TextLink to={`/stockroom/lots/${row.id}`}>{row.tag}</TextLink>,
      onPhone: 'title',
    },
    ...(shown.leather ? [leather] : []),
    { id: 'form', header: 'Form', value: (row) => formText(row, lengthUnit) },
    { id: 'place', header: 'Place', value: (row) => row.place },
    {
      id: 'measured',
      header: 'Measured',
      value: (row) => row.measuredAreaMm2,
      cell: (row) => area(row.measuredAreaMm2),
      align: 'right',
      onPhone: 'hidden',
    },
    {
      id: 'onHand',
      header: 'On hand',
      value: (row) => row.onHandAreaMm2,
      cell: (row) => <OnHand lot={row} area={area} />,
      align: 'right',
      total: (rows) => area(sumOf(rows.map((row) => row.onHandAreaMm2))),
    },
    {
      id: 'free',
      header: 'Free',
      value: (row) => row.freeAreaMm2,
      cell: (row) => area(row.freeAreaMm2),
      align: 'right',
      total: (rows) => area(sumOf(rows.map((row) => row.freeAreaMm2))),
    },
    ...(shown.values ? [value] : []),
    {
      id: 'received',
      header: 'Received',
      value: (row) => row.receivedOn,
      cell: (row) => dayText(row.receivedOn, today),
      onPhone: 'hidden',
    },
  ];
}

interface LotsTableProps {
  rows: readonly Lot[];
  /** They are all of the leather whose page it is. */
  ofOneLeather?: boolean;
  empty: ReactNode;
  /** Under the last row, such as a button for more. */
  after?: ReactNode;
}

export function LotsTable({ rows, ofOneLeather = false, empty, after }: LotsTableProps) {
  const workshop = useWorkshop();
  const values = rows.some((row) => row.valueOnHand !== undefined);
  const columns = useMemo(
    () => columnsFor(workshop, { leather: !ofOneLeather, values }),
    [workshop, ofOneLeather, values],
  );
  return (
    <DataTable
      label="Lots"
      rows={rows}
      rowId={(row) => row.id}
      columns={columns}
      empty={empty}
      filterLabel="Filter lots"
      after={after}
    />
  );
}
