import type { Job, JobStep } from '@hidewright/contract';
import { useState } from 'react';
import type { WaitingLog } from '../log-outbox.ts';
import type { Refused } from '../use-log-outbox.ts';
import type { LogBody } from '../log-outbox.ts';
import { StepCard } from './step-card.tsx';

interface StepListProps {
  job: Job;
  waiting: readonly WaitingLog[];
  refused: Refused | undefined;
  /** Only while the job is at the bench, or ready for it. */
  canLog: boolean;
  onLog: (body: LogBody) => void;
}

/** The steps in the order of the work; the one to go on with is open. */
export function StepList({ job, waiting, refused, canLog, onLog }: StepListProps) {
  const next = job.steps.find(({ done }) => !done)?.id ?? null;
  const [chosen, setChosen] = useState<number | null>();
  const open = chosen === undefined ? next : chosen;
  return (
    <ol aria-label="Steps" className="space-y-2">
      {job.steps.map((step) => (
        <li key={step.id}>
          <StepCard
            step={withWaiting(step, waiting)}
            perRow={job.layout.piecesPerRow}
            perContainer={job.layout.pieces}
            open={canLog && step.id === open}
            canLog={canLog}
            onToggle={() => setChosen(step.id === open ? null : step.id)}
            refused={refused?.log.body.stepId === step.id ? refused : undefined}
            onLog={onLog}
          />
        </li>
      ))}
    </ol>
  );
}

/** What is logged on this device counts at once, whether or not it has arrived. */
function withWaiting(step: JobStep, waiting: readonly WaitingLog[]): JobStep {
  const own = waiting.filter(({ body }) => body.stepId === step.id).map(({ body }) => body);
  const sum = (field: 'good' | 'rejects' | 'seconds') =>
    own.reduce((total, body) => total + (body[field] ?? 0), step[field]);
  return { ...step, good: sum('good'), rejects: sum('rejects'), seconds: sum('seconds') };
}
