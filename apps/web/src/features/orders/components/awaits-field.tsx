import type { Awaited } from '@hidewright/contract';
import { useController } from 'react-hook-form';
import { FieldHelp } from '../../../components/field.tsx';
import { useField } from '../../../components/use-field.ts';

const choices: { what: Awaited; label: string }[] = [
  { what: 'proof', label: 'The customer’s approval of the proof' },
  { what: 'deposit', label: 'A deposit' },
  { what: 'tooling', label: 'Tooling: a plate or die that is on order' },
];

/** What must still come before the bench may begin; several at once, or nothing. */
export function AwaitsField() {
  const { id, control, error } = useField('awaits');
  const { field } = useController({ name: 'awaits', control });
  const chosen = field.value as readonly Awaited[];

  function toggle(what: Awaited, on: boolean) {
    field.onChange(on ? [...chosen, what] : chosen.filter((each) => each !== what));
  }

  return (
    <fieldset id={id}>
      <legend className="mb-1 font-semibold">
        Awaited first <span className="font-normal text-ink-soft">(optional)</span>
      </legend>
      {choices.map(({ what, label }) => (
        <label key={what} className="flex min-h-9 items-center gap-3">
          <input
            type="checkbox"
            checked={chosen.includes(what)}
            onChange={(event) => toggle(what, event.target.checked)}
            onBlur={field.onBlur}
            className="size-4.5 accent-verdigris"
          />
          {label}
        </label>
      ))}
      <FieldHelp id={id} error={error} help="The job waits until all of it is here." />
    </fieldset>
  );
}
