import type { Hardware } from '@hidewright/contract';
import { kitWords, unitWord } from '@hidewright/domain';
import { Decimal } from 'decimal.js';
import { useMemo, type ReactNode } from 'react';
import type { Column } from '../../../components/column.ts';
import { DataTable } from '../../../components/data-table.tsx';
import { StateMark } from '../../../components/state-mark.tsx';
import { TextLink } from '../../../components/text-link.tsx';
import { countText, moneyText, askedPriceText } from '../../../lib/formatting.ts';
import { useWorkshop } from '../../../lib/workshop.tsx';

const counted = (
  id: string,
  header: string,
  value: (row: Hardware) => number,
): Column<Hardware> => ({
  id,
  header,
  value,
  cell: (row) => countText(value(row)),
  align: 'right',
});

function pricesIn(currency: string): Column<Hardware>[] {
  return [
    {
      id: 'price',
      header: `Price, ${currency}`,
      value: (row) => row.unitPrice,
      cell: ({ unitPrice, fromCustomer }) =>
        unitPrice !== undefined && !fromCustomer && askedPriceText(unitPrice),
      align: 'right',
    },
    {
      id: 'value',
      header: `On hand at cost, ${currency}`,
      value: (row) => row.valueOnHand,
      cell: ({ valueOnHand, parts }) =>
        parts.length > 0 ? 'in its parts' : valueOnHand !== undefined && moneyText(valueOnHand),
      align: 'right',
      total: (rows) =>
        moneyText(Decimal.sum(0, ...rows.map((row) => row.valueOnHand ?? '0')).toFixed()),
    },
  ];
}

const basics: Column<Hardware>[] = [
  {
    id: 'name',
    header: 'Name',
    value: (row) => row.name,
    cell: (row) => (
      <span className="inline-flex flex-wrap items-baseline gap-x-3">
        <TextLink to={`/stockroom/hardware/${row.id}`}>{row.name}</TextLink>
        {row.unit !== 'piece' && (
          <span className="text-sm font-normal text-ink-soft">in {unitWord(row.unit, 2)}</span>
        )}
        {row.short && <StateMark state="short" />}
        <KitRemark row={row} />
      </span>
    ),
    onPhone: 'title',
  },
  {
    id: 'kind',
    header: 'Kind',
    value: (row) => row.kind,
    cell: (row) => <span className="whitespace-nowrap">{row.kind}</span>,
    onPhone: 'hidden',
  },
  counted('onHand', 'On hand', (row) => row.onHand),
  counted('reserved', 'Held for jobs', (row) => row.reserved),
  counted('free', 'Free', (row) => row.free),
  counted('onOrder', 'On order', (row) => row.onOrder),
];

/** That it is a kit, which is counted by what its parts make up; or a part of one. */
function KitRemark({ row: { parts, partOf } }: { row: Hardware }) {
  const words =
    parts.length > 0
      ? `${kitWords(parts)}; as many as they make up`
      : partOf.length > 0 && `a part of ${partOf.map(({ name }) => name).join(' and ')}`;
  if (words === false) return null;
  return <span className="basis-full text-left text-sm font-normal text-ink-soft">{words}</span>;
}

interface HardwareTableProps {
  rows: readonly Hardware[];
  empty: ReactNode;
  /** Under the last row, such as a button for more. */
  after?: ReactNode;
}

export function HardwareTable({ rows, empty, after }: HardwareTableProps) {
  const { currency } = useWorkshop();
  const withPrices = rows.some((row) => row.unitPrice !== undefined);
  const columns = useMemo(
    () => (withPrices ? [...basics, ...pricesIn(currency)] : basics),
    [currency, withPrices],
  );
  return (
    <DataTable
      label="Hardware and supplies"
      rows={rows}
      rowId={(row) => row.id}
      columns={columns}
      empty={empty}
      filterLabel="Filter hardware and supplies"
      sortedBy={{ id: 'name' }}
      after={after}
    />
  );
}
