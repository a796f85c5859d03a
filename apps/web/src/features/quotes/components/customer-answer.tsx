import type { Quote } from '@hidewright/contract';
import { Button } from '../../../components/button.tsx';
import { Card } from '../../../components/card.tsx';
import { say } from '../../../components/toast.ts';
import { countText, instantText, moneyText, unitPriceText } from '../../../lib/formatting.ts';
import { useWorkshop } from '../../../lib/workshop.tsx';
import { useAgreeQuote, useDeclineQuote } from '../quotes.mutations.ts';
import { LetterState } from './letter-state.tsx';
import { orSayWhy } from './or-say-why.ts';

interface CustomerAnswerProps {
  quote: Quote;
  /** The quantity picked on the ladder. */
  quantity: number;
  isOwner: boolean;
}

/** What the customer said, or the one press that notes it. */
export function CustomerAnswer({ quote, quantity, isOwner }: CustomerAnswerProps) {
  const open = quote.state === 'draft' || quote.state === 'sent';
  return (
    <Card title="The customer’s answer" subtitle={open ? 'none yet' : undefined}>
      <div className="space-y-3">
        <LetterState quote={quote} isOwner={isOwner} />
        {quote.state === 'agreed' && <Agreed quote={quote} />}
        {quote.state === 'declined' && <p>They declined. A revision can offer it again.</p>}
        {quote.state === 'lapsed' && (
          <p>They did not answer in time. A revision can offer it again.</p>
        )}
        {open && isOwner && <NoteAnswer quote={quote} quantity={quantity} />}
      </div>
    </Card>
  );
}

const ways = { link: 'by the link', phone: 'by phone', mail: 'by mail', counter: 'at the counter' };

function Agreed({ quote }: { quote: Quote }) {
  const { timeZone } = useWorkshop();
  const rung = quote.breaks.find((each) => each.quantity === quote.agreedQuantity);
  if (!rung || quote.agreedAt === null) return null;
  return (
    <div>
      <p className="text-lg font-semibold">
        {`${countText(rung.quantity)} agreed ${quote.agreedHow ? ways[quote.agreedHow] : ''}`}
      </p>
      {rung.priceEach !== undefined && rung.total !== undefined && (
        <p>{`${unitPriceText(rung.priceEach)} each, ${moneyText(rung.total)} with tooling`}</p>
      )}
      <p className="text-sm text-ink-soft">{instantText(quote.agreedAt, timeZone)}</p>
    </div>
  );
}

function NoteAnswer({ quote, quantity }: { quote: Quote; quantity: number }) {
  const agree = useAgreeQuote();
  const decline = useDeclineQuote();
  const params = { id: quote.id };
  return (
    <div>
      <div className="flex flex-wrap gap-2">
        <Button
          busy={agree.isPending}
          onClick={() =>
            void orSayWhy(async () => {
              await agree.mutateAsync({ params, body: { quantity, how: 'phone' } });
              say(`${quote.customerName} agreed to ${countText(quantity)}.`);
            })
          }
        >
          {`Agreed by phone: ${countText(quantity)}`}
        </Button>
        <Button
          tone="quiet"
          busy={decline.isPending}
          onClick={() => void orSayWhy(() => decline.mutateAsync({ params, body: { reason: '' } }))}
        >
          Declined
        </Button>
      </div>
      <p className="mt-1 text-sm text-ink-soft">Pick the quantity on the ladder first.</p>
    </div>
  );
}
