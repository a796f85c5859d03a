import { useMemo, useState, type ReactNode } from 'react';
import { Button } from './button.tsx';
import type { Column } from './column.ts';
import { DataTable } from './data-table.tsx';

interface Named {
  id: number;
  name: string;
}

interface NamedTableProps<Row extends Named> {
  /** What the rows are, for the ear. */
  label: string;
  rows: readonly Row[];
  /** At module level, or memoised; one of them is the name. */
  columns: readonly Column<Row>[];
  empty: ReactNode;
  /** The dialog that changes a row; none where that is not this person's to do. */
  changing?: ((row: Row, close: () => void) => ReactNode) | undefined;
}

/** A short table of things with a name, in its order; each may be changed in a dialog. */
export function NamedTable<Row extends Named>(props: NamedTableProps<Row>) {
  const { label, rows, columns, empty, changing } = props;
  const [chosen, setChosen] = useState<Row>();
  const mayChange = changing !== undefined;
  const all = useMemo(
    () => (mayChange ? [...columns, changeColumn<Row>(setChosen)] : columns),
    [columns, mayChange],
  );
  return (
    <>
      <DataTable
        label={label}
        rows={rows}
        rowId={(row) => row.id}
        columns={all}
        empty={empty}
        sortedBy={{ id: 'name' }}
      />
      {chosen && changing?.(chosen, () => setChosen(undefined))}
    </>
  );
}

function changeColumn<Row extends Named>(onChange: (row: Row) => void): Column<Row> {
  return {
    id: 'change',
    header: 'Change',
    value: () => null,
    cell: (row) => (
      <Button onClick={() => onChange(row)}>
        Change<span className="sr-only"> {row.name}</span>
      </Button>
    ),
    sortable: false,
  };
}
