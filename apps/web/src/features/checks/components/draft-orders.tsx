import type { BodyInputOf, CheckAnswer, draftShort, ReplyOf } from '@hidewright/contract';
import { useState } from 'react';
import { Button } from '../../../components/button.tsx';
import { Notice } from '../../../components/notice.tsx';
import { TextLink } from '../../../components/text-link.tsx';
import { ApiProblem } from '../../../lib/api-problem.ts';
import { useDraftShort } from '../checks.mutations.ts';

interface DraftOrdersProps {
  runs: BodyInputOf<typeof draftShort>['runs'];
  answers: readonly CheckAnswer[];
  /** The answer may say something else now: what is drafted is counted. */
  onDrafted?: (() => unknown) | undefined;
}

/** One press drafts what is short, an order for each supplier; afterwards it says what was drafted. */
export function DraftOrders({ runs, answers, onDrafted }: DraftOrdersProps) {
  const send = useDraftShort();
  const [drafted, setDrafted] = useState<ReplyOf<typeof draftShort>>();
  async function draft() {
    setDrafted(await send.mutateAsync({ body: { runs } }));
    await onDrafted?.();
  }
  const needed = answers.some(({ toBuy }) => toBuy);
  if (!needed && !drafted) return null;
  return (
    <div className="mb-4 space-y-3">
      {send.error && (
        <Notice tone="danger" live>
          {send.error instanceof ApiProblem ? send.error.detail : 'That did not work. Try again.'}
        </Notice>
      )}
      {drafted && <DraftedNotice drafted={drafted} />}
      {needed && (
        <Button busy={send.isPending} onClick={() => void draft().catch(() => undefined)}>
          Draft the purchase orders
        </Button>
      )}
    </div>
  );
}

function DraftedNotice({ drafted }: { drafted: ReplyOf<typeof draftShort> }) {
  const { orders, notes } = drafted;
  return (
    <Notice
      tone={orders.length > 0 ? 'ok' : 'info'}
      live
      title={orders.length > 0 ? 'Drafted, not sent yet:' : 'Nothing more to draft.'}
    >
      {orders.map(({ id, number, supplierName }, at) => (
        <span key={id}>
          {at > 0 && ', '}
          <TextLink to={`/stockroom/purchase-orders/${id}`}>{number}</TextLink>
          {` to ${supplierName}`}
        </span>
      ))}
      {orders.length > 0 && '. '}
      {notes.join(' ')}
    </Notice>
  );
}
