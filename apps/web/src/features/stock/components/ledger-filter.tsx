import { movementKinds, type MovementKind } from '@hidewright/contract';
import { useId, type ReactNode } from 'react';
import { Button } from '../../../components/button.tsx';
import { InputFrame, inputLook } from '../../../components/input-frame.tsx';
import { SelectInput } from '../../../components/select-input.tsx';
import { movementWords } from '../movement-words.ts';

export interface LedgerChoice {
  kind?: MovementKind | undefined;
  person?: string | undefined;
  from?: string | undefined;
  to?: string | undefined;
}

interface LedgerFilterProps {
  chosen: LedgerChoice;
  today: string;
  onChoose: (choice: LedgerChoice) => void;
}

/** Which movements: by kind, person and days. */
export function LedgerFilter({ chosen, today, onChoose }: LedgerFilterProps) {
  const id = useId();
  function choose(form: HTMLFormElement) {
    const typed = Object.fromEntries(new FormData(form)) as Record<string, string>;
    onChoose({
      kind: movementKinds.find((kind) => kind === typed['kind']),
      person: typed['person']?.trim() || undefined,
      from: typed['from'] || undefined,
      to: typed['to'] || undefined,
    });
  }
  return (
    <form
      className="no-print mb-5 flex flex-wrap items-end gap-3"
      onSubmit={(event) => {
        event.preventDefault();
        choose(event.currentTarget);
      }}
    >
      <Labelled id={`${id}-kind`} label="What">
        <SelectInput id={`${id}-kind`} name="kind" defaultValue={chosen.kind ?? ''} short>
          <option value="">everything</option>
          {movementKinds.map((kind) => (
            <option key={kind} value={kind} className="bg-card text-ink">
              {movementWords[kind]}
            </option>
          ))}
        </SelectInput>
      </Labelled>
      <Labelled id={`${id}-person`} label="By">
        <InputFrame id={`${id}-person`} invalid={false} short>
          <input
            id={`${id}-person`}
            name="person"
            defaultValue={chosen.person}
            autoComplete="off"
            maxLength={80}
            className={inputLook}
          />
        </InputFrame>
      </Labelled>
      {(['from', 'to'] as const).map((end) => (
        <Labelled key={end} id={`${id}-${end}`} label={end === 'from' ? 'From' : 'Until'}>
          <InputFrame id={`${id}-${end}`} invalid={false} short>
            <input
              id={`${id}-${end}`}
              name={end}
              type="date"
              max={today}
              defaultValue={chosen[end]}
              className={inputLook}
            />
          </InputFrame>
        </Labelled>
      ))}
      <Button type="submit" className="min-h-10">
        Show
      </Button>
    </form>
  );
}

function Labelled({ id, label, children }: { id: string; label: string; children: ReactNode }) {
  return (
    <div>
      <label htmlFor={id} className="mb-1 block font-semibold">
        {label}
      </label>
      {children}
    </div>
  );
}
