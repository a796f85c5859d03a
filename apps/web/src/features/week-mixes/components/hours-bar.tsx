import type { WeekMixReply } from '@hidewright/contract';
import { classNames } from '../../../lib/class-names.ts';
import { hoursWords } from '../mix-words.ts';
import { deskHours, weekParts } from '../mix-parts.ts';

/** The week's hours as one bar: desk time first, then the work by its number in the table, then what is free. */
export function HoursBar({ mix }: { mix: WeekMixReply }) {
  const parts = weekParts(mix);
  const all = parts.reduce((sum, { hours }) => sum + hours, 0);
  const spoken = parts.map(({ name, hours }) => `${name} ${hoursWords(String(hours))}`).join(', ');
  return (
    <figure>
      <figcaption className="mb-1 flex flex-wrap justify-between gap-x-4">
        <span>the week’s hours</span>
        <span className="font-semibold">{hoursWords(mix.hours.all)}</span>
      </figcaption>
      <div role="img" aria-label={spoken} className="flex h-11 gap-0.5">
        {parts.map(({ number, name, hours, look }) => (
          <span
            key={`${number} ${name}`}
            className={classNames(
              'flex min-w-0 items-center justify-center overflow-hidden rounded-[2px] text-sm whitespace-nowrap',
              look,
            )}
            style={{ flexGrow: hours, flexBasis: 0 }}
          >
            {hours / all > 0.12 ? (number ?? name) : hours / all > 0.045 ? number : null}
          </span>
        ))}
      </div>
      <p className="mt-1 text-sm text-ink-soft">
        {`${hoursWords(String(deskHours(mix)))} at the desk come first, then the work by its number; dashed is free`}
      </p>
    </figure>
  );
}
