import type { PromisedJob, Today } from '@hidewright/contract';
import { Card } from '../../../components/card.tsx';
import { Notice } from '../../../components/notice.tsx';
import { TextLink } from '../../../components/text-link.tsx';
import { classNames } from '../../../lib/class-names.ts';
import { dayText } from '../../../lib/formatting.ts';

type FourWeeksOfToday = NonNullable<Today['fourWeeks']>;

const span = 28;
const weekMarks = [0, 7, 14, 21] as const;

/** The open jobs as running stitches from the day their hours begin to the day they are promised. */
export function FourWeeks({ weeks }: { weeks: FourWeeksOfToday }) {
  const hours = (minutes: string) => Math.round(Number(minutes) / 60);
  const late = weeks.jobs.filter((job) => job.late);
  return (
    <Card
      title="Four weeks"
      subtitle={`${hours(weeks.promisedMinutes)} of ${hours(weeks.benchMinutes)} bench hours are promised`}
    >
      {weeks.jobs.length === 0 ? (
        <p className="text-ink-soft">No job is open. A run that is taken on appears here.</p>
      ) : (
        <>
          <div className="hidden pl-[42%] text-sm text-ink-soft sm:flex" aria-hidden="true">
            {weekMarks.map((days) => (
              <span key={days} className="flex-1">
                {dayText(dayAfter(weeks.from, days)).slice(4)}
              </span>
            ))}
          </div>
          <ul>
            {weeks.jobs.map((job) => (
              <JobRow key={job.number} job={job} from={weeks.from} />
            ))}
          </ul>
        </>
      )}
      {late.length > 0 && (
        <Notice tone="attention" className="mt-4" title={lateTitle(late)}>
          The bench hours left do not reach its promised day. Work it first, or agree on a later
          day.
        </Notice>
      )}
    </Card>
  );
}

function JobRow({ job, from }: { job: PromisedJob; from: string }) {
  const start = Math.min(span - 1, Math.max(0, daysBetween(from, job.startOn)));
  const end = Math.min(span, Math.max(start + 1, daysBetween(from, job.promisedOn) + 1));
  const share = (days: number) => `${(days / span) * 100}%`;
  return (
    <li className="grid items-center gap-x-4 border-b border-stitch/60 py-2.5 sm:grid-cols-[42%_1fr]">
      <div className="min-w-0">
        <TextLink to={job.to}>
          <span className="font-bold">{job.number}</span> {job.title}
        </TextLink>
        <p className="text-sm text-ink-soft">
          {job.customerName} · {job.state} · promised for {dayText(job.promisedOn)}
        </p>
      </div>
      <div className="relative mt-2 h-2.5 sm:mt-0" aria-hidden="true">
        <div
          className={classNames(
            'absolute inset-y-0 flex gap-1',
            job.late ? 'text-oxblood' : 'text-verdigris',
          )}
          style={{ left: share(start), width: share(end - start) }}
        >
          {stitches(end - start, job).map((done, index) => (
            <span
              key={index}
              className={classNames(
                'h-full flex-1 rounded-sm bg-current',
                !done && !job.late && 'opacity-40',
              )}
            />
          ))}
        </div>
      </div>
    </li>
  );
}

/** One stitch a day, sewn through as far as the job's hours are logged. */
function stitches(days: number, job: PromisedJob): boolean[] {
  return Array.from({ length: days }, (_, index) => (index + 1) / days <= job.doneShare);
}

function lateTitle(late: readonly PromisedJob[]): string {
  const numbers = late.map((job) => job.number).join(', ');
  return late.length === 1 ? `${numbers} would be late.` : `${numbers} would be late.`;
}

const dayMs = 86_400_000;
const utc = (day: string) => Date.parse(`${day}T00:00:00Z`);
const daysBetween = (from: string, to: string) => Math.round((utc(to) - utc(from)) / dayMs);
const dayAfter = (day: string, days: number) =>
  new Date(utc(day) + days * dayMs).toISOString().slice(0, 10);
