import { useEffect, useRef, type ReactNode } from 'react';
import { get, useFormContext, useFormState } from 'react-hook-form';

interface MoreProps {
  /** What is behind it. */
  word: string;
  /** What is set there already, so that nobody must open it to know. */
  note?: string | undefined;
  /** The fields or groups of fields behind it: a mistake in one of them opens it. */
  names: readonly string[];
  children: ReactNode;
}

/** What most people leave as it is, one press away. */
export function More({ word, note, names, children }: MoreProps) {
  const box = useRef<HTMLDetailsElement>(null);
  const { control } = useFormContext();
  const { errors, submitCount } = useFormState({ control });
  const wrong = names.some((name) => get(errors, name) !== undefined);
  useEffect(() => {
    if (wrong && box.current) box.current.open = true;
  }, [wrong, submitCount]);
  return (
    <details ref={box}>
      <summary className="rounded py-1 font-semibold">
        {word}
        {note && <span className="font-normal text-ink-soft">{`: ${note}`}</span>}
      </summary>
      <div className="mt-3 space-y-4">{children}</div>
    </details>
  );
}
