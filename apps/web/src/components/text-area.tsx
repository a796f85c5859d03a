import { describedBy, Field, type FieldLabels } from './field.tsx';
import { InputFrame, inputLook } from './input-frame.tsx';
import { emptied, useField, type WhenEmpty } from './use-field.ts';

interface TextAreaProps extends FieldLabels {
  name: string;
  rows?: number | undefined;
  whenEmpty?: WhenEmpty | undefined;
}

/** Several lines, such as a note or an address. */
export function TextArea({ name, rows = 4, whenEmpty = 'text', ...labels }: TextAreaProps) {
  const { id, register, error } = useField(name);
  return (
    <Field id={id} error={error} {...labels}>
      <InputFrame id={id} invalid={error !== undefined}>
        <textarea
          {...register(name, {
            setValueAs: (value: unknown) => (value === '' ? emptied(whenEmpty) : value),
          })}
          id={id}
          rows={rows}
          aria-invalid={error !== undefined}
          aria-describedby={describedBy(id, { help: labels.help, error })}
          className={inputLook}
        />
      </InputFrame>
    </Field>
  );
}
