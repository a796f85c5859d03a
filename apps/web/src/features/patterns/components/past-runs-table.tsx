import type { PastRun } from '@hidewright/contract';
import { useMemo } from 'react';
import { Button } from '../../../components/button.tsx';
import type { Column } from '../../../components/column.ts';
import { DataTable } from '../../../components/data-table.tsx';
import { EmptyState } from '../../../components/empty-state.tsx';
import { TextLink } from '../../../components/text-link.tsx';
import { areaText, countText, dayText, numberText, percentText } from '../../../lib/formatting.ts';
import { useWorkshop, type Workshop } from '../../../lib/workshop.tsx';
import { unusualWords } from '../learned-words.ts';

interface PastRunsTableProps {
  runs: readonly PastRun[];
  /** Mixes a run in, or leaves it out. */
  onMix: (jobId: number, mixedIn: boolean) => void;
}

/** The last finished jobs side by side; an unusual one is named, and can be left out. */
export function PastRunsTable({ runs, onMix }: PastRunsTableProps) {
  const workshop = useWorkshop();
  const columns = useMemo(() => columnsFor(workshop, onMix), [workshop, onMix]);
  return (
    <DataTable
      label="The last runs"
      rows={runs}
      rowId={(run) => run.jobId}
      columns={columns}
      empty={
        <EmptyState title="No run of it is finished yet">
          Log minutes and counts on its job and finish it: it then stands here for the next
          estimate.
        </EmptyState>
      }
    />
  );
}

function columnsFor(
  { areaUnit, today }: Workshop,
  onMix: PastRunsTableProps['onMix'],
): Column<PastRun>[] {
  const orDash = (text: string | null, show: (text: string) => string) =>
    text === null ? '–' : show(text);
  return [
    {
      id: 'run',
      header: 'Run',
      value: (run) => run.finishedOn,
      cell: (run) => (
        <span className="block text-left">
          <TextLink to={`/bench/jobs/${run.jobId}`}>{run.number}</TextLink>
          {`, ${dayText(run.finishedOn, today)}`}
          <span className="block text-sm text-ink-soft">{run.customerName}</span>
          {run.unusual && (
            <span className="block text-sm font-semibold text-brass">
              {unusualWords[run.unusual]}
            </span>
          )}
        </span>
      ),
      onPhone: 'title',
    },
    {
      id: 'cut',
      header: 'Cut',
      value: (run) => run.cut,
      cell: (run) => countText(run.cut),
      align: 'right',
    },
    {
      id: 'minutes',
      header: 'Minutes per 100',
      value: (run) => run.minutesPer100,
      cell: (run) => orDash(run.minutesPer100, (text) => numberText(text, 1)),
      align: 'right',
    },
    {
      id: 'rejects',
      header: 'Rejects',
      value: (run) => run.rejectPercent,
      cell: (run) => orDash(run.rejectPercent, percentText),
      align: 'right',
    },
    {
      id: 'leather',
      header: 'Leather, each good',
      value: (run) => run.leatherPerGoodMm2,
      cell: (run) => orDash(run.leatherPerGoodMm2, (text) => areaText(text, areaUnit, 3)),
      align: 'right',
    },
    {
      id: 'mixed',
      header: 'Counts',
      value: (run) => (run.mixedIn ? 'yes' : 'no'),
      sortable: false,
      cell: (run) => <MixButton run={run} onMix={onMix} />,
      align: 'right',
    },
  ];
}

function MixButton({ run, onMix }: { run: PastRun; onMix: PastRunsTableProps['onMix'] }) {
  return (
    <Button tone="quiet" onClick={() => onMix(run.jobId, !run.mixedIn)}>
      {run.mixedIn ? 'Leave out' : 'Mix in again'}
      <span className="sr-only">, {run.number}</span>
    </Button>
  );
}
