import type { CountLine, StockCount } from '@hidewright/contract';
import { useMemo } from 'react';
import type { Column } from '../../../components/column.ts';
import { DataTable } from '../../../components/data-table.tsx';
import { EmptyState } from '../../../components/empty-state.tsx';
import { TextLink } from '../../../components/text-link.tsx';
import { moneyText } from '../../../lib/formatting.ts';
import { sumMoney } from '../../../lib/sum-money.ts';
import { useWorkshop, type Workshop } from '../../../lib/workshop.tsx';
import { countedText, movedText, quantityText } from '../count-words.ts';

interface CountLinesTableProps {
  sheet: StockCount;
  /** Lines to be counted once more. */
  chosen: readonly number[];
  /** Left out where nothing is to be chosen. */
  onChoose?: ((lineIds: readonly number[]) => void) | undefined;
}

const itemPath = ({ lotId, hardwareId }: CountLine) =>
  lotId === null ? `/stockroom/hardware/${hardwareId}` : `/stockroom/lots/${lotId}`;

function columnsFor({ areaUnit, currency }: Workshop, withBooks: boolean): Column<CountLine>[] {
  const books: Column<CountLine>[] = [
    {
      id: 'book',
      header: 'Books',
      value: (row) => row.bookAreaMm2 ?? row.bookQuantity,
      cell: (row) => <Books line={row} unit={areaUnit} />,
      align: 'right',
    },
    {
      id: 'difference',
      header: 'Difference',
      value: (row) => row.differenceAreaMm2 ?? row.differenceQuantity,
      cell: (row) => differenceText(row, areaUnit),
      align: 'right',
    },
    {
      id: 'value',
      header: `At cost, ${currency}`,
      value: (row) => row.differenceValue,
      cell: (row) => (row.differenceValue ? moneyText(row.differenceValue) : '–'),
      align: 'right',
      total: (rows) => sumMoney(rows.map((row) => row.differenceValue ?? '0')),
    },
  ];
  return [
    {
      id: 'tag',
      header: 'Tag',
      value: (row) => row.tag,
      cell: (row) => <TextLink to={itemPath(row)}>{row.tag}</TextLink>,
      onPhone: 'title',
    },
    { id: 'name', header: 'What', value: (row) => row.name },
    {
      id: 'counted',
      header: 'Counted',
      value: (row) => row.countedAreaMm2 ?? row.countedQuantity,
      cell: (row) => countedText(row, areaUnit),
      align: 'right',
    },
    ...(withBooks ? books : []),
    {
      id: 'by',
      header: 'By',
      value: (row) => row.countedByName,
      cell: (row) => row.countedByName ?? '–',
    },
  ];
}

/** What the books said when it was counted, and what moved since. */
function Books({ line, unit }: { line: CountLine; unit: Workshop['areaUnit'] }) {
  const moved = movedText(line, unit);
  return (
    <>
      {quantityText(line.bookAreaMm2, line.bookQuantity, unit) ?? '–'}
      {moved && <span className="block text-sm text-ink-soft">{moved}</span>}
    </>
  );
}

function differenceText(row: CountLine, unit: Workshop['areaUnit']): string {
  const text = quantityText(row.differenceAreaMm2, row.differenceQuantity, unit);
  if (text === undefined) return '–';
  const amount = Number(row.differenceAreaMm2 ?? row.differenceQuantity);
  if (amount === 0) return 'none';
  return amount > 0 ? `+${text}` : text;
}

/** The lines of a sheet that is handed in. */
export function CountLinesTable({ sheet, chosen, onChoose }: CountLinesTableProps) {
  const workshop = useWorkshop();
  const withBooks = sheet.lines.some((line) => line.bookAreaMm2 !== undefined);
  const columns = useMemo(() => {
    const shown = columnsFor(workshop, withBooks);
    return onChoose ? [...shown, againColumn(chosen, onChoose)] : shown;
  }, [workshop, withBooks, chosen, onChoose]);
  return (
    <DataTable
      label="What was counted"
      rows={sheet.lines}
      rowId={(row) => row.id}
      columns={columns}
      empty={<EmptyState title="No line stands on it." />}
    />
  );
}

function againColumn(
  chosen: readonly number[],
  onChoose: (lineIds: readonly number[]) => void,
): Column<CountLine> {
  return {
    id: 'again',
    header: 'Count again',
    value: (row) => (chosen.includes(row.id) ? 1 : 0),
    sortable: false,
    cell: (row) => (
      <input
        type="checkbox"
        aria-label={`Count ${row.tag} again`}
        checked={chosen.includes(row.id)}
        onChange={(event) =>
          onChoose(
            event.target.checked
              ? [...chosen, row.id]
              : chosen.filter((lineId) => lineId !== row.id),
          )
        }
        className="size-6 accent-verdigris"
      />
    ),
  };
}
