import { unitWord } from '@hidewright/domain';
import type { CountLine } from '@hidewright/contract';
import { CircleCheck, Clock } from 'lucide-react';
import { useId, useState } from 'react';
import { Button } from '../../../components/button.tsx';
import { InputFrame, inputLook } from '../../../components/input-frame.tsx';
import { StateMark } from '../../../components/state-mark.tsx';
import { WeighCount } from '../../../components/weigh-count.tsx';
import { areaUnits } from '../../../lib/units.ts';
import { useWorkshop } from '../../../lib/workshop.tsx';
import { figureOf, mayBecomeEntry, readEntry } from '../count-words.ts';
import type { Entry } from '../entry-outbox.ts';

interface CountEntryProps {
  line: CountLine;
  /** What was typed here and has not arrived yet. */
  waits: boolean;
  /** What was typed; nothing where it is no figure. */
  onRead: (entry: Entry | undefined) => void;
  /** The figure is finished: send it. */
  onDone: () => void;
  onNext: () => void;
}

export const entryId = (lineId: number): string => `count-line-${lineId}`;

/** One thing to count: its tag and name, and what is there of it. */
export function CountEntry({ line, waits, onRead, onDone, onNext }: CountEntryProps) {
  const { areaUnit } = useWorkshop();
  const id = useId();
  const ofLot = line.lotId !== null;
  const figure = figureOf(line, areaUnit);
  const [typed, setTyped] = useState<string>();
  const text = typed ?? figure;
  const entry = readEntry(text, ofLot, areaUnit);
  const wrong = typeof entry === 'string' ? entry : undefined;
  const [over, setOver] = useState(false);
  // Half a figure is not complained of while the rest of it is still to come.
  const shown = over || !mayBecomeEntry(text, ofLot, areaUnit) ? wrong : undefined;

  function type(next: string) {
    setTyped(next);
    setOver(false);
    const read = readEntry(next, ofLot, areaUnit);
    onRead(typeof read === 'string' ? undefined : read);
  }

  function leave() {
    setOver(true);
    if (wrong !== undefined) return;
    setTyped(undefined);
    onDone();
  }

  function take(found: Entry) {
    setTyped(undefined);
    onRead(found);
    onDone();
  }

  return (
    <li className="rounded border border-stitch bg-card px-3.5 py-3">
      <div className="flex flex-wrap items-baseline justify-between gap-x-4">
        <label htmlFor={entryId(line.id)} className="font-semibold">
          {line.tag}
          <span className="ml-2 font-normal text-ink-soft">{describe(line)}</span>
        </label>
        {wrong === undefined && <EntryState line={line} waits={waits} />}
      </div>
      <div className="mt-2 flex flex-wrap items-center gap-2">
        <InputFrame
          id={entryId(line.id)}
          unit={line.unit === null ? areaUnits[areaUnit].sign : unitWord(line.unit, 2)}
          short
          invalid={shown !== undefined}
        >
          <input
            id={entryId(line.id)}
            type="text"
            inputMode={ofLot ? 'text' : 'numeric'}
            autoComplete="off"
            enterKeyHint="next"
            value={text}
            aria-invalid={shown !== undefined}
            aria-describedby={shown === undefined ? undefined : `${id}-wrong`}
            onChange={(event) => type(event.target.value)}
            onBlur={leave}
            onKeyDown={(event) => {
              if (event.key === 'Enter') onNext();
            }}
            className={`${inputLook} min-h-11 text-lg`}
          />
        </InputFrame>
        {ofLot && (
          <Button
            className="min-h-11"
            tone={line.unmeasured ? 'primary' : 'secondary'}
            aria-pressed={line.unmeasured}
            onClick={() => take(line.unmeasured ? {} : { unmeasured: true })}
          >
            Hangs there
          </Button>
        )}
      </div>
      <p
        id={`${id}-wrong`}
        role="alert"
        className="mt-1 text-sm font-semibold text-oxblood empty:hidden"
      >
        {shown}
      </p>
      {!ofLot && <WeighCount of={line.tag} onCount={(count) => take({ quantity: count })} />}
    </li>
  );
}

function describe({ name, form, place, added }: CountLine): string {
  return [name, form, place, added && 'found here'].filter(Boolean).join(' · ');
}

/** Whether it stands on the sheet at the workshop's computer. */
function EntryState({ line, waits }: { line: CountLine; waits: boolean }) {
  if (waits) {
    return (
      <span className="inline-flex items-center gap-1.5 text-sm text-brass">
        <Clock size={16} aria-hidden="true" /> waits to be sent
      </span>
    );
  }
  if (line.countedAt !== null) {
    return (
      <span className="inline-flex items-center gap-1.5 text-sm text-verdigris">
        <CircleCheck size={16} aria-hidden="true" /> {line.countedByName}
      </span>
    );
  }
  return line.again ? <StateMark state="again">count again</StateMark> : null;
}
