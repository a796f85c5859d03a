import type { Offer } from '@hidewright/contract';
import { useState } from 'react';
import { Button } from '../../../components/button.tsx';
import { ErrorSummary } from '../../../components/error-summary.tsx';
import { ApiProblem } from '../../../lib/api-problem.ts';
import { countText, moneyText } from '../../../lib/formatting.ts';
import { useAgreeOffer } from '../offer.queries.ts';
import { OptionCards } from './option-cards.tsx';
import { QuantityCard } from './quantity-card.tsx';
import { rungsOf } from './rungs-of.ts';
import { ToolingLines } from './tooling-lines.tsx';

/** How many, at what price; agreeing is one press, and a POST. */
export function OfferChoice({ offer, token }: { offer: Offer; token: string }) {
  const send = useAgreeOffer(token);
  const only = offer.breaks.length === 1 ? offer.breaks[0]?.quantity : undefined;
  const [chosen, setChosen] = useState(only);
  const [attempt, setAttempt] = useState(0);
  const [refusal, setRefusal] = useState<string>();
  const [option, setOption] = useState<string | null>(null);
  const breaks = rungsOf(offer, option);
  const rung = breaks.find((each) => each.quantity === chosen);

  async function agree() {
    setAttempt(attempt + 1);
    if (chosen === undefined) {
      setRefusal('Choose how many first.');
      return;
    }
    setRefusal(undefined);
    try {
      await send.mutateAsync({ params: { token }, body: { quantity: chosen, option } });
    } catch (error) {
      setRefusal(
        error instanceof ApiProblem ? error.detail : 'That did not work. Try again in a moment.',
      );
    }
  }

  return (
    <form
      noValidate
      className="space-y-5"
      onSubmit={(event) => {
        event.preventDefault();
        if (!send.isPending) void agree();
      }}
    >
      {refusal && <ErrorSummary attempt={attempt} title={refusal} errors={[]} />}
      <OptionCards offer={offer} chosen={option} onChoose={setOption} />
      <fieldset>
        <legend className="mb-1.5 font-semibold">How many?</legend>
        <div className="grid gap-1.5">
          {breaks.map((each) => (
            <QuantityCard
              key={each.quantity}
              rung={each}
              chosen={each.quantity === chosen}
              onChoose={() => {
                setChosen(each.quantity);
                setRefusal(undefined);
              }}
            />
          ))}
        </div>
      </fieldset>
      <ToolingLines offer={offer} rung={rung} />
      <Button type="submit" tone="primary" size="bench" busy={send.isPending} className="w-full">
        {rung ? `Agree to ${countText(rung.quantity)}, ${moneyText(rung.total)}` : 'Agree'}
      </Button>
    </form>
  );
}
