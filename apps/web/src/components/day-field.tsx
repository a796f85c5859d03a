import { describedBy, Field, type FieldLabels } from './field.tsx';
import { InputFrame, inputLook } from './input-frame.tsx';
import { emptied, useField, type WhenEmpty } from './use-field.ts';

interface DayFieldProps extends FieldLabels {
  name: string;
  min?: string | undefined;
  max?: string | undefined;
  whenEmpty?: WhenEmpty | undefined;
}

/** A calendar day, typed or picked with the device's own calendar. */
export function DayField({ name, min, max, whenEmpty = 'absent', ...labels }: DayFieldProps) {
  const { id, register, error } = useField(name);
  return (
    <Field id={id} error={error} {...labels}>
      <InputFrame id={id} short invalid={error !== undefined}>
        <input
          {...register(name, {
            setValueAs: (value: unknown) => (value === '' ? emptied(whenEmpty) : value),
          })}
          id={id}
          type="date"
          min={min}
          max={max}
          aria-invalid={error !== undefined}
          aria-describedby={describedBy(id, { help: labels.help, error })}
          className={inputLook}
        />
      </InputFrame>
    </Field>
  );
}
