import { countedWords } from '@hidewright/domain';
import type { Job, JobHardware, JobLot } from '@hidewright/contract';
import { useQueryClient } from '@tanstack/react-query';
import type { ReactNode } from 'react';
import { Button } from '../../../components/button.tsx';
import { Card } from '../../../components/card.tsx';
import { EmptyState } from '../../../components/empty-state.tsx';
import { Notice } from '../../../components/notice.tsx';
import { TextLink } from '../../../components/text-link.tsx';
import { say } from '../../../components/toast.ts';
import { ApiProblem } from '../../../lib/api-problem.ts';
import { countText, rackAreaText, sizeText } from '../../../lib/formatting.ts';
import { useWorkshop } from '../../../lib/workshop.tsx';
import { useLetGo, useTakeForJob } from '../jobs.mutations.ts';
import { jobQuery } from '../jobs.queries.ts';
import { heldWords } from '../held-words.ts';
import { standsInText } from '../stand-in-words.ts';
import { BringHardwareBack, BringLeatherBack } from './bring-back.tsx';
import { MisfitNotice } from './misfit-notice.tsx';
import { MixNotice } from './mix-notice.tsx';
import { OffcutBack } from './offcut-back.tsx';
import { TakeOther } from './take-other.tsx';

interface StockCardProps {
  job: Job;
  canTake: boolean;
}

/** Leather and hardware of a job: what is held for it, what it has taken, and one press to take what is held. */
export function StockCard({ job, canTake }: StockCardProps) {
  const workshop = useWorkshop();
  const cancelled = job.orderState === 'cancelled';
  const lots = cancelled ? job.lots.filter(({ takenAreaMm2 }) => takenAreaMm2 !== '0') : job.lots;
  const givesBack = atWork.has(job.state) || (cancelled && job.state !== 'finished');
  const client = useQueryClient();
  const { mutate, isPending, error: notTaken, variables } = useTakeForJob();
  const take = (body: Parameters<typeof mutate>[0]['body'], sentence: string) =>
    mutate(
      { params: { id: job.id }, body },
      {
        onSuccess: () => say(sentence),
        // It may be refused because somebody else took it: show what is held now.
        onError: () => client.invalidateQueries(jobQuery(job.id)),
      },
    );
  const letting = useLetGo();
  const go = (body: Parameters<typeof letting.mutate>[0]['body'], what: string) =>
    letting.mutate(
      { params: { id: job.id }, body },
      { onSuccess: () => say(`${what} is free again.`) },
    );
  const error = notTaken ?? letting.error;
  const busyWith = (field: 'lotId' | 'hardwareId', id: number) =>
    isPending && variables.body[field as never] === id;
  return (
    <Card
      title="Leather and hardware"
      subtitle={`${rackAreaText(job.neededAreaMm2, workshop)} of ${job.leatherName} needed`}
      aside={
        <TextLink to={`/stockroom/ledger?job=${job.id}`} className="print:hidden">
          What moved for it
        </TextLink>
      }
    >
      {error !== null && (
        <Notice tone="danger" live className="mb-4">
          {error instanceof ApiProblem ? error.detail : 'That did not work. Try again.'}
        </Notice>
      )}
      <ul aria-label="Lots" className="divide-y divide-stitch/60">
        {lots.map((lot) => (
          <Line
            key={lot.lotId}
            title={<LotTitle lot={lot} />}
            detail={lotLine(lot, (mm2) => rackAreaText(mm2, workshop))}
          >
            {canTake && lot.heldAreaMm2 !== '0' && <MixNotice lot={lot} />}
            {!cancelled && job.state !== 'finished' && isOfJob(lot) && <MisfitNotice lot={lot} />}
            {givesBack && lot.takenAreaMm2 !== '0' && (
              <>
                <BringLeatherBack job={job} lot={lot} />
                <OffcutBack job={job} lot={lot} />
              </>
            )}
            {job.state !== 'finished' && lot.heldAreaMm2 !== '0' && (
              <LetGo
                busy={letting.isPending && letting.variables.body[lotKey] === lot.lotId}
                what={`lot ${lot.tag}`}
                onClick={() => go({ lotId: lot.lotId }, `lot ${lot.tag}`)}
              />
            )}
            {canTake && lot.heldAreaMm2 !== '0' && (
              <Button
                size="bench"
                className="text-base"
                busy={busyWith('lotId', lot.lotId)}
                onClick={() =>
                  take(
                    {
                      lotId: lot.lotId,
                      areaMm2: lot.heldAreaMm2,
                      heldSeenAreaMm2: lot.heldAreaMm2,
                    },
                    `Taken from lot ${lot.tag}.`,
                  )
                }
              >
                Take {rackAreaText(lot.heldAreaMm2, workshop)}
              </Button>
            )}
          </Line>
        ))}
      </ul>
      {cancelled && lots.length === 0 && <p>No leather is left to bring back.</p>}
      {!cancelled && job.lots.length === 0 && (
        <EmptyState title={`No ${job.leatherName} on the rack.`}>
          Receive a lot in the Stockroom, then take from it here.
        </EmptyState>
      )}
      {job.hardware.length > 0 && (
        <ul
          aria-label="Hardware"
          className="mt-2 divide-y divide-stitch/60 border-t border-stitch/60"
        >
          {job.hardware.map((item) => (
            <Line
              key={item.hardwareId}
              title={<strong>{item.name}</strong>}
              detail={hardwareLine(item)}
            >
              {givesBack && item.taken > 0 && <BringHardwareBack job={job} item={item} />}
              {job.state !== 'finished' && item.held > 0 && (
                <LetGo
                  busy={
                    letting.isPending && letting.variables.body[hardwareKey] === item.hardwareId
                  }
                  what={item.name}
                  onClick={() => go({ hardwareId: item.hardwareId }, item.name)}
                />
              )}
              {canTake && item.held > 0 && (
                <Button
                  size="bench"
                  className="text-base"
                  busy={busyWith('hardwareId', item.hardwareId)}
                  onClick={() =>
                    take(
                      {
                        hardwareId: item.hardwareId,
                        quantity: item.held,
                        heldSeenQuantity: item.held,
                      },
                      `Taken: ${item.held} ${item.name}.`,
                    )
                  }
                >
                  Take {countText(item.held)}
                </Button>
              )}
            </Line>
          ))}
        </ul>
      )}
      {job.state !== 'finished' && !cancelled && <TakeOther job={job} canTake={canTake} />}
    </Card>
  );
}

