import type { StockCount } from '@hidewright/contract';
import { useQueryClient } from '@tanstack/react-query';
import { useCallback, useRef, useSyncExternalStore } from 'react';
import { say } from '../../components/toast.ts';
import { useResending } from '../../lib/use-resending.ts';
import { countQuery } from './counts.queries.ts';
import {
  entryOutbox,
  keepRefused,
  ofSheet,
  putEntry,
  refusedEntries,
  takeBackEntry,
  type Entry,
} from './entry-outbox.ts';

/** Counting that loses nothing: kept on this device as it is typed, sent, and sent again until it has arrived. */
export function useEntryOutbox(person: string, countId: number) {
  const client = useQueryClient();
  const all = useSyncExternalStore(entryOutbox.subscribe, entryOutbox.waiting);
  const allRefused = useSyncExternalStore(refusedEntries.subscribe, refusedEntries.all);
  /** The line whose figure is not finished yet: its first digits are no count. */
  const typing = useRef<number>(undefined);

  const send = useCallback(
    () =>
      entryOutbox.send(person, {
        mayGo: ({ lineId }) => lineId !== typing.current,
        onSent: (sent, { line, replaced }) => {
          client.setQueryData<StockCount>(
            countQuery(sent.countId).queryKey,
            (sheet) => sheet && withLine(sheet, line),
          );
          if (replaced !== null) say(replaced);
        },
        onRefused: (sent, { detail }) => {
          keepRefused(sent, detail);
          if (sent.countId !== countId)
            say('A figure of another count sheet was refused. Open that sheet to see why.');
          void client.invalidateQueries({ queryKey: countQuery(sent.countId).queryKey });
        },
      }),
    [client, person, countId],
  );

  useResending(send);

  const enter = useCallback(
    (lineId: number, entry: Entry) => {
      typing.current = lineId;
      putEntry({ person, countId, lineId, entry });
    },
    [person, countId],
  );

  const takeBack = useCallback((lineId: number) => takeBackEntry({ person, lineId }), [person]);

  const finish = useCallback(() => {
    typing.current = undefined;
    void send();
  }, [send]);

  const sheet = { person, countId };
  const waiting = ofSheet(all, sheet);
  const refused = ofSheet(allRefused, sheet);
  return { enter, takeBack, finish, send, refused, waiting };
}

/** The sheet with a line as it now stands, or with one more. */
export function withLine(sheet: StockCount, line: StockCount['lines'][number]): StockCount {
  const known = sheet.lines.some(({ id }) => id === line.id);
  const lines = known
    ? sheet.lines.map((each) => (each.id === line.id ? line : each))
    : [...sheet.lines, line];
  const countedCount = lines.filter(({ countedAt }) => countedAt !== null).length;
  return { ...sheet, lines, lineCount: lines.length, countedCount };
}
