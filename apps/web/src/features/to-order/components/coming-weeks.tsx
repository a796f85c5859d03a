import type { OrderSuggestionReply } from '@hidewright/contract';
import { WeeksPicture } from '../../../components/weeks-picture.tsx';
import { dayText } from '../../../lib/formatting.ts';
import { useWorkshop } from '../../../lib/workshop.tsx';
import { amountText } from '../to-order-words.ts';

const headings = ['Comes', 'Goes', 'Free then'];

/** How it goes on for twelve weeks, as a picture and as a table. */
export function ComingWeeks({ item }: { item: OrderSuggestionReply }) {
  const workshop = useWorkshop();
  const { today } = workshop;
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
        <table className="w-full text-left">
          <thead>
            <tr className="text-sm text-ink-soft">
              <th scope="col" className="py-1 pr-3 font-normal">
                By
              </th>
              {headings.map((word) => (
                <th key={word} scope="col" className="py-1 pl-3 text-right font-normal">
                  {word}
                </th>
              ))}
            </tr>
          </thead>
          <tbody>
            {item.days.map((row) => (
              <tr key={row.day} className="border-t border-stitch/60 align-top">
                <th scope="row" className="py-1.5 pr-3 font-normal">
                  {dayText(row.day, today)}
                  <span className="block text-sm text-ink-soft">{row.what.join(', ')}</span>
                </th>
                <td className="py-1.5 pl-3 text-right">
                  {Number(row.comes) > 0 ? say(row.comes) : '–'}
                </td>
                <td className="py-1.5 pl-3 text-right">
                  {Number(row.goes) > 0 ? say(row.goes) : '–'}
                </td>
                <td className="py-1.5 pl-3 text-right whitespace-nowrap">
                  {Number(row.left) < 0 ? (
                    <strong className="font-semibold text-oxblood">{`${say(row.left.slice(1))} short`}</strong>
                  ) : (
                    say(row.left)
                  )}
                </td>
              </tr>
            ))}
          </tbody>
        </table>
      </details>
    </section>
  );
}