/** When what was taken is on the bench, and may come off it. */
const atWork: ReadonlySet<Job['state']> = new Set(['at the bench', 'paused']);

/** Whether the job holds some of it, or has taken some. */
const isOfJob = ({ heldAreaMm2, takenAreaMm2 }: JobLot): boolean =>
  heldAreaMm2 !== '0' || takenAreaMm2 !== '0';

const lotKey = 'lotId' as never;
const hardwareKey = 'hardwareId' as never;

function LetGo({ what, busy, onClick }: { what: string; busy: boolean; onClick: () => void }) {
  return (
    <Button tone="quiet" className="min-h-11 print:hidden" busy={busy} onClick={onClick}>
      Let go<span className="sr-only"> of {what}</span>
    </Button>
  );
}

function Line({
  title,
  detail,
  children,
}: {
  title: ReactNode;
  detail: string;
  children?: ReactNode;
}) {
  return (
    <li className="flex flex-wrap items-center justify-between gap-x-4 gap-y-2 py-2.5">
      <div>
        <div>{title}</div>
        <div className="text-sm text-ink-soft">{detail}</div>
      </div>
      <div className="flex flex-wrap gap-2">{children}</div>
    </li>
  );
}

function LotTitle({ lot }: { lot: JobLot }) {
  const { lengthUnit } = useWorkshop();
  const { form, widthMm, heightMm, shade, place } = lot;
  const size = widthMm && heightMm ? ` ${sizeText(widthMm, heightMm, lengthUnit)}` : '';
  const rest = [form + size, shade, place].filter((word) => word !== '').join(', ');
  return (
    <>
      <strong>{lot.tag}</strong> <span className="text-ink-soft">{rest}</span>
    </>
  );
}

function lotLine(lot: JobLot, area: (areaMm2: string) => string): string {
  const { heldAreaMm2, onHandAreaMm2, missingAreaMm2, takenAreaMm2, freeAreaMm2 } = lot;
  const parts = [];
  if (heldAreaMm2 !== '0') {
    const [held, onHand] = [Number(heldAreaMm2), Number(onHandAreaMm2)];
    const counted = { held, onHand, missing: Number(missingAreaMm2) };
    parts.push(heldWords(counted, (mm2) => area(String(mm2))));
  }
  if (takenAreaMm2 !== '0') parts.push(`${area(takenAreaMm2)} taken`);
  parts.push(freeAreaMm2 === '0' ? 'nothing free' : `${area(freeAreaMm2)} free`);
  return parts.join(' · ');
}

function hardwareLine(item: JobHardware): string {
  const { needed, held, taken, free, unit } = item;
  const counted = (count: number) => countedWords(count, unit);
  const parts = [standsInText(item) || `${counted(needed)} needed`];
  if (held > 0) parts.push(heldWords(item, counted));
  if (taken > 0) parts.push(`${counted(taken)} taken`);
  return [...parts, `${counted(free)} free`].join(' · ');
}
