import type { RunsCheck } from '@hidewright/contract';
import { useEffect, useRef } from 'react';
import { Card } from '../../../components/card.tsx';
import { Notice } from '../../../components/notice.tsx';
import { StateMark } from '../../../components/state-mark.tsx';
import { countText, dayText } from '../../../lib/formatting.ts';
import { useWorkshop } from '../../../lib/workshop.tsx';
import { inTimeWords, mendedWords, shortWords } from '../verdict-words.ts';
import { CheckAnswers } from './check-answers.tsx';
import { DraftOrders } from './draft-orders.tsx';
import type { AskedRuns } from './runs-form.tsx';
import { ShortItem } from './short-item.tsx';

interface RunsAnswerProps {
  asked: AskedRuns;
  check: RunsCheck;
  mayOrder: boolean;
  onDrafted: () => unknown;
}

/** Yes, or what is short, run by run in the order in which they are given; then what must be bought. */
export function RunsAnswer({ asked, check, mayOrder, onDrafted }: RunsAnswerProps) {
  const top = useRef<HTMLDivElement>(null);
  // On a phone the answer stands below the fields.
  useEffect(() => {
    top.current?.scrollIntoView({ block: 'start' });
  }, [check]);
  const inTurn = [...check.runs].sort((a, b) => a.turn - b.turn);
  return (
    <div ref={top} className="grid gap-5">
      <Verdict check={check} />
      {inTurn.map((run) => (
        <RunCard key={run.turn} run={run} />
      ))}
      {check.short.length > 0 && (
        <Card title="What is short" subtitle="for all these runs together, over the coming weeks">
          <div className="space-y-6">
            {check.short.map((item) => (
              <ShortItem key={`${item.of} ${item.id}`} item={item} />
            ))}
            {mayOrder && (
              <DraftOrders
                runs={asked}
                answers={check.runs.flatMap(({ answers }) => answers)}
                onDrafted={onDrafted}
              />
            )}
          </div>
        </Card>
      )}
    </div>
  );
}

function Verdict({ check }: { check: RunsCheck }) {
  const { today } = useWorkshop();
  const { runs, yes, earliestDay } = check;
  if (yes) {
    return (
      <Notice tone="ok" live title={runs.length === 1 ? 'Yes.' : `Yes, all ${runs.length}.`}>
        Nothing is held until an order is taken on.
      </Notice>
    );
  }
  const able = runs.filter((run) => run.yes).length;
  const all =
    earliestDay === null
      ? ''
      : ` With what is short ordered today, ${runs.length === 1 ? 'it can' : 'all can'} be packed by ${dayText(earliestDay, today)}, tooling aside.`;
  return (
    <Notice tone="danger" live title={`${able} of ${runs.length} as asked.`}>
      {`What is short is said below.${all}`}
    </Notice>
  );
}

function RunCard({ run }: { run: RunsCheck['runs'][number] }) {
  const { today } = useWorkshop();
  const by = dayText(run.by, today);
  const details = [
    `${countText(run.quantity)} needed, ${countText(run.cutCount)} to cut`,
    run.option,
    `packed by ${by}`,
  ];
  return (
    <Card title={`${run.turn}. ${run.name}`} subtitle={details.filter(Boolean).join(' · ')}>
      <p className="flex flex-wrap items-baseline gap-x-3 gap-y-1">
        <StateMark state={run.yes ? 'received' : 'short'}>{run.yes ? 'yes' : 'not so'}</StateMark>
        <span className="min-w-0 grow basis-64">
          {run.yes
            ? inTimeWords(run, today)
            : `By ${by} ${shortWords(run.answers)} ${mendedWords(run, today)}`}
        </span>
      </p>
      <CheckAnswers check={run} />
    </Card>
  );
}
