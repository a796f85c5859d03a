import { useWatch } from 'react-hook-form';
import { SelectField } from '../../../components/select-field.tsx';

interface Work {
  kind?: string;
  steps?: { name?: string }[];
}

/** From which step on a line of hardware is needed. */
export function NeededForField({ name }: { name: string }) {
  const choices = useStepsToWaitFor();
  return (
    <SelectField
      key={choices.length}
      name={name}
      label="Needed for"
      placeholder="only the pieces ordered"
      choices={choices}
      help="Pieces that fail later have used it up."
    />
  );
}

/** The pieces that hardware can be counted for, by the step that they reach. */
export function useStepsToWaitFor() {
  const work = (useWatch({ name: 'definition.work' }) ?? {}) as Work;
  if (work.kind !== 'steps') return [{ value: 0, label: 'every piece that is cut' }];
  return (work.steps ?? []).map(({ name = '' }, step) => ({
    value: step,
    label: `every piece that reaches step ${step + 1} ${name}`.trim(),
  }));
}
