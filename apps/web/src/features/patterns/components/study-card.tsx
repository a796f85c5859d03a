import type { Pattern } from '@hidewright/contract';
import { standardTime } from '@hidewright/domain';
import { useId, useState } from 'react';
import { Button } from '../../../components/button.tsx';
import { Card } from '../../../components/card.tsx';
import { Field } from '../../../components/field.tsx';
import { InputFrame, inputLook } from '../../../components/input-frame.tsx';
import { KeyFigures } from '../../../components/key-figures.tsx';
import { Notice } from '../../../components/notice.tsx';
import { say } from '../../../components/toast.ts';
import { ApiProblem } from '../../../lib/api-problem.ts';
import { withPoint } from '../../../lib/comma.ts';
import { numberText } from '../../../lib/formatting.ts';
import { useChangePattern } from '../patterns.mutations.ts';
import { enoughWords, type Study } from '../time-study.ts';
import { inWords, withSeconds } from '../timed-pattern.ts';

interface StudyCardProps {
  pattern: Pattern;
  /** Which step, from 0. */
  step: number;
  stepName: string;
  study: Study | null;
  isOwner: boolean;
}

/** Mean, spread, whether that is enough; with rest added it can become the step's seconds. */
export function StudyCard({ pattern, step, stepName, study, isOwner }: StudyCardProps) {
  const [rest, setRest] = useState('0');
  if (study === null) {
    return (
      <Card title="What they say">
        <p className="text-ink-soft">No readings yet. Start the clock, or type what you have.</p>
      </Card>
    );
  }
  const allowance = readAllowance(rest);
  const seconds =
    allowance === undefined ? undefined : standardTime({ observed: study.mean, allowance });
  return (
    <Card title="What they say">
      <KeyFigures
        large
        figures={[
          { word: 'mean', figure: secondsText(study.mean), note: enoughWords(study) },
          {
            word: 'spread',
            figure: study.sd === null ? '–' : secondsText(study.sd),
            note: 'standard deviation',
          },
          { word: 'readings', figure: study.count },
        ]}
      />
      <div className="mt-4">
        <RestField rest={rest} onChange={setRest} wrong={allowance === undefined} />
      </div>
      {seconds !== undefined && (
        <p className="mt-3">
          With rest <strong className="font-semibold">{secondsText(seconds)}</strong>
          {`, where the pattern now says ${inWords(pattern, step)}.`}
        </p>
      )}
      {isOwner && seconds !== undefined && (
        <TakeSeconds pattern={pattern} step={step} stepName={stepName} seconds={seconds} />
      )}
    </Card>
  );
}

const secondsText = (seconds: number): string => `${numberText(seconds.toFixed(4), 2)} s`;

function readAllowance(text: string): number | undefined {
  const plain = withPoint(text);
  return /^\d{1,2}(\.\d{1,2})?$/.test(plain) ? Number(plain) / 100 : undefined;
}

interface RestFieldProps {
  rest: string;
  onChange: (rest: string) => void;
  wrong: boolean;
}

function RestField({ rest, onChange, wrong }: RestFieldProps) {
  const id = useId();
  const error = wrong ? 'Enter a share for rest from 0 to 99 %.' : undefined;
  return (
    <Field
      id={id}
      label="Allowance for rest"
      help="on top of the mean; 0 where the estimate allows for rest elsewhere"
      error={error}
    >
      <InputFrame id={id} unit="%" short invalid={wrong}>
        <input
          id={id}
          inputMode="decimal"
          autoComplete="off"
          value={rest}
          onChange={(event) => onChange(event.target.value)}
          aria-invalid={wrong}
          aria-describedby={`${id}-unit ${id}-help${wrong ? ` ${id}-error` : ''}`}
          className={inputLook}
        />
      </InputFrame>
    </Field>
  );
}

interface TakeSecondsProps extends Pick<StudyCardProps, 'pattern' | 'step' | 'stepName'> {
  seconds: number;
}

function TakeSeconds({ pattern, step, stepName, seconds }: TakeSecondsProps) {
  const send = useChangePattern();
  const [problem, setProblem] = useState<string>();

  async function take() {
    setProblem(undefined);
    try {
      const now = await send.mutateAsync({
        params: { id: pattern.id },
        body: { definition: withSeconds(pattern.definition, step, seconds) },
        ifMatch: pattern.version,
      });
      say(`${stepName}: ${inWords(now, step)} in version ${now.versionNumber}.`);
    } catch (error) {
      setProblem(error instanceof ApiProblem ? error.detail : 'This could not be sent. Try again.');
    }
  }

  return (
    <>
      {problem && (
        <Notice tone="danger" live className="mt-3">
          {problem}
        </Notice>
      )}
      <Button tone="primary" className="mt-3" busy={send.isPending} onClick={() => void take()}>
        Use it as this step’s seconds
      </Button>
    </>
  );
}
