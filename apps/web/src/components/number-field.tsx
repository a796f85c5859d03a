import type { ReactNode } from 'react';
import { readWhole } from '../lib/comma.ts';
import { describedBy, Field, type FieldLabels } from './field.tsx';
import { InputFrame, inputLook } from './input-frame.tsx';
import { emptied, useField, type WhenEmpty } from './use-field.ts';

export interface NumberFieldProps extends FieldLabels {
  name: string;
  unit?: ReactNode | undefined;
  whenEmpty?: WhenEmpty | undefined;
}

/** A whole number, such as pieces. What is no number stays as typed, so that the contract's sentence names it. */
export function NumberField({ name, unit, whenEmpty = 'absent', ...labels }: NumberFieldProps) {
  const { id, register, error } = useField(name);
  const read = (value: unknown) => {
    if (value === '' || value === undefined || value === null) return emptied(whenEmpty);
    const text = String(value).trim();
    const whole = readWhole(text) ?? text;
    return /^-?\d{1,15}$/.test(whole) ? Number(whole) : value;
  };
  return (
    <Field id={id} error={error} {...labels}>
      <InputFrame id={id} unit={unit} short invalid={error !== undefined}>
        <input
          {...register(name, { setValueAs: read })}
          id={id}
          type="text"
          inputMode="numeric"
          autoComplete="off"
          aria-invalid={error !== undefined}
          aria-describedby={describedBy(id, { unit, help: labels.help, error })}
          className={inputLook}
        />
      </InputFrame>
    </Field>
  );
}
