import type { MetalAdviceReply } from '@hidewright/contract';
import { useMemo } from 'react';
import type { Column } from '../../../components/column.ts';
import { DataTable } from '../../../components/data-table.tsx';
import { StateMark } from '../../../components/state-mark.tsx';
import { TextLink } from '../../../components/text-link.tsx';
import { countText, moneyText } from '../../../lib/formatting.ts';
import { useWorkshop } from '../../../lib/workshop.tsx';
import { changesText, choiceText, turnText } from '../metal-words.ts';

type Row = MetalAdviceReply['rows'][number] & { least: string };

interface MetalAdviceProps {
  metals: MetalAdviceReply;
  runs: number;
}

/** What each metal costs for the run and over its repeats, and from which quantity the dearer one pays. */
export function MetalAdvice({ metals, runs }: MetalAdviceProps) {
  const { currency } = useWorkshop();
  const columns = useMemo(() => columnsFor(currency, runs > 0), [currency, runs]);
  if (metals.rows.length === 0) return <NoOffers />;
  const rows = metals.rows.map((row) => ({ ...row, least: leastMark(row.metal, metals, runs) }));
  return (
    <div className="mt-3 space-y-3">
      <p>{choiceText(metals, runs, currency)}</p>
      <DataTable
        label="Metals compared"
        rows={rows}
        rowId={(row) => row.metal}
        columns={columns}
        empty={null}
      />
      <ul className="space-y-1">
        {metals.turns.map((turn) => (
          <li key={turn.dear}>{turnText(turn, metals.left)}</li>
        ))}
      </ul>
      <p className="text-sm text-ink-soft">
        Prices and lives are your own figures:{' '}
        <TextLink to="/pattern-room/tooling">change them under Tooling</TextLink>.
      </p>
    </div>
  );
}

function NoOffers() {
  return (
    <p className="mt-3 text-ink-soft">
      No prices of plates are kept yet. Enter what each metal costs and lasts{' '}
      <TextLink to="/pattern-room/tooling">under Tooling</TextLink>, and they are compared here.
    </p>
  );
}

function leastMark(metal: string, { leastNow, leastInAll }: MetalAdviceReply, runs: number) {
  const now = leastNow?.metal === metal;
  const inAll = leastInAll?.metal === metal;
  if (runs === 0) return now ? 'costs least' : '';
  if (now && inAll) return 'costs least';
  if (now) return 'least for this run';
  return inAll ? 'least over the repeats' : '';
}

function boughtText({ plates, cost }: Row['now']): string {
  return plates === 0 ? 'none needed' : `${moneyText(cost)} for ${countText(plates)}`;
}

function columnsFor(currency: string, repeats: boolean): Column<Row>[] {
  const inAll: Column<Row> = {
    id: 'all',
    header: `With repeats, ${currency}`,
    value: (row) => Number(row.inAll.cost),
    cell: (row) => boughtText(row.inAll),
    align: 'right',
  };
  return [
    {
      id: 'metal',
      header: 'Metal',
      value: (row) => row.metal,
      cell: (row) => (
        <span className="flex flex-wrap items-center gap-x-2 text-left">
          {row.metal}
          {row.least !== '' && <StateMark state="in use">{row.least}</StateMark>}
        </span>
      ),
      onPhone: 'title',
    },
    {
      id: 'one',
      header: `One, ${currency}`,
      value: (row) => Number(row.price),
      cell: (row) => `${moneyText(row.price)}, lasts ${countText(row.lifeUses)}`,
      align: 'right',
    },
    {
      id: 'now',
      header: `This run, ${currency}`,
      value: (row) => Number(row.now.cost),
      cell: (row) => boughtText(row.now),
      align: 'right',
    },
    {
      id: 'changes',
      header: 'Changed in the run',
      value: (row) => row.now.changes,
      cell: (row) => changesText(row.now),
      align: 'right',
    },
    ...(repeats ? [inAll] : []),
  ];
}
