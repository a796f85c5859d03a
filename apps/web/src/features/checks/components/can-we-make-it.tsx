import type { RunCheck } from '@hidewright/contract';
import { useQuery } from '@tanstack/react-query';
import { useId, useState, type ReactNode } from 'react';
import { Card } from '../../../components/card.tsx';
import { Skeleton } from '../../../components/loading.tsx';
import { Notice } from '../../../components/notice.tsx';
import { ApiProblem } from '../../../lib/api-problem.ts';
import { countText, dayText } from '../../../lib/formatting.ts';
import { useWorkshop } from '../../../lib/workshop.tsx';
import { checkQuery } from '../checks.queries.ts';
import { inTimeWords, mendedWords, shortWords } from '../verdict-words.ts';
import { CheckAnswers } from './check-answers.tsx';
import { DraftOrders } from './draft-orders.tsx';

interface CanWeMakeItProps {
  quoteId: number;
  /** Where it begins; the day can be changed. */
  quantity?: number;
  option?: string | undefined;
  by?: string | undefined;
  /** Whether this person may draft purchase orders. */
  mayOrder?: boolean | undefined;
  /** What follows from the answer, such as taking the order on. */
  children?: (check: RunCheck) => ReactNode;
}

/** Can we make it? Yes, or exactly what is short: leather, hardware, tooling, bench hours, by that day. */
export function CanWeMakeIt(props: CanWeMakeItProps) {
  const { quoteId, quantity, option, by, mayOrder, children } = props;
  const { today } = useWorkshop();
  const id = useId();
  const [chosen, setChosen] = useState(by !== undefined && by >= today ? by : undefined);
  const {
    data: check,
    error,
    isFetching,
    refetch,
  } = useQuery(checkQuery(quoteId, { quantity, option, by: chosen }));
  return (
    <Card title="Can we make it?">
      <div className="mb-4 flex flex-wrap items-end gap-x-4 gap-y-2">
        <div>
          <label htmlFor={id} className="mb-1 block font-semibold">
            Packed by
          </label>
          <input
            id={id}
            type="date"
            min={today}
            value={chosen ?? check?.by ?? ''}
            onChange={(event) =>
              setChosen(event.target.value === '' ? undefined : event.target.value)
            }
            className="min-h-10 rounded border border-edge bg-card px-3 py-1.5"
          />
        </div>
        {check && (
          <p className="pb-2 text-ink-soft">
            {countText(check.quantity)} needed, {countText(check.cutCount)} to cut
          </p>
        )}
      </div>
      {error && (
        <Notice tone="danger" live>
          {error instanceof ApiProblem ? error.detail : 'That did not work. Try again.'}
        </Notice>
      )}
      {!check && !error && <Skeleton className="h-32 w-full" />}
      {check && !error && (
        <div aria-busy={isFetching}>
          <Verdict check={check} />
          <CheckAnswers check={check} />
          {mayOrder && (
            <DraftOrders
              runs={[{ quoteId, quantity: check.quantity, option, by: check.by }]}
              answers={check.answers}
              onDrafted={refetch}
            />
          )}
          {children?.(check)}
        </div>
      )}
    </Card>
  );
}

const mendable = ({ earliestDay, by }: RunCheck): boolean =>
  earliestDay !== null && earliestDay <= by;

function Verdict({ check }: { check: RunCheck }) {
  const { today } = useWorkshop();
  const by = dayText(check.by, today);
  if (check.yes) {
    return (
      <Notice tone="ok" live title={`Yes, by ${by}.`}>
        {`${inTimeWords(check, today)} Nothing is held until it is taken on.`}
      </Notice>
    );
  }
  return (
    <Notice tone="danger" live title={mendable(check) ? `Not yet for ${by}:` : `Not by ${by}:`}>
      {`${shortWords(check.answers)} ${mendedWords(check, today)}`}
    </Notice>
  );
}
