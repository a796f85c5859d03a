import type { JobStep } from '@hidewright/contract';
import { useId } from 'react';
import { classNames } from '../../../lib/class-names.ts';
import { StitchProgress } from '../../../components/stitch-progress.tsx';
import { minutesText } from '../../../lib/formatting.ts';
import type { LogBody } from '../log-outbox.ts';
import type { Refused } from '../use-log-outbox.ts';
import { CautionLine } from './caution-line.tsx';
import { StepCounter } from './step-counter.tsx';

interface StepCardProps {
  step: JobStep;
  perRow: number | null;
  perContainer: number;
  open: boolean;
  canLog: boolean;
  onToggle: () => void;
  refused: Refused | undefined;
  onLog: (body: LogBody) => void;
}

/** One step: its seam, and when it is open, its counter. */
export function StepCard(props: StepCardProps) {
  const { step, open, canLog, onToggle } = props;
  const id = useId();
  const handled = step.good + step.rejects + step.seconds;
  return (
    <section
      aria-labelledby={`${id}-name`}
      className={classNames(
        'card rounded bg-card shadow-card',
        open && 'border-l-6 border-verdigris',
      )}
    >
      <h2 className="text-base">
        <button
          type="button"
          id={`${id}-name`}
          aria-expanded={open}
          aria-controls={`${id}-counter`}
          disabled={!canLog}
          onClick={onToggle}
          className="flex min-h-11 w-full flex-wrap items-baseline gap-x-2 px-4 pt-3 text-left disabled:text-ink"
        >
          <span className={classNames('text-base', open ? 'font-bold' : 'font-semibold')}>
            {step.name}
          </span>
          <span className="text-sm font-normal text-ink-soft">{stepLine(step)}</span>
        </button>
      </h2>
      <StitchProgress label={step.name} done={handled} of={step.limit} className="px-4 pt-2 pb-4" />
      <div id={`${id}-counter`} hidden={!open} className="px-4 pb-4">
        {open && <StepCounter key={step.id} {...props} />}
        {open && step.caution && <CautionLine caution={step.caution} className="mt-4" />}
      </div>
    </section>
  );
}

function stepLine(step: JobStep): string {
  const handled = step.good + step.rejects + step.seconds;
  const parts = [
    `${handled} of ${step.limit}${step.per === 'panel' || step.per === 'strip' ? ` ${step.per}s` : ''}`,
  ];
  if (step.rejects > 0) parts.push(`${step.rejects} ${step.rejects === 1 ? 'reject' : 'rejects'}`);
  if (step.seconds > 0) parts.push(`${step.seconds} ${step.seconds === 1 ? 'second' : 'seconds'}`);
  parts.push(
    step.minutes === '0'
      ? `about ${minutesText(step.plannedMinutes)}`
      : `${minutesText(step.minutes)} of about ${minutesText(step.plannedMinutes)}`,
  );
  return parts.join(' · ');
}
