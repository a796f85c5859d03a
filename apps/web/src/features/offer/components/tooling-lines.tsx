import type { Offer } from '@hidewright/contract';
import { moneyText } from '../../../lib/formatting.ts';

/** What is charged once for tools, and in which currency all of it is. */
interface ToolingLinesProps {
  offer: Offer;
  /** The quantity chosen: what is charged beside it, and what a later order comes to. */
  rung: Offer['breaks'][number] | undefined;
}

export function ToolingLines({ offer, rung }: ToolingLinesProps) {
  const once = [
    ...offer.tooling.map(({ name, charge }) => ({ name: `${name}, charged once`, amount: charge })),
    ...(rung?.charges ?? []),
  ];
  return (
    <div className="text-ink-soft">
      {once.map(({ name, amount }) => (
        <p key={name} className="flex justify-between gap-4">
          <span>{name}</span>
          <span className="font-semibold text-ink">{moneyText(amount)}</span>
        </p>
      ))}
      {rung && offer.tooling.length > 0 && (
        <p className="flex justify-between gap-4">
          <span>A later order of the same, tooling paid for</span>
          <span>{moneyText(rung.reorderTotal)}</span>
        </p>
      )}
      <p className="mt-1 text-sm">
        {`Prices in ${offer.currency}${once.length > 0 ? '; the sum on the button includes all of it' : ''}. Sales tax, where it applies, is added on the invoice.`}
      </p>
    </div>
  );
}
