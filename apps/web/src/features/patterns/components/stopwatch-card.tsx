import { Flag, Play, Square, X } from 'lucide-react';
import { useEffect, useState } from 'react';
import { Button } from '../../../components/button.tsx';
import { Card } from '../../../components/card.tsx';
import { lapped, started, stopped, withoutLap, type Stopwatch } from '../time-study.ts';
import { TypedReadings } from './typed-readings.tsx';

interface StopwatchCardProps {
  watch: Stopwatch;
  onChange: (watch: Stopwatch) => void;
  onKeep: () => void;
  keeping: boolean;
}

/** Start, a press for each piece, stop: for one thumb. Readings can be typed as well. */
export function StopwatchCard({ watch, onChange, onKeep, keeping }: StopwatchCardProps) {
  const count = watch.laps.length;
  return (
    <Card
      title="Take readings"
      subtitle="Press Lap as each one is done; Stop drops the unfinished."
    >
      {watch.lapFrom === null ? (
        <Button
          tone="primary"
          size="bench"
          className="min-h-24 w-full"
          onClick={() => onChange(started(watch, Date.now()))}
        >
          <Play size={24} aria-hidden="true" /> Start
        </Button>
      ) : (
        <Running watch={watch} lapFrom={watch.lapFrom} onChange={onChange} />
      )}
      <Laps laps={watch.laps} onRemove={(at) => onChange(withoutLap(watch, at))} />
      {count > 0 && watch.lapFrom === null && (
        <Button tone="primary" className="mt-3 min-h-11" busy={keeping} onClick={onKeep}>
          {count === 1 ? 'Keep this reading' : `Keep these ${count} readings`}
        </Button>
      )}
      <TypedReadings
        onAdd={(readings) => onChange({ ...watch, laps: [...watch.laps, ...readings] })}
      />
    </Card>
  );
}

interface RunningProps extends Pick<StopwatchCardProps, 'watch' | 'onChange'> {
  lapFrom: number;
}

function Running({ watch, lapFrom, onChange }: RunningProps) {
  const [now, setNow] = useState(() => Date.now());
  useEffect(() => {
    const timer = setInterval(() => setNow(Date.now()), 100);
    return () => clearInterval(timer);
  }, []);
  return (
    <div className="grid gap-2.5">
      <p role="timer" className="text-center text-2xl font-bold">
        {`${(Math.max(0, now - lapFrom) / 1000).toFixed(1)} s`}
      </p>
      <Button
        tone="primary"
        size="bench"
        className="min-h-24 w-full"
        onClick={() => onChange(lapped(watch, Date.now()))}
      >
        <Flag size={24} aria-hidden="true" /> Lap
      </Button>
      <Button size="bench" className="w-full" onClick={() => onChange(stopped(watch))}>
        <Square size={20} aria-hidden="true" /> Stop
      </Button>
    </div>
  );
}

function Laps({ laps, onRemove }: { laps: readonly string[]; onRemove: (at: number) => void }) {
  if (laps.length === 0) return null;
  return (
    <>
      <h3 className="mt-4">Not kept yet</h3>
      <ol aria-label="Not kept yet" className="mt-1 flex flex-wrap gap-2">
        {laps.map((seconds, at) => (
          <li key={at} className="flex items-center rounded border border-stitch pl-2.5">
            {`${seconds} s`}
            <button
              type="button"
              onClick={() => onRemove(at)}
              aria-label={`Remove reading ${at + 1}, ${seconds} s`}
              className="ml-1 grid size-9 place-items-center rounded text-ink-soft hover:bg-manila"
            >
              <X size={16} aria-hidden="true" />
            </button>
          </li>
        ))}
      </ol>
    </>
  );
}
