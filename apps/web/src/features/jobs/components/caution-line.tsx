import type { JobStep } from '@hidewright/contract';
import { classNames } from '../../../lib/class-names.ts';

const tones = {
  WARNING: { box: 'border-oxblood bg-oxblood-pale', word: 'text-oxblood' },
  CAUTION: { box: 'border-brass bg-brass-pale', word: 'text-brass' },
  NOTICE: { box: 'border-slate bg-slate-pale', word: 'text-slate' },
};

/** A short caution beside the work that needs it. */
export function CautionLine({
  caution,
  className,
}: {
  caution: NonNullable<JobStep['caution']>;
  className?: string;
}) {
  const { box, word } = tones[caution.level];
  return (
    <p className={classNames('rounded border-l-4 px-3.5 py-2.5', box, className)}>
      <strong className={word}>{caution.level}</strong> {caution.text}
    </p>
  );
}
