import { describedBy, Field, type FieldLabels } from './field.tsx';
import { SelectInput } from './select-input.tsx';
import { emptied, useField, type WhenEmpty } from './use-field.ts';

export interface Choice {
  value: string | number;
  label: string;
}

interface SelectFieldProps extends FieldLabels {
  name: string;
  choices: readonly Choice[];
  /** Shown while nothing is chosen: "Choose a leather". */
  placeholder?: string | undefined;
  whenEmpty?: WhenEmpty | undefined;
  short?: boolean | undefined;
}

/** One of several, with the device's own list. Numbers among the values stay numbers. */
export function SelectField(props: SelectFieldProps) {
  const { name, choices, placeholder, whenEmpty = 'absent', short, ...labels } = props;
  const { id, register, error } = useField(name);
  const read = (value: unknown) =>
    value === '' || value === undefined || value === null
      ? emptied(whenEmpty)
      : (choices.find((choice) => String(choice.value) === String(value))?.value ?? value);
  return (
    <Field id={id} error={error} {...labels}>
      <SelectInput
        {...register(name, { setValueAs: read })}
        id={id}
        short={short}
        invalid={error !== undefined}
        aria-describedby={describedBy(id, { help: labels.help, error })}
      >
        {placeholder !== undefined && <option value="">{placeholder}</option>}
        {choices.map((choice) => (
          <option key={choice.value} value={choice.value} className="bg-card text-ink">
            {choice.label}
          </option>
        ))}
      </SelectInput>
    </Field>
  );
}
