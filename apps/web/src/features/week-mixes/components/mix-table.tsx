import type { WeekMixReply } from '@hidewright/contract';
import { useMemo } from 'react';
import type { Column } from '../../../components/column.ts';
import { DataTable } from '../../../components/data-table.tsx';
import { moneyText, numberText } from '../../../lib/formatting.ts';
import { sumMoney } from '../../../lib/sum-money.ts';
import { hoursWords } from '../mix-words.ts';

type Row = WeekMixReply['kinds'][number] & { number: number };

const atWords = { most: 'all that sell', least: 'as promised' };

const columns: Column<Row>[] = [
  {
    id: 'name',
    header: 'Work',
    value: (row) => row.number,
    cell: (row) => `${row.number} ${row.name}`,
    onPhone: 'title',
  },
  {
    id: 'units',
    header: 'A week',
    value: (row) => Number(row.units),
    cell: (row) => (
      <span>
        {numberText(row.units, 2)}
        {row.at !== null && <span className="block text-sm text-ink-soft">{atWords[row.at]}</span>}
      </span>
    ),
    align: 'right',
  },
  {
    id: 'bench',
    header: 'Bench',
    value: (row) => Number(row.benchHours),
    cell: (row) => hoursWords(row.benchHours),
    align: 'right',
  },
  {
    id: 'desk',
    header: 'Desk',
    value: (row) => Number(row.deskHours),
    cell: (row) => hoursWords(row.deskHours),
    align: 'right',
  },
  {
    id: 'left',
    header: 'Left',
    value: (row) => Number(row.left),
    cell: (row) => moneyText(row.left),
    align: 'right',
    total: (rows) => sumMoney(rows.map(({ left }) => left)),
  },
  {
    id: 'perHour',
    header: 'An hour',
    value: (row) => Number(row.leftPerHour),
    cell: (row) => moneyText(row.leftPerHour),
    align: 'right',
  },
];

/** Each kind of work: how many a week, its hours, what it leaves, and what an hour of it leaves. */
export function MixTable({ mix }: { mix: WeekMixReply }) {
  const rows = useMemo(() => mix.kinds.map((kind, at) => ({ ...kind, number: at + 1 })), [mix]);
  return (
    <DataTable
      label="The mix, by kind of work"
      rows={rows}
      rowId={(row) => row.number}
      columns={columns}
      empty={null}
    />
  );
}
