import type { HardwareLevel, KitLevel, LeatherLevel, StockLevels } from '@hidewright/contract';
import { kitWords, unitWord } from '@hidewright/domain';
import { Decimal } from 'decimal.js';
import { useMemo } from 'react';
import type { Column } from '../../../components/column.ts';
import { DataTable } from '../../../components/data-table.tsx';
import { EmptyState } from '../../../components/empty-state.tsx';
import { TextLink } from '../../../components/text-link.tsx';
import { rackAreaText, countText, moneyText } from '../../../lib/formatting.ts';
import { sumMoney } from '../../../lib/sum-money.ts';
import { useWorkshop } from '../../../lib/workshop.tsx';

type Level = Pick<LeatherLevel | HardwareLevel, 'value' | 'standing'> & {
  id: number;
  name: string;
  to: string;
  onHand: string;
};

type Say = (figure: string) => string;

const standingWords = {
  reserved: 'Held for jobs',
  free: 'Free',
  onOrder: 'On order',
  promised: 'Promised of both',
} as const;

function columnsFor(
  rows: readonly Level[],
  { say, currency, total }: { say: Say; currency: string; total: boolean },
): Column<Level>[] {
  const sum = (of: (row: Level) => string) => (all: readonly Level[]) =>
    say(Decimal.sum(0, ...all.map(of)).toFixed());
  const standing = Object.entries(standingWords) as [keyof typeof standingWords, string][];
  return [
    {
      id: 'name',
      header: 'What',
      value: (row) => row.name,
      cell: (row) => <TextLink to={row.to}>{row.name}</TextLink>,
      onPhone: 'title',
    },
    {
      id: 'onHand',
      header: 'On the shelf',
      value: (row) => row.onHand,
      cell: (row) => say(row.onHand),
      align: 'right',
      total: total ? sum((row) => row.onHand) : undefined,
    },
    ...standing.map(([field, header]): Column<Level> => ({
      id: field,
      header,
      value: (row) => row.standing[field],
      cell: (row) => say(row.standing[field]),
      align: 'right',
    })),
    ...(rows.some((row) => row.value !== undefined)
      ? [
          {
            id: 'value',
            header: `At cost, ${currency}`,
            value: (row: Level) => row.value,
            cell: (row: Level) => row.value !== undefined && moneyText(row.value),
            align: 'right' as const,
            total: (all: readonly Level[]) => sumMoney(all.map((row) => row.value ?? '0')),
          },
        ]
      : []),
  ];
}

function lotsWord(count: number): string {
  if (count === 0) return 'no lot';
  return count === 1 ? '1 lot' : `${count} lots`;
}

/** What there is of each leather. */
export function LeatherLevels({ levels }: { levels: StockLevels }) {
  const workshop = useWorkshop();
  const { currency } = workshop;
  const rows = useMemo(
    () =>
      levels.leathers.map(({ leatherId, areaMm2, lots, name, ...level }) => ({
        ...level,
        id: leatherId,
        name: `${name}, ${lotsWord(lots.length)}`,
        to: `/stockroom/leather/${leatherId}`,
        onHand: areaMm2,
      })),
    [levels],
  );
  const columns = useMemo(
    () => columnsFor(rows, { say: (area) => rackAreaText(area, workshop), currency, total: true }),
    [rows, workshop, currency],
  );
  return (
    <DataTable
      label="Leather"
      rows={rows}
      rowId={(row) => row.id}
      columns={columns}
      empty={<EmptyState title="No leather was on the rack." />}
    />
  );
}

/** What there is of each hardware and supply. */
export function HardwareLevels({ levels }: { levels: StockLevels }) {
  const { currency } = useWorkshop();
  const rows = useMemo(
    () =>
      levels.hardware.map(({ hardwareId, quantity, name, unit, ...level }) => ({
        ...level,
        name: unit === 'piece' ? name : `${name}, in ${unitWord(unit, 2)}`,
        id: hardwareId,
        to: `/stockroom/hardware/${hardwareId}`,
        onHand: String(quantity),
      })),
    [levels],
  );
  const columns = useMemo(
    () => columnsFor(rows, { say: (count) => countText(Number(count)), currency, total: false }),
    [rows, currency],
  );
  return (
    <DataTable
      label="Hardware and supplies"
      rows={rows}
      rowId={(row) => row.id}
      columns={columns}
      empty={<EmptyState title="There is no hardware yet." />}
    />
  );
}

/** How many whole kits the parts in the table make up: nothing that lies there besides. */
export function KitLevels({ kits }: { kits: readonly KitLevel[] }) {
  return (
    <div className="mt-4 text-ink-soft">
      <p>Kits lie there as their parts, which make up:</p>
      <ul className="mt-1 list-disc pl-5">
        {kits.map(({ hardwareId, name, quantity, parts }) => (
          <li key={hardwareId}>
            {`${countText(quantity)} × `}
            <TextLink to={`/stockroom/hardware/${hardwareId}`}>{name}</TextLink>
            {`, ${kitWords(parts)}`}
          </li>
        ))}
      </ul>
    </div>
  );
}
