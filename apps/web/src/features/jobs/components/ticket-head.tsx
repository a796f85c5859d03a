import type { Job } from '@hidewright/contract';
import type { ReactNode } from 'react';
import { PageTitle } from '../../../components/page-title.tsx';
import { StateMark } from '../../../components/state-mark.tsx';
import { Stitch } from '../../../components/stitch.tsx';
import { Ticket } from '../../../components/ticket.tsx';
import { countText, dayText } from '../../../lib/formatting.ts';
import { useWorkshop } from '../../../lib/workshop.tsx';
import { containersText } from '../containers-text.ts';

/** The ticket's head: what it is, for whom, by when; then which plate, die and lot, and how many of everything. */
export function TicketHead({ job, actions }: { job: Job; actions?: ReactNode }) {
  const { today } = useWorkshop();
  const inHands = job.inHandsOn === null ? '' : ` · in hands ${dayText(job.inHandsOn, today)}`;
  return (
    <>
      <PageTitle>{`${job.number} ${job.title}`}</PageTitle>
      <Ticket
        number={job.number}
        title={job.title}
        level={1}
        detail={`${countText(job.quantity)} for ${job.customerName} · pack by ${dayText(job.promisedOn, today)}${inHands}`}
        actions={
          <>
            <StateMark
              state={job.orderState === 'cancelled' ? 'cancelled' : job.state}
              className="self-center"
            />
            {actions}
          </>
        }
      >
        <Stitch className="my-3" />
        <p className="text-lg">{joined(toolsAndLot(job))}</p>
        <p className="text-lg">{joined(howMany(job))}</p>
      </Ticket>
    </>
  );
}

function toolsAndLot(job: Job): ReactNode[] {
  const { plate, die, lots } = job;
  const own = lots.filter(
    ({ heldAreaMm2, takenAreaMm2 }) => heldAreaMm2 !== '0' || takenAreaMm2 !== '0',
  );
  const parts: ReactNode[] = [];
  if (job.needsPlate) parts.push(named('plate', plate?.number ?? 'not here yet'));
  if (plate?.lifeLeft === 0) parts.push(noLife('plate'));
  if (plate && plate.slot !== '') parts.push(named('slot', plate.slot));
  if (job.needsDie) parts.push(named('die', die?.number ?? 'not here yet'));
  if (die?.lifeLeft === 0) parts.push(noLife('die'));
  if (die && die.slot !== '' && die.slot !== plate?.slot) parts.push(named('slot', die.slot));
  parts.push(
    named(own.length > 1 ? 'lots' : 'lot', own.map(({ tag }) => tag).join(', ') || 'none held'),
  );
  return parts;
}

function howMany(job: Job): ReactNode[] {
  const containers = containersText(job.containers, job.layout.container.form);
  const parts = [
    named(job.needsPlate ? 'case' : 'from', countText(job.containers), containers.unit),
  ];
  if (job.needsPlate) parts.push(named('strike', countText(job.cutCount)));
  return [...parts, named('cut', countText(job.cutCount)), named('need', countText(job.quantity))];
}

function named(word: string, figure: string, unit = ''): ReactNode {
  return (
    <span key={`${word} ${figure}`} className="whitespace-nowrap">
      {word} <strong>{figure}</strong>
      {unit && ` ${unit}`}
    </span>
  );
}

function noLife(word: string): ReactNode {
  return (
    <strong key={`life of the ${word}`} className="whitespace-nowrap text-oxblood">
      {`${word} has no life left`}
    </strong>
  );
}

function joined(parts: readonly ReactNode[]): ReactNode {
  return parts.flatMap((part, index) => (index === 0 ? [part] : [' · ', part]));
}
