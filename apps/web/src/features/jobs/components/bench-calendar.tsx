import type { BenchDay, BenchHours } from '@hidewright/contract';
import { Card } from '../../../components/card.tsx';
import { Notice } from '../../../components/notice.tsx';
import { TextLink } from '../../../components/text-link.tsx';
import { classNames } from '../../../lib/class-names.ts';
import { dayText, hoursText } from '../../../lib/formatting.ts';
import { useWorkshop } from '../../../lib/workshop.tsx';

/** The bench hours of the coming two weeks: a seam for each day, stitched as far as it is promised. */
export function BenchCalendar({ hours }: { hours: BenchHours }) {
  const { today } = useWorkshop();
  const longest = Math.max(...hours.days.map(({ minutes }) => Number(minutes)), 1);
  return (
    <Card title="Bench hours" subtitle="What open jobs will need, earliest promise first">
      {hours.late.map((job) => (
        <Notice
          key={job.jobId}
          tone="danger"
          className="mb-3"
          title={`${job.number} ${job.title}:`}
        >
          {Number(job.minutesShort) > 0
            ? `${hoursText(job.minutesShort)} short by ${dayText(job.promisedOn, today)}. Move it, or work longer.`
            : `its pieces must lie beyond ${dayText(job.promisedOn, today)}. Promise a later day.`}
        </Notice>
      ))}
      <table className="w-full">
        <caption className="sr-only">Bench hours, day by day</caption>
        <thead className="sr-only">
          <tr>
            <th scope="col">Day</th>
            <th scope="col">Jobs</th>
            <th scope="col">Free</th>
          </tr>
        </thead>
        <tbody>
          {hours.days.map((day) => (
            <DayRow key={day.day} day={day} today={today} longest={longest} />
          ))}
        </tbody>
      </table>
    </Card>
  );
}

function DayRow({ day, today, longest }: { day: BenchDay; today: string; longest: number }) {
  const isRest = day.minutes === '0';
  return (
    <tr className="align-top">
      <th scope="row" className="w-24 py-2 pr-3 text-left text-sm font-normal whitespace-nowrap">
        <span className={classNames(day.day === today && 'font-bold')}>{dayText(day.day)}</span>
      </th>
      <td className="py-2">
        {isRest && day.promised.length === 0 ? (
          <span className="text-sm text-ink-soft">no bench hours</span>
        ) : (
          <Seam day={day} longest={longest} />
        )}
        <Jobs day={day} />
      </td>
      <td className="w-20 py-2 pl-3 text-right text-sm whitespace-nowrap">
        {isRest ? '' : `${hoursText(day.freeMinutes)} free`}
      </td>
    </tr>
  );
}

/** One stitch for each half hour: worked, promised, free. */
function Seam({ day, longest }: { day: BenchDay; longest: number }) {
  const total = Number(day.minutes);
  const stitches = Math.max(1, Math.round(total / 30));
  const worked = Math.min(Number(day.loggedMinutes), total);
  const taken = total - Number(day.freeMinutes);
  return (
    <div
      aria-hidden="true"
      className="mt-1.5 flex gap-1"
      style={{ width: `${(total / longest) * 100}%` }}
    >
      {Array.from({ length: stitches }, (_, at) => {
        const middle = ((at + 0.5) / stitches) * total;
        const look =
          middle < worked ? 'bg-slate' : middle < taken ? 'bg-verdigris' : 'bg-stitch/60';
        return <span key={at} className={classNames('h-1.5 flex-1 rounded-full', look)} />;
      })}
    </div>
  );
}

function Jobs({ day }: { day: BenchDay }) {
  const promised = new Set(day.promised.map(({ jobId }) => jobId));
  const others = day.promised.filter(
    ({ jobId }) => !day.planned.some((each) => each.jobId === jobId),
  );
  if (day.planned.length + others.length === 0) return null;
  return (
    <ul className="mt-1 text-sm">
      {day.planned.map((job) => (
        <li key={job.jobId}>
          <TextLink to={`/bench/jobs/${job.jobId}`}>{job.number}</TextLink> {job.title},{' '}
          {hoursText(job.minutes)}
          {promised.has(job.jobId) && <strong>, to pack</strong>}
        </li>
      ))}
      {others.map((job) => (
        <li key={job.jobId}>
          <TextLink to={`/bench/jobs/${job.jobId}`}>{job.number}</TextLink> {job.title},{' '}
          <strong>to pack</strong>
        </li>
      ))}
    </ul>
  );
}
