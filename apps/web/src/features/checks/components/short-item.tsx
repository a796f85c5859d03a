import type { ShortForRuns } from '@hidewright/contract';
import { KeyFigures } from '../../../components/key-figures.tsx';
import { rackAreaText, countText, dayText } from '../../../lib/formatting.ts';
import { WeeksPicture } from '../../../components/weeks-picture.tsx';
import { WeeksTable } from '../../../components/weeks-table.tsx';
import { useWorkshop } from '../../../lib/workshop.tsx';

/** What is short of one thing, by when it can be here, and how it goes on: a picture, and the same as a table. */
export function ShortItem({ item }: { item: ShortForRuns }) {
  const workshop = useWorkshop();
  const { today } = workshop;
  const say = (value: string) =>
    item.unit === 'mm2' ? rackAreaText(value, workshop) : countText(Number(value));
  return (
    <section
      aria-label={item.name}
      className="border-t border-stitch pt-4 first:border-t-0 first:pt-0"
    >
      <h3 className="mb-3 font-semibold">{item.name}</h3>
      <KeyFigures
        figures={[
          {
            word: item.of === 'leather' ? 'in whole panels, on hand' : 'on hand',
            figure: say(item.onHand),
            note:
              Number(item.reserved) > 0 ? `${say(item.reserved)} of it held` : 'none of it held',
          },
          ...(Number(item.ends ?? 0) > 0
            ? [
                {
                  word: 'left in ends',
                  figure: say(item.ends ?? '0'),
                  note: 'too small for a panel',
                },
              ]
            : []),
          { word: 'on order', figure: say(item.onOrder) },
          { word: 'needed for these', figure: say(item.needed) },
          ...(item.fromCustomer
            ? [{ word: 'to buy', figure: 'none', note: 'from the customer' }]
            : buying(item, { say, today })),
        ]}
      />
      <WeeksPicture item={item} say={say} />
      <details>
        <summary className="min-h-11 rounded py-2.5">Day by day</summary>
        <WeeksTable days={item.days} dayWord="Day" say={say} />
      </details>
    </section>
  );
}

function buying(
  item: ShortForRuns,
  { say, today }: { say: (value: string) => string; today: string },
) {
  return [
    {
      word: 'to buy',
      figure: Number(item.toOrder) > 0 ? say(item.toOrder) : 'none',
      note: draftedWords(item) ?? soldWords(item, say),
    },
    {
      word: 'ordered today, here by',
      figure: item.arrivesOn === null ? 'not known' : dayText(item.arrivesOn, today),
      note: item.supplierName ?? 'nobody is named who sells it',
    },
  ];
}

/** Where more has to be bought than is short. */
function soldWords({ of, buy, toOrder }: ShortForRuns, say: (value: string) => string) {
  if (say(buy) === say(toOrder)) return undefined;
  return of === 'leather' ? 'waste and all, as it is sold' : `${say(buy)} short, as it is sold`;
}

function draftedWords({ drafted, drafts }: ShortForRuns): string | undefined {
  return Number(drafted) > 0 ? `on draft ${drafts.join(' and ')}` : undefined;
}
