import type { listTaxRates, ReplyOf } from '@hidewright/contract';
import type { RadioCard } from '../../components/radio-cards.tsx';
import { percentText } from '../../lib/formatting.ts';

type Rates = ReplyOf<typeof listTaxRates>;

/** The rates in use, to choose from. */
export const rateCards = ({ items }: Rates): RadioCard[] =>
  items
    .filter((rate) => rate.active)
    .map(({ id, name, percent }) => ({ value: id, label: name, aside: percentText(percent, 4) }));

/** What the last invoice used, unless it was retired since; nothing at the first, when it must be said. */
export function usualRate({ items, usual }: Rates): number | null | undefined {
  if (usual === null) return undefined;
  const { taxRateId } = usual;
  const stillUsed = items.some(({ id, active }) => active && id === taxRateId);
  return taxRateId === null || stillUsed ? taxRateId : undefined;
}
