import { useState } from 'react';
import { dropDraft, readDraft, writeDraft } from '../../lib/draft.ts';
import { stoppedWatch, type Stopwatch } from './time-study.ts';

/** A stopwatch for one step of a pattern: it runs on, and keeps its laps, across a reload. */
export function useStopwatch(patternId: number, stepName: string) {
  const key = `time-${patternId}-${stepName}`;
  const [watch, setWatch] = useState<Stopwatch>(() => ({ ...stoppedWatch, ...readDraft(key) }));
  return {
    watch,
    set(next: Stopwatch) {
      setWatch(next);
      writeDraft(key, next);
    },
    clear() {
      setWatch(stoppedWatch);
      dropDraft(key);
    },
  };
}
