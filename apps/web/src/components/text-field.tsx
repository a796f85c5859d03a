import type { HTMLInputAutoCompleteAttribute, ReactNode } from 'react';
import { describedBy, Field, type FieldLabels } from './field.tsx';
import { InputFrame, inputLook } from './input-frame.tsx';
import { emptied, useField, type WhenEmpty } from './use-field.ts';

export interface TextFieldProps extends FieldLabels {
  name: string;
  type?: 'text' | 'email' | 'password' | 'tel' | 'url' | undefined;
  unit?: ReactNode | undefined;
  short?: boolean | undefined;
  inputMode?: 'text' | 'decimal' | 'numeric' | 'email' | 'tel' | undefined;
  placeholder?: string | undefined;
  autoComplete?: HTMLInputAutoCompleteAttribute | undefined;
  whenEmpty?: WhenEmpty | undefined;
}

/** One line of text; figures with decimals too, which travel as text. */
export function TextField(props: TextFieldProps) {
  const {
    name,
    type = 'text',
    unit,
    short,
    inputMode,
    placeholder,
    whenEmpty = 'text',
    ...labels
  } = props;
  const { id, register, error } = useField(name);
  const { autoComplete = 'off', ...frame } = labels;
  return (
    <Field id={id} error={error} {...frame}>
      <InputFrame id={id} unit={unit} short={short} invalid={error !== undefined}>
        <input
          {...register(name, {
            setValueAs: (value: unknown) => (value === '' ? emptied(whenEmpty) : value),
          })}
          id={id}
          type={type}
          inputMode={inputMode}
          placeholder={placeholder}
          autoComplete={autoComplete}
          aria-invalid={error !== undefined}
          aria-describedby={describedBy(id, { unit, help: frame.help, error })}
          className={inputLook}
        />
      </InputFrame>
    </Field>
  );
}
