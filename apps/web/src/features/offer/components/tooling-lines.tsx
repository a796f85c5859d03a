import type { Offer } from '@hidewright/contract';
import { moneyText } from '../../../lib/formatting.ts';

/** What is charged once for tools, and in which currency all of it is. */
export function ToolingLines({ offer }: { offer: Offer }) {
  return (
    <div className="text-ink-soft">
      {offer.tooling.map((tool) => (
        <p key={tool.name} className="flex justify-between gap-4">
          <span>{`${tool.name}, charged once`}</span>
          <span className="font-semibold text-ink">{moneyText(tool.charge)}</span>
        </p>
      ))}
      <p className="mt-1 text-sm">
        {`Prices in ${offer.currency}${offer.tooling.length > 0 ? '; the sum on the button includes the tooling' : ''}. Sales tax, where it applies, is added on the invoice.`}
      </p>
    </div>
  );
}
