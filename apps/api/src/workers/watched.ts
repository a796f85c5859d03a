import { MessageChannel, type MessagePort } from 'node:worker_threads';

/** Who watches a search: told how far it is, and able to stop it. */
export interface SearchWatch {
  /** A share from 0 to 1, and the pieces found so far. */
  onProgress: (done: number, pieces: number) => void;
  stopping: AbortSignal;
}

/** What a worker is given to be watched by: where it tells how far it is, and the flag it looks at. */
export interface WatchedWork<Input> {
  input: Input;
  port: MessagePort;
  stop: Int32Array<SharedArrayBuffer>;
}

/** Hands a search to a worker with a line to whoever watches it, and takes the line down afterwards. */
export async function watched<Input, Found>(
  input: Input,
  watch: SearchWatch,
  run: (work: WatchedWork<Input>) => Promise<Found>,
): Promise<Found> {
  const { port1, port2 } = new MessageChannel();
  const stop = new Int32Array(new SharedArrayBuffer(Int32Array.BYTES_PER_ELEMENT));
  const raise = () => void Atomics.store(stop, 0, 1);
  if (watch.stopping.aborted) raise();
  watch.stopping.addEventListener('abort', raise, { once: true });
  port1.on('message', ([done, pieces]: [number, number]) => watch.onProgress(done, pieces));
  try {
    return await run({ input, port: port2, stop });
  } finally {
    watch.stopping.removeEventListener('abort', raise);
    port1.close();
  }
}

/**
 * The worker's end of it, as the domain takes it: says each whole per cent and each piece once, and remembers
 * whether it was stopped.
 */
export function watchFrom({ port, stop }: Omit<WatchedWork<unknown>, 'input'>) {
  let told = '';
  let stopped = false;
  return {
    onProgress(done: number, pieces: number) {
      const news = `${Math.floor(done * 100)} ${pieces}`;
      if (news === told) return;
      told = news;
      port.postMessage([done, pieces]);
    },
    shouldStop: () => (stopped ||= Atomics.load(stop, 0) === 1),
    wasStopped: () => stopped,
  };
}
