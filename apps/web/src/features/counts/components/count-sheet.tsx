import type { StockCount } from '@hidewright/contract';
import { useQueryClient } from '@tanstack/react-query';
import { useRef, useState } from 'react';
import { Notice } from '../../../components/notice.tsx';
import { ScanField } from '../../../components/scan-field.tsx';
import { say } from '../../../components/toast.ts';
import { useAddToCount } from '../counts.mutations.ts';
import { countQuery } from '../counts.queries.ts';
import type { WaitingEntry } from '../entry-outbox.ts';
import { useEntryOutbox, withLine } from '../use-entry-outbox.ts';
import { CountEntry, entryId } from './count-entry.tsx';
import { HandIn } from './hand-in.tsx';

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
  const { enter, send, refused, waiting } = useEntryOutbox(person, sheet.id);
  const scan = useRef<HTMLDivElement>(null);
  const scanned = useRef(false);
  const { find, error } = useFinding(sheet, (lineId) => {
    scanned.current = true;
    focusOn(lineId);
  });
  const lines = sheet.lines.map((line) => asTyped(line, waiting));

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
      {refused && (
        <Notice tone="danger" live>
          {refused.detail}
        </Notice>
      )}
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
            onEnter={(entry) => enter(line.id, entry)}
            onDone={() => void send()}
            onNext={() => goOn(line.id)}
          />
        ))}
      </ul>
      <HandIn sheet={sheet} waiting={waiting.length} send={send} />
    </div>
  );
}

/** A line as this device knows it: what was typed here and is still on its way counts. */
function asTyped(
  line: StockCount['lines'][number],
  waiting: readonly WaitingEntry[],
): StockCount['lines'][number] {
  const waits = waiting.find((each) => each.lineId === line.id);
  if (!waits) return line;
  const { areaMm2 = null, quantity = null, unmeasured = false } = waits.entry;
  return { ...line, countedAreaMm2: areaMm2, countedQuantity: quantity, unmeasured };
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
