import { useId, useState } from 'react';
import { Button } from '../../../components/button.tsx';
import { Field } from '../../../components/field.tsx';
import { readTyped } from '../time-study.ts';

/** Readings from a stopwatch of one's own. */
export function TypedReadings({ onAdd }: { onAdd: (readings: string[]) => void }) {
  const id = useId();
  const [text, setText] = useState('');
  const [error, setError] = useState<string>();

  function add() {
    const typed = readTyped(text);
    if ('wrong' in typed) {
      setError(`${typed.wrong} is no time in seconds. Write them such as 12.4 13 11.8.`);
      return;
    }
    if (typed.readings.length === 0) {
      setError('Write at least one reading, such as 12.4.');
      return;
    }
    onAdd(typed.readings);
    setText('');
    setError(undefined);
  }

  return (
    <details className="mt-4">
      <summary className="min-h-8 py-1 font-semibold">Type readings instead</summary>
      <div className="mt-2 space-y-2">
        <Field
          id={id}
          label="Readings in seconds"
          help="with spaces between, such as 12.4 13 11.8"
          error={error}
        >
          <textarea
            id={id}
            rows={2}
            value={text}
            onChange={(event) => setText(event.target.value)}
            aria-invalid={error !== undefined}
            aria-describedby={`${id}-help${error === undefined ? '' : ` ${id}-error`}`}
            className="w-full rounded border border-edge bg-card px-3 py-2"
          />
        </Field>
        <Button onClick={add}>Add them</Button>
      </div>
    </details>
  );
}
