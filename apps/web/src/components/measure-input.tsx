import { useState } from 'react';
import { useController } from 'react-hook-form';
import { unclearComma } from '../lib/comma.ts';
import { isFigure } from '../lib/units.ts';
import { describedBy, Field, type FieldLabels } from './field.tsx';
import { InputFrame, inputLook } from './input-frame.tsx';
import { emptied, useField, type WhenEmpty } from './use-field.ts';

interface MeasureInputProps extends FieldLabels {
  name: string;
  unit: string;
  whenEmpty?: WhenEmpty | undefined;
  /** What was typed, in the contract's unit; undefined if it is no measure. */
  read: (text: string) => string | undefined;
  /** A value of the contract, in the shop's unit. */
  show: (value: string) => string;
}

/** A measure that is typed in the shop's unit, as people write it, and travels in the contract's. */
export function MeasureInput({ name, unit, whenEmpty, read, show, ...labels }: MeasureInputProps) {
  const { id, control, error: found } = useField(name);
  const { field } = useController({ name, control });
  const [typed, setTyped] = useState<{ text: string; value: unknown }>();
  const shown = typed && typed.value === field.value ? typed.text : shownValue(field.value, show);

  const error = found && (unclearComma(shown) ?? found);

  function type(text: string) {
    const empty = emptied(whenEmpty ?? (labels.optional ? 'absent' : 'text'));
    const value = text.trim() === '' ? empty : (read(text) ?? text);
    setTyped({ text, value });
    field.onChange(value);
  }

  return (
    <Field id={id} error={error} {...labels}>
      <InputFrame id={id} unit={unit} short invalid={error !== undefined}>
        <input
          ref={field.ref}
          name={name}
          id={id}
          type="text"
          inputMode="text"
          autoComplete="off"
          value={shown}
          onChange={(event) => type(event.target.value)}
          onBlur={field.onBlur}
          aria-invalid={error !== undefined}
          aria-describedby={describedBy(id, { unit, help: labels.help, error })}
          className={inputLook}
        />
      </InputFrame>
    </Field>
  );
}

function shownValue(value: unknown, show: (value: string) => string): string {
  if (value === undefined || value === null) return '';
  const text = String(value);
  return isFigure(text) ? show(text) : text;
}
