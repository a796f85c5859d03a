import { Pause, Play } from 'lucide-react';
import { useEffect, useId, useState } from 'react';
import { Button } from '../../../components/button.tsx';
import { clockMinutes, isMinutes, minutesToSend, type StepDraft } from '../step-draft.ts';

interface StepMinutesProps {
  draft: StepDraft;
  change: (changes: Partial<StepDraft>) => void;
}

/** Minutes: by the clock, by fives, or typed. */
export function StepMinutes({ draft, change }: StepMinutesProps) {
  const id = useId();
  const wrong = !isMinutes(draft.minutes);
  const add = (more: number) => change({ minutes: plus(draft.minutes, more) });
  return (
    <div>
      <label htmlFor={id} className="mb-1 block font-semibold">
        Minutes
      </label>
      <div className="flex flex-wrap items-stretch gap-2.5">
        <input
          id={id}
          type="text"
          inputMode="decimal"
          autoComplete="off"
          value={draft.minutes}
          onChange={(event) => change({ minutes: event.target.value })}
          aria-invalid={wrong}
          aria-describedby={wrong ? `${id}-error` : undefined}
          className="min-h-14 w-24 rounded border border-edge bg-card px-3 text-lg"
        />
        <Button size="bench" onClick={() => add(5)} disabled={wrong}>
          + 5
        </Button>
        <Clock draft={draft} change={change} />
      </div>
      {wrong && (
        <p id={`${id}-error`} className="mt-1 text-sm font-semibold text-oxblood">
          Enter minutes, such as 12 or 7.5.
        </p>
      )}
    </div>
  );
}

function Clock({ draft, change }: StepMinutesProps) {
  const { clockFrom } = draft;
  const [now, setNow] = useState(() => Date.now());
  useEffect(() => {
    if (clockFrom === null) return undefined;
    const timer = setInterval(() => setNow(Date.now()), 1000);
    return () => clearInterval(timer);
  }, [clockFrom]);

  if (clockFrom === null) {
    return (
      <Button size="bench" className="grow" onClick={() => change({ clockFrom: Date.now() })}>
        <Play size={20} aria-hidden="true" /> Start the clock
      </Button>
    );
  }
  const stop = () =>
    change({ clockFrom: null, minutes: plus(draft.minutes, clockMinutes(clockFrom, Date.now())) });
  return (
    <Button size="bench" className="grow" onClick={stop}>
      <Pause size={20} aria-hidden="true" /> Stop, {clockMinutes(clockFrom, now)} min
    </Button>
  );
}

function plus(minutes: string, more: number): string {
  return String(Math.round((Number(minutesToSend(minutes)) + more) * 100) / 100);
}
