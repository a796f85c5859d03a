import type { Quote } from '@hidewright/contract';
import { Button } from '../../../components/button.tsx';
import { Card } from '../../../components/card.tsx';
import { say } from '../../../components/toast.ts';
import { countText, instantText, moneyText, unitPriceText } from '../../../lib/formatting.ts';
import { useWorkshop } from '../../../lib/workshop.tsx';
import { useAgreeQuote, useDeclineQuote } from '../quotes.mutations.ts';
import { ladderOf } from './option-switch.tsx';
import { LetterState } from './letter-state.tsx';
import { orSayWhy } from './or-say-why.ts';

interface CustomerAnswerProps {
  quote: Quote;
  /** The quantity picked on the ladder. */
  quantity: number;
  /** The option picked; null for the piece as it is. */
  option: string | null;
  isOwner: boolean;
}

/** What the customer said, or the one press that notes it. */
export function CustomerAnswer({ quote, quantity, option, isOwner }: CustomerAnswerProps) {
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
        {open && isOwner && <NoteAnswer quote={quote} quantity={quantity} option={option} />}
      </div>
    </Card>
  );
}

const ways = { link: 'by the link', phone: 'by phone', mail: 'by mail', counter: 'at the counter' };

type AgreedRung = Pick<Quote['breaks'][number], 'quantity' | 'priceEach' | 'total'>;

function Agreed({ quote }: { quote: Quote }) {
  const { timeZone } = useWorkshop();
  const numbers = quote.numbers && ladderOf(quote.numbers, quote.agreedOption);
  const rungs: readonly AgreedRung[] = numbers?.breaks ?? quote.breaks;
  const rung = rungs.find((each) => each.quantity === quote.agreedQuantity);
  if (!rung || quote.agreedAt === null) return null;
  return (
    <div>
      <p className="text-lg font-semibold">
        {`${countText(rung.quantity)} agreed ${quote.agreedHow ? ways[quote.agreedHow] : ''}`}
      </p>
      {quote.agreedOption !== null && <p>{quote.agreedOption}</p>}
      {rung.priceEach !== undefined && rung.total !== undefined && (
        <p>{`${unitPriceText(rung.priceEach)} each, ${moneyText(rung.total)} in all`}</p>
      )}
      <p className="text-sm text-ink-soft">{instantText(quote.agreedAt, timeZone)}</p>
    </div>
  );
}

function NoteAnswer({ quote, quantity, option }: Omit<CustomerAnswerProps, 'isOwner'>) {
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
              await agree.mutateAsync({ params, body: { quantity, option, how: 'phone' } });
              say(`${quote.customerName} agreed to ${countText(quantity)}.`);
            })
          }
        >
          {`Agreed by phone: ${countText(quantity)}${option === null ? '' : `, ${option}`}`}
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
