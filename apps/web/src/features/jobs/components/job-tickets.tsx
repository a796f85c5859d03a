import type { JobCard } from '@hidewright/contract';
import { LinkButton } from '../../../components/link-button.tsx';
import { StateMark } from '../../../components/state-mark.tsx';
import { StitchProgress } from '../../../components/stitch-progress.tsx';
import { TextLink } from '../../../components/text-link.tsx';
import { Ticket, TicketFact } from '../../../components/ticket.tsx';
import { countText, dayText, minutesText } from '../../../lib/formatting.ts';
import { useWorkshop } from '../../../lib/workshop.tsx';

interface JobTicketsProps {
  /** "At the bench" */
  title: string;
  jobs: readonly JobCard[];
}

/** The tickets of one state, earliest promise first. */
export function JobTickets({ title, jobs }: JobTicketsProps) {
  if (jobs.length === 0) return null;
  const sorted = [...jobs].sort((a, b) => a.promisedOn.localeCompare(b.promisedOn) || a.id - b.id);
  return (
    <section aria-label={title} className="mb-6">
      <h2 className="mb-2">
        {title} <span className="font-normal text-ink-soft">{jobs.length}</span>
      </h2>
      <ul className="space-y-2.5">
        {sorted.map((job) => (
          <li key={job.id}>
            <JobTicket job={job} />
          </li>
        ))}
      </ul>
    </section>
  );
}

function JobTicket({ job }: { job: JobCard }) {
  const { today } = useWorkshop();
  const isOver = job.state === 'finished' || job.cancelled;
  return (
    <Ticket
      number={job.number}
      title={<TextLink to={`/bench/jobs/${job.id}`}>{job.title}</TextLink>}
      level={3}
      detail={`${countText(job.quantity)} for ${job.customerName}`}
      facts={
        <>
          <TicketFact word="Pack by">{dayText(job.promisedOn, today)}</TicketFact>
          {!isOver && job.promisedOn < today && (
            <TicketFact word="Promise">
              <StateMark state="late" />
            </TicketFact>
          )}
          {job.awaits.length > 0 && <TicketFact word="Awaits">{job.awaits.join(', ')}</TicketFact>}
          {job.cancelled && (
            <TicketFact word="State">
              <StateMark state="cancelled" />
            </TicketFact>
          )}
          {job.state === 'finished' ? (
            <TicketFact word="Good">{countText(job.good)}</TicketFact>
          ) : (
            <TicketFact word="Minutes">{`${minutesText(job.loggedMinutes)} of ${minutesText(job.plannedMinutes)}`}</TicketFact>
          )}
        </>
      }
      actions={<Act job={job} />}
    >
      {!isOver && <Seam job={job} />}
    </Ticket>
  );
}

const verbs: Partial<Record<JobCard['state'], string>> = {
  ready: 'Begin',
  'at the bench': 'Go on',
  paused: 'Look',
};

function Act({ job }: { job: JobCard }) {
  const verb = verbs[job.state];
  if (verb === undefined || job.cancelled) return null;
  return (
    <LinkButton
      to={`/bench/jobs/${job.id}`}
      tone={job.state === 'paused' ? 'secondary' : 'primary'}
      className="min-h-11"
    >
      {verb}
      <span className="sr-only"> with {job.number}</span>
    </LinkButton>
  );
}

/** One stitch for each step. */
function Seam({ job }: { job: JobCard }) {
  const done = job.progress.reduce((sum, share) => sum + share, 0);
  return (
    <div className="mt-3">
      <StitchProgress
        label={`Steps of ${job.number}`}
        done={Math.round(done * 100) / 100}
        of={job.progress.length}
        stitches={Math.max(1, job.progress.length)}
      />
      <p className="mt-1 text-sm text-ink-soft">
        {job.step === null ? 'All steps are logged.' : `Next: ${job.step}`}
      </p>
    </div>
  );
}
