import type { Job } from '@hidewright/contract';
import { useQueryClient } from '@tanstack/react-query';
import { useCallback, useEffect, useState, useSyncExternalStore } from 'react';
import type { ApiProblem } from '../../lib/api-problem.ts';
import { jobQuery } from './jobs.queries.ts';
import {
  putLog,
  sendWaitingLogs,
  subscribe,
  waitingLogs,
  type LogBody,
  type WaitingLog,
} from './log-outbox.ts';

export interface Refused {
  log: WaitingLog;
  problem: ApiProblem;
}

const retryMs = 10_000;

/** Logging that loses nothing: kept on this device first, then sent, and sent again until it has arrived. */
export function useLogOutbox(person: string) {
  const client = useQueryClient();
  const waiting = useSyncExternalStore(subscribe, waitingLogs);
  const [refused, setRefused] = useState<Refused>();

  const send = useCallback(
    () =>
      sendWaitingLogs(person, {
        onSent: (job: Job) => {
          client.setQueryData(jobQuery(job.id).queryKey, job);
          void client.invalidateQueries({ predicate: ({ queryKey }) => queryKey[0] !== 'session' });
        },
        onRefused: (log, problem) => setRefused({ log, problem }),
      }),
    [client, person],
  );

  useEffect(() => {
    const again = () => void send();
    again();
    window.addEventListener('online', again);
    const timer = setInterval(again, retryMs);
    return () => {
      window.removeEventListener('online', again);
      clearInterval(timer);
    };
  }, [send]);

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
