import { useQuery } from '@tanstack/react-query';
import { useEffect } from 'react';
import { useFormContext, useWatch } from 'react-hook-form';
import { RadioCards } from '../../../components/radio-cards.tsx';
import { moneyText } from '../../../lib/formatting.ts';
import { useWorkshop } from '../../../lib/workshop.tsx';
import { shelfDraftsQuery } from '../finished-pieces.queries.ts';

/** Whoever has a draft from the shelf already gets these pieces on it, unless the owner says otherwise. */
export function DraftChoice() {
  const { currency } = useWorkshop();
  const { setValue } = useFormContext();
  const { data: drafts = [] } = useQuery(
    shelfDraftsQuery(Number(useWatch({ name: 'customerId' }))),
  );
  const latest = drafts[0]?.id ?? null;
  useEffect(() => setValue('draftId', latest), [latest, setValue]);
  if (latest === null) return null;
  return (
    <RadioCards
      name="draftId"
      label="On which invoice"
      cards={[
        ...drafts.map(({ id, net }) => ({
          value: id,
          label: 'Add to their draft',
          detail: `${moneyText(net)} ${currency} before tax so far`,
        })),
        { value: null, label: 'A new invoice' },
      ]}
    />
  );
}
