import { useState } from 'react';
import { withPoint } from '../../lib/comma.ts';
import { dropDraft, readDraft, writeDraft } from '../../lib/draft.ts';

/** What is tapped on a step and not logged yet. */
export interface StepDraft {
  good: number;
  rejects: number;
  seconds: number;
  minutes: string;
  /** When the clock was started, if it runs. */
  clockFrom: number | null;
}

export const emptyDraft: StepDraft = {
  good: 0,
  rejects: 0,
  seconds: 0,
  minutes: '',
  clockFrom: null,
};

/** Taps on a step: they survive a reload, and going to another step and back. */
export function useStepDraft(stepId: number) {
  const key = `step-${stepId}`;
  const [draft, setDraft] = useState<StepDraft>(() => ({ ...emptyDraft, ...readDraft(key) }));
  return {
    draft,
    change(changes: Partial<StepDraft>) {
      const next = { ...draft, ...changes };
      setDraft(next);
      writeDraft(key, next);
    },
    clear() {
      setDraft(emptyDraft);
      dropDraft(key);
    },
  };
}

/** Minutes since the clock was started, to a tenth. */
export function clockMinutes(clockFrom: number, now: number): number {
  return Math.max(0, Math.round((now - clockFrom) / 6_000) / 10);
}

const minutesPattern = /^-?\d{1,5}(\.\d{1,2})?$/;

export function isMinutes(text: string): boolean {
  return text.trim() === '' || minutesPattern.test(withPoint(text));
}

/** As the contract wants them: no blank, no comma, no superfluous zero. */
export function minutesToSend(text: string): string {
  const plain = withPoint(text);
  return plain === '' ? '0' : String(Number(plain));
}

/** What pressing the button will log, in words: "13 good, 1 reject, 12 min". */
export function draftInWords({ good, rejects, seconds, minutes }: StepDraft): string {
  const sent = minutesToSend(minutes);
  const parts = [
    good !== 0 && `${good} good`,
    rejects !== 0 && `${rejects} ${Math.abs(rejects) === 1 ? 'reject' : 'rejects'}`,
    seconds !== 0 && `${seconds} ${Math.abs(seconds) === 1 ? 'second' : 'seconds'}`,
    sent !== '0' && `${sent} min`,
  ];
  return parts.filter(Boolean).join(', ').replaceAll('-', '−');
}
