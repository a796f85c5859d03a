import { dayText } from '../lib/formatting.ts';
import { useWorkshop } from '../lib/workshop.tsx';

interface WeeksDay {
  day: string;
  comes: string;
  goes: string;
  /** Below 0 where it does not suffice. */
  left: string;
  what: readonly string[];
}

interface WeeksTableProps {
  days: readonly WeeksDay[];
  /** What the days are called: "Day", or "By" where each stands for its week. */
  dayWord: string;
  say: (value: string) => string;
}

const headings = ['Comes', 'Goes', 'Free then'];

/** How a thing goes on, day by day: the same as the picture beside it. */
export function WeeksTable({ days, dayWord, say }: WeeksTableProps) {
  const { today } = useWorkshop();
  const orDash = (value: string) => (Number(value) > 0 ? say(value) : '–');
  return (
    <table className="w-full text-left">
      <thead>
        <tr className="text-sm text-ink-soft">
          <th scope="col" className="py-1 pr-3 font-normal">
            {dayWord}
          </th>
          {headings.map((word) => (
            <th key={word} scope="col" className="py-1 pl-3 text-right font-normal">
              {word}
            </th>
          ))}
        </tr>
      </thead>
      <tbody>
        {days.map(({ day, comes, goes, left, what }) => (
          <tr key={day} className="border-t border-stitch/60 align-top">
            <th scope="row" className="py-1.5 pr-3 font-normal">
              {dayText(day, today)}
              <span className="block text-sm text-ink-soft">{what.join(', ')}</span>
            </th>
            <td className="py-1.5 pl-3 text-right">{orDash(comes)}</td>
            <td className="py-1.5 pl-3 text-right">{orDash(goes)}</td>
            <td className="py-1.5 pl-3 text-right whitespace-nowrap">
              {Number(left) < 0 ? (
                <strong className="font-semibold text-oxblood">{`${say(left.slice(1))} short`}</strong>
              ) : (
                say(left)
              )}
            </td>
          </tr>
        ))}
      </tbody>
    </table>
  );
}
