import type { ReactNode } from 'react';

export interface FieldLabels {
  label: ReactNode;
  /** Below the field: what is meant, or an example. */
  help?: ReactNode | undefined;
  /** Said beside the label; everything else must be filled in. */
  optional?: boolean | undefined;
}

interface FieldProps extends FieldLabels {
  id: string;
  error?: string | undefined;
  children: ReactNode;
}

/** Label above, help and error below: the frame of every field. */
export function Field({ id, label, help, optional, error, children }: FieldProps) {
  return (
    <div className="max-w-xl">
      <label htmlFor={id} className="mb-1 block font-semibold">
        {label}
        {optional && <span className="font-normal text-ink-soft"> (optional)</span>}
      </label>
      {children}
      <FieldHelp id={id} help={help} error={error} />
    </div>
  );
}

export function FieldHelp({
  id,
  help,
  error,
}: {
  id: string;
  help?: ReactNode;
  error?: string | undefined;
}) {
  return (
    <>
      {help && (
        <p id={`${id}-help`} className="mt-1 text-sm text-ink-soft">
          {help}
        </p>
      )}
      {error && (
        <p id={`${id}-error`} className="mt-1 text-sm font-semibold text-oxblood">
          {error}
        </p>
      )}
    </>
  );
}

/** What describes a field to the ear: its unit, its help, its error. */
export function describedBy(
  id: string,
  parts: { unit?: unknown; help?: unknown; error?: unknown },
) {
  const ids = [
    parts.unit && `${id}-unit`,
    parts.help && `${id}-help`,
    parts.error && `${id}-error`,
  ];
  return ids.filter(Boolean).join(' ') || undefined;
}
