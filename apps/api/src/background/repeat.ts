import type { Logger } from 'pino';

/** Something that goes on in the background until it is stopped. */
export interface Repeating {
  /** Lets the round under way finish. */
  stop(): Promise<void>;
}

/** Does a task again and again, with a pause between; what is to be done lies in the database, the timer only wakes it. */
export function repeat(
  name: string,
  pauseMs: number,
  log: Logger,
  task: () => Promise<void>,
): Repeating {
  let stopped = false;
  let timer: NodeJS.Timeout | undefined;
  let round = Promise.resolve();
  const next = () => {
    round = task()
      .catch((error: unknown) => {
        log.error({ err: error }, `${name} failed`);
      })
      .then(() => {
        if (!stopped) timer = setTimeout(next, pauseMs);
      });
  };
  timer = setTimeout(next, 0);
  return {
    async stop() {
      stopped = true;
      clearTimeout(timer);
      await round;
    },
  };
}
