import type { StockCount } from '@hidewright/contract';
import { useQueryClient } from '@tanstack/react-query';
import { useRef, useState } from 'react';
import { ScanField } from '../../../components/scan-field.tsx';
import { say } from '../../../components/toast.ts';
import { useAddToCount } from '../counts.mutations.ts';
import { countQuery } from '../counts.queries.ts';
import { requireAllArrived } from '../all-arrived.ts';
import { asTyped, hasFigure } from '../as-typed.ts';
import type { Entry } from '../entry-outbox.ts';
import { useEntryOutbox, withLine } from '../use-entry-outbox.ts';
import { CountEntry, entryId } from './count-entry.tsx';
import { HandIn } from './hand-in.tsx';
import { RefusedEntries } from './refused-entries.tsx';

interface CountSheetProps {
  sheet: StockCount;
  /** Whose entries wait on this device. */
  person: string;
}

const focusOn = (lineId: number) => {
  const field = document.getElementById(entryId(lineId));
  field?.scrollIntoView({ block: 'center' });
  field?.focus();
};

/** A sheet being counted: find the line by eye or by its tag, type what is there, go on. */
export function CountSheet({ sheet, person }: CountSheetProps) {
  const { enter, takeBack, finish, send, refused, waiting } = useEntryOutbox(person, sheet.id);
  const [unreadable, setUnreadable] = useState<readonly number[]>([]);
  const scan = useRef<HTMLDivElement>(null);
  const scanned = useRef(false);
  const { find, error } = useFinding(sheet, (lineId) => {
    scanned.current = true;
    focusOn(lineId);
  });
  // As this device knows them: what was typed here and is still on its way counts.
  const lines = sheet.lines.map((line) => {
    const waits = waiting.find((each) => each.lineId === line.id);
    return waits ? asTyped(line, waits.entry) : line;
  });

  function read(lineId: number, entry: Entry | undefined) {
    setUnreadable((before) => [
      ...before.filter((each) => each !== lineId),
      ...(entry ? [] : [lineId]),
    ]);
    if (entry) enter(lineId, entry);
    else takeBack(lineId);
  }

  function goOn(lineId: number) {
    if (scanned.current) {
      scanned.current = false;
      scan.current?.querySelector('input')?.focus();
      return;
    }
    const at = lines.findIndex(({ id }) => id === lineId);
    const next = lines[at + 1];
    if (next) focusOn(next.id);
  }

  return (
    <div className="space-y-4">
      <RefusedEntries sheet={sheet} person={person} refused={refused} />
      <div ref={scan}>
        <ScanField
          label="Scan or type a tag"
          help="It leads to its line; what does not stand here is added."
          error={error}
          onScan={find}
        />
      </div>
      <ul className="grid gap-2 lg:grid-cols-2">
        {lines.map((line) => (
          <CountEntry
            key={line.id}
            line={line}
            waits={waiting.some((each) => each.lineId === line.id)}
            onRead={(entry) => read(line.id, entry)}
            onDone={finish}
            onNext={() => goOn(line.id)}
          />
        ))}
      </ul>
      <HandIn
        sheet={sheet}
        waiting={waiting.length}
        left={lines.filter((line) => !hasFigure(line)).length}
        unreadable={lines.filter(({ id }) => unreadable.includes(id))}
        onMend={focusOn}
        send={() => requireAllArrived({ person, countId: sheet.id }, send)}
      />
    </div>
  );
}

/** From a tag to its line, which is added where it was not on the sheet. */
function useFinding(sheet: StockCount, onFound: (lineId: number) => void) {
  const client = useQueryClient();
  const add = useAddToCount();
  const [error, setError] = useState<string>();

  async function find(tag: string) {
    setError(undefined);
    const known = sheet.lines.find((line) => line.tag.toLowerCase() === tag.toLowerCase());
    if (known) return onFound(known.id);
    try {
      const { line, already } = await add.mutateAsync({
        params: { id: sheet.id },
        body: { code: tag },
      });
      client.setQueryData<StockCount>(
        countQuery(sheet.id).queryKey,
        (before) => before && withLine(before, line),
      );
      if (!already) say(`${line.tag} is on the sheet now.`);
      requestAnimationFrame(() => onFound(line.id));
    } catch (refusal) {
      setError(refusal instanceof Error ? refusal.message : 'That did not work. Try again.');
    }
  }
  return { find: (tag: string) => void find(tag), error };
}
