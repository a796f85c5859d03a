import { quotePaper, type Quote } from '@hidewright/contract';
import { useState } from 'react';
import { useNavigate } from 'react-router-dom';
import { Button } from '../../../components/button.tsx';
import { buttonLook } from '../../../components/button-look.ts';
import { LinkButton } from '../../../components/link-button.tsx';
import { addressOf } from '../../../lib/api.ts';
import { useReviseQuote } from '../quotes.mutations.ts';
import { orSayWhy } from './or-say-why.ts';
import { SendDialog } from './send-dialog.tsx';

/** What can be done with the whole quote, by its state; agreeing and declining stand with the answer. */
export function QuoteActions({ quote, isOwner }: { quote: Quote; isOwner: boolean }) {
  return (
    <>
      {isOwner && <OwnersActions quote={quote} />}
      <a
        href={addressOf(quotePaper, { params: { id: quote.id } })}
        download
        className={buttonLook({})}
      >
        PDF
      </a>
    </>
  );
}

function OwnersActions({ quote }: { quote: Quote }) {
  const [sending, setSending] = useState(false);
  const out = quote.state === 'sent' || quote.state === 'agreed';
  return (
    <>
      {quote.state === 'draft' && (
        <>
          <Button tone="primary" onClick={() => setSending(true)}>
            Send quote
          </Button>
          <LinkButton to={`/counter/quotes/${quote.id}/change`}>Change</LinkButton>
        </>
      )}
      {out && <Button onClick={() => setSending(true)}>Send again</Button>}
      <ReviseButton quote={quote} />
      <SendDialog quote={quote} open={sending} onOpenChange={setSending} />
    </>
  );
}

function ReviseButton({ quote }: { quote: Quote }) {
  const revise = useReviseQuote();
  const navigate = useNavigate();
  const revisable = ['sent', 'declined', 'lapsed'].includes(quote.state);
  const newer = quote.revisions.some((other) => other.revision > quote.revision);
  if (!revisable || newer) return null;
  return (
    <Button
      busy={revise.isPending}
      onClick={() =>
        void orSayWhy(async () => {
          const draft = await revise.mutateAsync({ params: { id: quote.id } });
          await navigate(`/counter/quotes/${draft.id}/change`);
        })
      }
    >
      Make a revision
    </Button>
  );
}
