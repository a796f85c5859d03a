import { useId } from 'react';
import { Field } from '../../../components/field.tsx';
import { InputFrame, inputLook } from '../../../components/input-frame.tsx';

interface StepChoiceProps {
  steps: readonly string[];
  /** Which is chosen, from 0. */
  step: number;
  source: 'readings' | 'tickets';
  onChoose: (chosen: { step: string; from: string }) => void;
}

/** Which step is timed, and from what. */
export function StepChoice({ steps, step, source, onChoose }: StepChoiceProps) {
  const id = useId();
  return (
    <div className="mb-5 grid gap-4 sm:grid-cols-2">
      <Field id={`${id}-step`} label="Step">
        <InputFrame id={`${id}-step`} invalid={false}>
          <select
            id={`${id}-step`}
            value={step + 1}
            onChange={(event) => onChoose({ step: event.target.value, from: source })}
            className={inputLook}
          >
            {steps.map((name, at) => (
              <option key={at} value={at + 1} className="bg-card text-ink">
                {`${at + 1} ${name}`}
              </option>
            ))}
          </select>
        </InputFrame>
      </Field>
      <Field id={`${id}-from`} label="From">
        <InputFrame id={`${id}-from`} invalid={false}>
          <select
            id={`${id}-from`}
            value={source}
            onChange={(event) => onChoose({ step: String(step + 1), from: event.target.value })}
            className={inputLook}
          >
            <option value="readings" className="bg-card text-ink">
              a stopwatch, or typed readings
            </option>
            <option value="tickets" className="bg-card text-ink">
              what the tickets say
            </option>
          </select>
        </InputFrame>
      </Field>
    </div>
  );
}
