import type { Awaited, Order } from '@hidewright/contract';
import { Button } from '../../../components/button.tsx';
import { Card } from '../../../components/card.tsx';
import { Notice } from '../../../components/notice.tsx';
import { say } from '../../../components/toast.ts';
import { ApiProblem } from '../../../lib/api-problem.ts';
import { useRecordArrival } from '../orders.mutations.ts';

const words: Record<Awaited, string> = {
  proof: 'Proof approved',
  deposit: 'Deposit received',
  tooling: 'Tooling here',
};

/** What is still awaited before the bench may begin, one press each. */
export function Arrivals({ order, canNote }: { order: Order; canNote: boolean }) {
  const { mutate, isPending, variables, error } = useRecordArrival();
  if (order.awaits.length === 0) return null;
  return (
    <Card title="Awaited" subtitle={`${order.job.number} waits until all of it is here.`}>
      {error && (
        <Notice tone="danger" live className="mb-4">
          {error instanceof ApiProblem ? error.detail : 'That did not work. Try again.'}
        </Notice>
      )}
      <ul className="flex flex-wrap gap-2">
        {order.awaits.map((what) => (
          <li key={what}>
            {canNote ? (
              <Button
                busy={isPending && variables.body.what === what}
                onClick={() =>
                  mutate(
                    { params: { id: order.id }, body: { what } },
                    { onSuccess: () => say(`${words[what]}, noted on ${order.number}.`) },
                  )
                }
              >
                {words[what]}
              </Button>
            ) : (
              what
            )}
          </li>
        ))}
      </ul>
    </Card>
  );
}
