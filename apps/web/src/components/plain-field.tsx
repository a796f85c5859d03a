import { useId } from 'react';
import { describedBy, Field } from './field.tsx';
import { InputFrame, inputLook } from './input-frame.tsx';

interface PlainFieldProps {
  label: string;
  unit: string;
  value: string;
  error: string | undefined;
  onChange: (text: string) => void;
}

/** A figure that is only reckoned with, and sent nowhere. */
export function PlainField({ label, unit, value, error, onChange }: PlainFieldProps) {
  const id = useId();
  return (
    <Field id={id} label={label} error={error}>
      <InputFrame id={id} unit={unit} short invalid={error !== undefined}>
        <input
          id={id}
          inputMode="decimal"
          autoComplete="off"
          value={value}
          onChange={(event) => onChange(event.target.value)}
          onKeyDown={(event) => {
            // Enter would send the form that it stands in.
            if (event.key === 'Enter') event.preventDefault();
          }}
          aria-invalid={error !== undefined}
          aria-describedby={describedBy(id, { unit, error })}
          className={inputLook}
        />
      </InputFrame>
    </Field>
  );
}
