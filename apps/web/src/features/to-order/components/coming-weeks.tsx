import type { OrderSuggestionReply } from '@hidewright/contract';
import { WeeksPicture } from '../../../components/weeks-picture.tsx';
import { WeeksTable } from '../../../components/weeks-table.tsx';
import { useWorkshop } from '../../../lib/workshop.tsx';
import { amountText } from '../to-order-words.ts';

/** How it goes on for twelve weeks, as a picture and as a table. */
export function ComingWeeks({ item }: { item: OrderSuggestionReply }) {
  const workshop = useWorkshop();
  const say = (value: string) => amountText(value, item, workshop);
  const mark =
    Number(item.point) > 0
      ? { word: `order below ${say(item.point)}`, at: Number(item.point) }
      : undefined;
  return (
    <section aria-label={`Coming weeks of ${item.name}`}>
      <h3 className="font-semibold">The coming weeks</h3>
      <p className="text-sm text-ink-soft">
        What is free when what is on order comes, what is promised goes, and as much is used as
        usual.
      </p>
      <WeeksPicture item={item} say={say} mark={mark} />
      <details>
        <summary className="min-h-11 rounded py-2.5">Week by week</summary>
        <WeeksTable days={item.days} dayWord="By" say={say} />
      </details>
    </section>
  );
}
