import type { Quote } from '@hidewright/contract';
import { useState } from 'react';
import { Button } from '../../../components/button.tsx';
import { Dialog } from '../../../components/dialog.tsx';
import { Notice } from '../../../components/notice.tsx';
import { say } from '../../../components/toast.ts';
import { ApiProblem } from '../../../lib/api-problem.ts';
import { useRenewLink, useSendQuote } from '../quotes.mutations.ts';
import { HandedOver } from './handed-over.tsx';

interface SendDialogProps {
  quote: Quote;
  open: boolean;
  onOpenChange: (open: boolean) => void;
}

type By = 'mail' | 'hand';

/** How a quote goes out: by mail, or by hand as a link and text. One that is out already can go out again. */
export function SendDialog({ quote, open, onOpenChange }: SendDialogProps) {
  const send = useSendQuote();
  const again = useRenewLink();
  const [handed, setHanded] = useState<{ linkUrl: string; text: string }>();
  const [problem, setProblem] = useState<string>();
  const isDraft = quote.state === 'draft';
  const busy = send.isPending || again.isPending;

  async function go(by: By) {
    setProblem(undefined);
    try {
      const params = { id: quote.id };
      const reply = isDraft
        ? await send.mutateAsync({ params, body: { by }, ifMatch: quote.version })
        : await again.mutateAsync({ params, body: { by } });
      if (by === 'hand') {
        setHanded(reply);
        return;
      }
      say(`Quote ${quote.number} is on its way to ${quote.customerEmail ?? quote.customerName}.`);
      onOpenChange(false);
    } catch (error) {
      setProblem(
        error instanceof ApiProblem ? error.detail : 'That did not work. Try again in a moment.',
      );
    }
  }

  function close(next: boolean) {
    if (!next) setHanded(undefined);
    onOpenChange(next);
  }

  return (
    <Dialog
      open={open}
      onOpenChange={close}
      title={handed ? `Pass on quote ${quote.number}` : titleFor(quote)}
    >
      {problem && (
        <Notice tone="danger" live className="mb-4">
          {problem}
        </Notice>
      )}
      {handed ? (
        <HandedOver quoteId={quote.id} {...handed} />
      ) : (
        <Ways quote={quote} busy={busy} onGo={(by) => void go(by)} />
      )}
    </Dialog>
  );
}

const titleFor = ({ state, number }: Quote) =>
  state === 'draft' ? `Send quote ${number}` : `Send quote ${number} again`;

function Ways({ quote, busy, onGo }: { quote: Quote; busy: boolean; onGo: (by: By) => void }) {
  const byMail = !quote.cannotMail;
  return (
    <div className="space-y-4">
      {quote.state === 'draft' && (
        <p>Once it is out it stays as it is; to change it later, make a revision.</p>
      )}
      {byMail ? (
        <div>
          <Button tone="primary" busy={busy} onClick={() => onGo('mail')}>
            Send by mail
          </Button>
          <p className="mt-1 text-sm text-ink-soft">
            {`To ${quote.customerEmail ?? quote.customerName}, with the link and the quote as PDF.`}
          </p>
        </div>
      ) : (
        <Notice tone="info">{quote.cannotMail}</Notice>
      )}
      <div>
        <Button tone={byMail ? 'secondary' : 'primary'} busy={busy} onClick={() => onGo('hand')}>
          Send by hand
        </Button>
        <p className="mt-1 text-sm text-ink-soft">
          You get the link, the text and the paper to pass on yourself.
        </p>
      </div>
    </div>
  );
}
