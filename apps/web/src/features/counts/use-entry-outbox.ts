import type { StockCount } from '@hidewright/contract';
import { useQueryClient } from '@tanstack/react-query';
import { useCallback, useState, useSyncExternalStore } from 'react';
import { say } from '../../components/toast.ts';
import type { ApiProblem } from '../../lib/api-problem.ts';
import { useResending } from '../../lib/use-resending.ts';
import { countQuery } from './counts.queries.ts';
import { entryOutbox, putEntry, type Entry } from './entry-outbox.ts';

/** Counting that loses nothing: kept on this device as it is typed, sent, and sent again until it has arrived. */
export function useEntryOutbox(person: string, countId: number) {
  const client = useQueryClient();
  const all = useSyncExternalStore(entryOutbox.subscribe, entryOutbox.waiting);
  const [refused, setRefused] = useState<ApiProblem>();

  const send = useCallback(
    () =>
      entryOutbox.send(person, {
        onSent: (sent, { line, replaced }) => {
          client.setQueryData<StockCount>(
            countQuery(sent.countId).queryKey,
            (sheet) => sheet && withLine(sheet, line),
          );
          if (replaced !== null) say(replaced);
        },
        onRefused: (sent, problem) => {
          setRefused(problem);
          void client.invalidateQueries({ queryKey: countQuery(sent.countId).queryKey });
        },
      }),
    [client, person],
  );

  useResending(send);

  const enter = useCallback(
    (lineId: number, entry: Entry) => {
      setRefused(undefined);
      putEntry({ person, countId, lineId, entry });
    },
    [person, countId],
  );

  const waiting = all.filter((each) => each.person === person && each.countId === countId);
  return { enter, send, refused, waiting };
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
