import type { StockCount } from '@hidewright/contract';
import { Notice } from '../../../components/notice.tsx';
import { useEntryOutbox } from '../use-entry-outbox.ts';
import { RefusedEntries } from './refused-entries.tsx';

/** What was counted on this device for a sheet that is handed in by now: it is not on it, and that is said. */
export function LeftOnDevice({ sheet, person }: { sheet: StockCount; person: string }) {
  const { refused, waiting } = useEntryOutbox(person, sheet.id);
  return (
    <>
      <RefusedEntries sheet={sheet} person={person} refused={refused} />
      {waiting.length > 0 && (
        <Notice tone="attention" live>
          {waiting.length === 1
            ? '1 figure waits on this device and is not on the sheet.'
            : `${waiting.length} figures wait on this device and are not on the sheet.`}
        </Notice>
      )}
    </>
  );
}
