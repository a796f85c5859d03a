import type { draftSuggested, ReplyOf } from '@hidewright/contract';
import { Notice } from '../../../components/notice.tsx';
import { TextLink } from '../../../components/text-link.tsx';

/** Where what was drafted stands now, and what was left out and why. */
export function DraftedNotice({ drafted }: { drafted: ReplyOf<typeof draftSuggested> }) {
  const { orders, notes } = drafted;
  const some = orders.length > 0;
  return (
    <Notice
      tone={some ? 'ok' : 'info'}
      live
      title={some ? 'On the draft, not sent yet:' : 'Nothing was drafted.'}
    >
      {orders.map(({ id, number, supplierName }, at) => (
        <span key={id}>
          {at > 0 && ', '}
          <TextLink to={`/stockroom/purchase-orders/${id}`}>{number}</TextLink>
          {` to ${supplierName}`}
        </span>
      ))}
      {some && '. '}
      {notes.join(' ')}
    </Notice>
  );
}
