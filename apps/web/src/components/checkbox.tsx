import type { ReactNode } from 'react';
import { describedBy, FieldHelp } from './field.tsx';
import { useField } from './use-field.ts';

interface CheckboxProps {
  name: string;
  label: ReactNode;
  help?: ReactNode | undefined;
}

/** Yes or no. */
export function Checkbox({ name, label, help }: CheckboxProps) {
  const { id, register, error } = useField(name);
  return (
    <div className="max-w-xl">
      <label className="flex min-h-8 items-start gap-3">
        <input
          {...register(name)}
          id={id}
          type="checkbox"
          aria-invalid={error !== undefined}
          aria-describedby={describedBy(id, { help, error })}
          className="mt-1 size-4.5 shrink-0 accent-verdigris"
        />
        <span>{label}</span>
      </label>
      <FieldHelp id={id} help={help} error={error} />
    </div>
  );
}
