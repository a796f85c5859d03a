import type { ToolReply } from '@hidewright/contract';
import type { ReactNode } from 'react';
import type { Column } from '../../../components/column.ts';
import { DataTable } from '../../../components/data-table.tsx';
import { StateMark } from '../../../components/state-mark.tsx';
import { TextLink } from '../../../components/text-link.tsx';
import { useWorkshop } from '../../../lib/workshop.tsx';
import { ownerText, toolTitle } from '../tool-words.ts';
import { Wear } from './wear.tsx';

const columns: Column<ToolReply>[] = [
  {
    id: 'tool',
    header: 'Tool',
    value: (row) => `${toolTitle(row)} ${row.name}`,
    cell: (row) => (
      <span className="block text-left">
        <TextLink to={`/pattern-room/tooling/${row.id}`}>{toolTitle(row)}</TextLink>
        <span className="block text-sm font-normal text-ink-soft">{row.name}</span>
      </span>
    ),
    onPhone: 'title',
  },
  { id: 'slot', header: 'Slot', value: (row) => row.slot },
  {
    id: 'metal',
    header: 'Metal',
    value: (row) => row.metal,
    cell: (row) => <span className="whitespace-nowrap">{row.metal}</span>,
    onPhone: 'hidden',
  },
  {
    id: 'for',
    header: 'For',
    value: (row) => [row.patternName, row.customerName].filter(Boolean).join(', '),
    cell: (row) => <ForWhom tool={row} />,
  },
  {
    id: 'used',
    header: 'Used',
    value: (row) => row.used,
    cell: (row) => <Wear tool={row} />,
    align: 'right',
  },
  {
    id: 'state',
    header: 'State',
    value: (row) => row.state,
    cell: (row) => (
      <span className="inline-flex flex-wrap gap-1">
        <StateMark state={row.state} />
        {row.termOver && <StateMark state="lapsed">term over</StateMark>}
      </span>
    ),
  },
];

function ForWhom({ tool }: { tool: ToolReply }) {
  const { today } = useWorkshop();
  return (
    <span className="block text-left">
      {[tool.patternName, tool.customerName].filter(Boolean).join(', ')}
      {tool.ownedBy === 'customer' && (
        <span className="block text-sm text-ink-soft">{ownerText(tool, today)}</span>
      )}
    </span>
  );
}

const briefColumns = columns.filter(({ id }) => id !== 'for' && id !== 'metal');

interface ToolsTableProps {
  rows: readonly ToolReply[];
  empty: ReactNode;
  /** For the few of one pattern, without a filter. */
  brief?: boolean;
}

export function ToolsTable({ rows, empty, brief = false }: ToolsTableProps) {
  return (
    <DataTable
      label="Cutting dies and stamp plates"
      rows={rows}
      rowId={(row) => row.id}
      columns={brief ? briefColumns : columns}
      empty={empty}
      filterLabel={brief ? undefined : 'Filter tools'}
      sortedBy={{ id: 'tool' }}
    />
  );
}
