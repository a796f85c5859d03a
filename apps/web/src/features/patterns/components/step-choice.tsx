import { useId } from 'react';
import { Field } from '../../../components/field.tsx';
import { SelectInput } from '../../../components/select-input.tsx';

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
        <SelectInput
          id={`${id}-step`}
          value={step + 1}
          onChange={(event) => onChoose({ step: event.target.value, from: source })}
        >
          {steps.map((name, at) => (
            <option key={at} value={at + 1} className="bg-card text-ink">
              {`${at + 1} ${name}`}
            </option>
          ))}
        </SelectInput>
      </Field>
      <Field id={`${id}-from`} label="From">
        <SelectInput
          id={`${id}-from`}
          value={source}
          onChange={(event) => onChoose({ step: String(step + 1), from: event.target.value })}
        >
          <option value="readings" className="bg-card text-ink">
            a stopwatch, or typed readings
          </option>
          <option value="tickets" className="bg-card text-ink">
            what the tickets say
          </option>
        </SelectInput>
      </Field>
    </div>
  );
}
