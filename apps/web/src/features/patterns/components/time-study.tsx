import type { Pattern, TimeReadings } from '@hidewright/contract';
import { useState } from 'react';
import { Notice } from '../../../components/notice.tsx';
import { say } from '../../../components/toast.ts';
import { ApiProblem } from '../../../lib/api-problem.ts';
import { useAddTimeReadings } from '../patterns.mutations.ts';
import { studyOf } from '../time-study.ts';
import { useStopwatch } from '../use-stopwatch.ts';
import { KeptReadings, TicketReadings } from './kept-readings.tsx';
import { StopwatchCard } from './stopwatch-card.tsx';
import { StudyCard } from './study-card.tsx';

interface TimeStudyProps {
  pattern: Pattern;
  /** Which step, from 0. */
  step: number;
  stepName: string;
  found: TimeReadings;
  /** Readings one by one, or the averages of the tickets. */
  source: 'readings' | 'tickets';
  isOwner: boolean;
}

/** One step timed: readings are taken, kept and weighed up. */
export function TimeStudy(props: TimeStudyProps) {
  const { pattern, step, stepName, found, source, isOwner } = props;
  const { watch, set, clear } = useStopwatch(pattern.id, stepName);
  const send = useAddTimeReadings();
  const [left, setLeft] = useState<readonly number[]>([]);
  const [problem, setProblem] = useState<string>();
  const readings = found.readings.filter((each) => each.stepName === stepName);
  const logged = found.logged.filter((each) => each.stepName === stepName);
  const counted = readings.filter(({ id }) => !left.includes(id)).map(({ seconds }) => seconds);
  const sample =
    source === 'tickets' ? logged.map(({ seconds }) => seconds) : [...counted, ...watch.laps];

  async function keep() {
    setProblem(undefined);
    try {
      const body = { stepName, seconds: watch.laps };
      await send.mutateAsync({ params: { id: pattern.id }, body });
      clear();
      say(`${watch.laps.length === 1 ? 'The reading is' : 'The readings are'} kept.`);
    } catch (error) {
      setProblem(error instanceof ApiProblem ? error.detail : 'This could not be sent. Try again.');
    }
  }

  return (
    <div className="grid items-start gap-5 lg:grid-cols-2">
      <div className="grid gap-5">
        {problem && (
          <Notice tone="danger" live>
            {problem}
          </Notice>
        )}
        {source === 'readings' ? (
          <StopwatchCard
            watch={watch}
            onChange={set}
            onKeep={() => void keep()}
            keeping={send.isPending}
          />
        ) : (
          <TicketReadings logged={logged} />
        )}
      </div>
      <div className="grid gap-5">
        <StudyCard
          pattern={pattern}
          step={step}
          stepName={stepName}
          study={studyOf(sample)}
          isOwner={isOwner}
        />
        {source === 'readings' && (
          <KeptReadings
            readings={readings}
            left={left}
            onSet={(id, counts) =>
              setLeft(counts ? left.filter((each) => each !== id) : [...left, id])
            }
          />
        )}
      </div>
    </div>
  );
}
