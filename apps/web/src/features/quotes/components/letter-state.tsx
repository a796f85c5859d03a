import type { Quote } from '@hidewright/contract';
import { Button } from '../../../components/button.tsx';
import { Notice } from '../../../components/notice.tsx';
import { say } from '../../../components/toast.ts';
import { dayText, instantText } from '../../../lib/formatting.ts';
import { useWorkshop } from '../../../lib/workshop.tsx';
import { useRevokeLink } from '../quotes.mutations.ts';
import { orSayWhy } from './or-say-why.ts';

/** Whether the quote has reached the customer, and whether their link works. */
export function LetterState({ quote, isOwner }: { quote: Quote; isOwner: boolean }) {
  const { timeZone } = useWorkshop();
  if (quote.state === 'draft' || quote.sentAt === null) return null;
  const { letter } = quote;
  return (
    <div className="space-y-2">
      {letter === null && <p>{`Sent by hand, ${instantText(quote.sentAt, timeZone)}.`}</p>}
      {letter?.state === 'waiting' && (
        <p role="status">
          {letter.lastError
            ? 'The mail has not left yet; it is tried again.'
            : 'The mail is about to leave.'}
        </p>
      )}
      {letter?.state === 'sent' && letter.sentAt && (
        <p role="status">{`Mailed ${instantText(letter.sentAt, timeZone)}.`}</p>
      )}
      {letter?.state === 'failed' && (
        <Notice tone="danger">The mail could not be delivered. Send it again, or by hand.</Notice>
      )}
      {quote.link && (
        <p className="text-sm text-ink-soft">
          {`Their link works until ${dayText(quote.link.expiresAt)}. `}
          {isOwner && <StopLink quote={quote} />}
        </p>
      )}
    </div>
  );
}

function StopLink({ quote }: { quote: Quote }) {
  const revoke = useRevokeLink();
  return (
    <Button
      tone="quiet"
      className="-my-1"
      busy={revoke.isPending}
      onClick={() =>
        void orSayWhy(async () => {
          await revoke.mutateAsync({ params: { id: quote.id } });
          say('The link no longer works. Sending again makes a new one.');
        })
      }
    >
      Stop the link
    </Button>
  );
}
