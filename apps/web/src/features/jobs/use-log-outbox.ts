import { useQueryClient } from '@tanstack/react-query';
import { useCallback, useState, useSyncExternalStore } from 'react';
import type { ApiProblem } from '../../lib/api-problem.ts';
import { useResending } from '../../lib/use-resending.ts';
import { jobQuery } from './jobs.queries.ts';
import { logOutbox, putLog, type LogBody, type WaitingLog } from './log-outbox.ts';

export interface Refused {
  log: WaitingLog;
  problem: ApiProblem;
}

/** Logging that loses nothing: kept on this device first, then sent, and sent again until it has arrived. */
export function useLogOutbox(person: string) {
  const client = useQueryClient();
  const waiting = useSyncExternalStore(logOutbox.subscribe, logOutbox.waiting);
  const [refused, setRefused] = useState<Refused>();

  const send = useCallback(
    () =>
      logOutbox.send(person, {
        onSent: (_, job) => {
          client.setQueryData(jobQuery(job.id).queryKey, job);
          void client.invalidateQueries({ predicate: ({ queryKey }) => queryKey[0] !== 'session' });
        },
        onRefused: (log, problem) => setRefused({ log, problem }),
      }),
    [client, person],
  );

  useResending(send);

  const log = useCallback(
    (jobId: number, body: LogBody) => {
      setRefused(undefined);
      putLog({ person, jobId, body });
      void send();
    },
    [person, send],
  );

  return { log, refused, waiting: waiting.filter((each) => each.person === person) };
}
