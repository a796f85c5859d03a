import { addDays, daysBetween } from '@hidewright/domain';
import { dayText } from '../lib/formatting.ts';
import { useWorkshop } from '../lib/workshop.tsx';
import { heldOf, spokenWeeks, weekSteps, type ComingOf } from './week-steps.ts';

const [wide, high] = [600, 120];
/** Two weeks at least, so that a single day is not stretched over the page. */
const fewestDays = 14;

/**
 * What there is of an item over the coming weeks: the stepped line is what is free, the band above it is held for jobs,
 * and a thick rise is what comes. Below the bar it does not suffice.
 */
export function WeeksPicture({
  item,
  say,
  mark,
}: {
  item: ComingOf;
  say: (value: string) => string;
  /** A quantity that should not be passed, drawn as a dashed line with its word. */
  mark?: { word: string; at: number } | undefined;
}) {
  const { today } = useWorkshop();
  const last = item.days.at(-1)?.day ?? today;
  const days = Math.max(fewestDays, daysBetween(today, last) + 2);
  const steps = weekSteps(item, today);
  const [most, least] = [
    Math.max(...steps.map(({ left }) => left)),
    Math.min(...steps.map(({ left }) => left)),
  ];
  const held = heldOf(item);
  const [top, bottom] = [Math.max(0, most + held, mark?.at ?? 0), Math.min(0, least)];
  const y = (left: number) => 8 + ((top - left) / (top - bottom || 1)) * (high - 16);
  const x = (after: number) => (after / days) * wide;
  const stepped = (above: number) =>
    steps
      .map(({ after, left }, at) => `${at === 0 ? 'M 0' : `H ${x(after)} V`} ${y(left + above)}`)
      .join(' ');
  const back = steps
    .map(({ left }, at) => `V ${y(left)} H ${x(steps[at]?.after ?? 0)}`)
    .reverse()
    .join(' ');
  const out = item.runsOutOn === null ? null : x(daysBetween(today, item.runsOutOn));
  const spoken = spokenWeeks(item, { say, dayText: (day) => dayText(day, today) });
  return (
    <figure className="my-3">
      <svg
        viewBox={`0 0 ${wide} ${high}`}
        preserveAspectRatio="none"
        role="img"
        aria-label={spoken}
        className="h-28 w-full rounded bg-manila/40"
      >
        <rect x="0" y={y(0)} width={wide} height={high - y(0)} className="fill-oxblood-pale" />
        <line
          x1="0"
          x2={wide}
          y1={y(0)}
          y2={y(0)}
          className="stroke-edge"
          vectorEffect="non-scaling-stroke"
        />
        {mark !== undefined && (
          <line
            x1="0"
            x2={wide}
            y1={y(mark.at)}
            y2={y(mark.at)}
            strokeDasharray="2 5"
            strokeWidth="2"
            className="stroke-brass"
            vectorEffect="non-scaling-stroke"
          />
        )}
        {out !== null && (
          <line
            x1={out}
            x2={out}
            y1="0"
            y2={high}
            strokeDasharray="4 4"
            strokeWidth="2"
            className="stroke-oxblood"
            vectorEffect="non-scaling-stroke"
          />
        )}
        {held > 0 && <path d={`${stepped(held)} H ${wide} ${back} Z`} className="fill-brass/30" />}
        {steps.map(
          ({ after, left, comes }) =>
            comes > 0 && (
              <line
                key={after}
                x1={x(after)}
                x2={x(after)}
                y1={y(left)}
                y2={y(left - comes)}
                strokeWidth="8"
                className="stroke-verdigris"
                vectorEffect="non-scaling-stroke"
              />
            ),
        )}
        <path
          d={`${stepped(0)} H ${wide}`}
          fill="none"
          strokeWidth="3"
          className="stroke-verdigris"
          vectorEffect="non-scaling-stroke"
        />
      </svg>
      <figcaption className="mt-1 flex flex-wrap justify-between gap-x-4 text-sm text-ink-soft">
        <span>{dayText(today, today)}</span>
        <span>
          line: free{held > 0 && `; band: ${say(String(held))} held for jobs`}
          {steps.some(({ comes }) => comes > 0) && '; thick: comes'}
        </span>
        {mark !== undefined && <span className="text-brass">{`dotted: ${mark.word}`}</span>}
        {item.runsOutOn !== null && (
          <span className="text-oxblood">{`too little from ${dayText(item.runsOutOn, today)}`}</span>
        )}
        <span>{dayText(addDays(today, days), today)}</span>
      </figcaption>
    </figure>
  );
}
