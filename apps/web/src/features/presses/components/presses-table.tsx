import type { PressReply } from '@hidewright/contract';
import { useMemo, type ReactNode } from 'react';
import type { Column } from '../../../components/column.ts';
import { NamedTable } from '../../../components/named-table.tsx';
import { StateMark } from '../../../components/state-mark.tsx';
import { lengthText, numberText, sizeText } from '../../../lib/formatting.ts';
import { useWorkshop, type Workshop } from '../../../lib/workshop.tsx';
import { ChangePressDialog } from './change-press-dialog.tsx';

type LengthUnit = Workshop['lengthUnit'];

function columnsFor(unit: LengthUnit): Column<PressReply>[] {
  const length = (mm: string | null) => (mm === null ? '–' : lengthText(mm, unit));
  return [
    { id: 'name', header: 'Press', value: (row) => row.name, onPhone: 'title' },
    {
      id: 'bed',
      header: 'Bed',
      value: (row) => Number(row.bedWidthMm) * Number(row.bedDepthMm),
      cell: (row) => sizeText(row.bedWidthMm, row.bedDepthMm, unit),
      align: 'right',
    },
    {
      id: 'throat',
      header: 'Throat',
      value: (row) => row.throatMm && Number(row.throatMm),
      cell: (row) => (row.throatMm === null ? 'open' : length(row.throatMm)),
      align: 'right',
    },
    {
      id: 'rule',
      header: 'Cutting edge',
      value: (row) => row.ruleMm && Number(row.ruleMm),
      cell: (row) => length(row.ruleMm),
      align: 'right',
    },
    {
      id: 'relief',
      header: 'Relief',
      value: (row) => row.reliefAreaMm2 && Number(row.reliefAreaMm2),
      cell: (row) => (row.reliefAreaMm2 === null ? '–' : `${numberText(row.reliefAreaMm2, 0)} mm²`),
      align: 'right',
    },
    {
      id: 'standing',
      header: 'Standing',
      value: (row) => (row.active ? 'in use' : 'put away'),
      cell: (row) => <StateMark state={row.active ? 'in use' : 'put away'} />,
    },
  ];
}

interface PressesTableProps {
  rows: readonly PressReply[];
  empty: ReactNode;
  mayChange: boolean;
}

export function PressesTable({ rows, empty, mayChange }: PressesTableProps) {
  const { lengthUnit } = useWorkshop();
  const columns = useMemo(() => columnsFor(lengthUnit), [lengthUnit]);
  return (
    <NamedTable
      label="Presses"
      rows={rows}
      columns={columns}
      empty={empty}
      changing={
        mayChange
          ? (press, close) => <ChangePressDialog key={press.id} press={press} onClose={close} />
          : undefined
      }
    />
  );
}
