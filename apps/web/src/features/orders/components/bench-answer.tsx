import type { Order, PromiseOutlook } from '@hidewright/contract';
import { useQuery } from '@tanstack/react-query';
import { useFormContext, useWatch } from 'react-hook-form';
import { Button } from '../../../components/button.tsx';
import { Notice } from '../../../components/notice.tsx';
import { ApiProblem } from '../../../lib/api-problem.ts';
import { dayText } from '../../../lib/formatting.ts';
import { useWorkshop } from '../../../lib/workshop.tsx';
import { promiseQuery } from '../orders.queries.ts';

type Asked = Pick<Order, 'id' | 'inHandsOn' | 'promisedOn'>;

/** Whether the bench can keep the day that is typed just now, and what it does to other promises. */
export function BenchAnswer({ order }: { order: Asked }) {
  const { today } = useWorkshop();
  const typed: unknown = useWatch({ name: 'promisedOn' });
  const day = typeof typed === 'string' && /^\d{4}-\d{2}-\d{2}$/.test(typed) ? typed : undefined;
  const { data, error } = useQuery({
    ...promiseQuery(order.id, day ?? order.promisedOn),
    enabled: day !== undefined,
    placeholderData: (before) => before,
  });
  if (error instanceof ApiProblem) return <Notice tone="attention">{error.detail}</Notice>;
  if (!data || day === undefined) return null;
  return (
    <div className="space-y-2">
      <Answer answer={data} />
      {order.inHandsOn !== null && day > order.inHandsOn && (
        <Notice tone="attention">
          The customer needs it in hands on {dayText(order.inHandsOn, today)}, before that day.
        </Notice>
      )}
    </div>
  );
}

function Answer({ answer }: { answer: PromiseOutlook }) {
  const { today } = useWorkshop();
  const { setValue } = useFormContext();
  const { kept, pushed, sentence, earliest } = answer;
  if (kept && pushed.length === 0)
    return (
      <Notice tone="ok" live>
        {sentence}
      </Notice>
    );
  return (
    <Notice
      tone="attention"
      live
      actions={
        earliest !== null &&
        earliest !== answer.by && (
          <Button onClick={() => setValue('promisedOn', earliest, { shouldDirty: true })}>
            Take {dayText(earliest, today)}
          </Button>
        )
      }
    >
      {sentence}
      {pushed.map((other) => (
        <span key={other} className="block">
          {other}
        </span>
      ))}
      {' You can promise it all the same.'}
    </Notice>
  );
}
