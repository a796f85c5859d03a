import { randomBytes } from 'node:crypto';
import type { SearchWatch } from './watched.ts';

/** How a search ended. `stopped`: as far as it was found. */
export type Ending<Found> =
  { state: 'done' | 'stopped'; found: Found } | { state: 'refused'; refusal: string };

/** A search under way, or one that ended. */
export interface Search<Found> {
  readonly id: string;
  /** The share of its tries that is behind it, and the pieces so far. */
  readonly progress: { done: number; pieces: number | null };
  readonly ending: Ending<Found> | null;
}

interface Kept<Found> extends Search<Found> {
  key: string;
  progress: { done: number; pieces: number | null };
  ending: Ending<Found> | null;
  endedAt: number;
  stopping: AbortController;
  ended: Promise<void>;
}

const limits = {
  /** At once; more would keep everybody else's layouts waiting. */
  looking: 4,
  /** Of those that ended. */
  kept: 32,
  keptMs: 10 * 60_000,
};

/** Long searches under way, and for some minutes those that ended. They live in memory: a restart forgets them. */
export class Searches<Found> {
  readonly #kept = new Map<string, Kept<Found>>();
  readonly #now: () => number;
  #closing = false;

  /** @param now in milliseconds, from any beginning */
  constructor(now: () => number = () => performance.now()) {
    this.#now = now;
  }

  /**
   * Starts a search, or joins the one that looks for the same already; undefined while too many are under way.
   * @param look never rejects: what went wrong is an ending too
   */
  start(
    key: string,
    look: (watch: SearchWatch) => Promise<Ending<Found>>,
  ): Search<Found> | undefined {
    this.#forgetOld();
    const looking = [...this.#kept.values()].filter(({ ending }) => ending === null);
    const same = looking.find((each) => each.key === key && !each.stopping.signal.aborted);
    if (same !== undefined) return same;
    if (this.#closing || looking.length >= limits.looking) return undefined;
    const started = this.#startedWith(key, look);
    this.#kept.set(started.id, started);
    return started;
  }

  find(id: string): Search<Found> | undefined {
    this.#forgetOld();
    return this.#kept.get(id);
  }

  /** Stops a search and waits for what it has; one that has ended stays as it is. */
  async stop(id: string): Promise<Search<Found> | undefined> {
    const kept = this.#kept.get(id);
    kept?.stopping.abort();
    await kept?.ended;
    return kept;
  }

  /** Stops whatever looks, and waits until it has. */
  async close(): Promise<void> {
    this.#closing = true;
    await Promise.all([...this.#kept.keys()].map((id) => this.stop(id)));
  }

  #startedWith(key: string, look: (watch: SearchWatch) => Promise<Ending<Found>>): Kept<Found> {
    const stopping = new AbortController();
    const search: Kept<Found> = {
      id: randomBytes(16).toString('base64url'),
      key,
      progress: { done: 0, pieces: null },
      ending: null,
      endedAt: 0,
      stopping,
      ended: Promise.resolve(),
    };
    const onProgress = (done: number, pieces: number) => void (search.progress = { done, pieces });
    search.ended = look({ onProgress, stopping: stopping.signal }).then((ending) => {
      search.ending = ending;
      search.endedAt = this.#now();
    });
    return search;
  }

  #forgetOld(): void {
    const ended = [...this.#kept.values()].filter(({ ending }) => ending !== null);
    const tooOld = this.#now() - limits.keptMs;
    ended.forEach(({ id, endedAt }, at) => {
      if (endedAt < tooOld || at < ended.length - limits.kept) this.#kept.delete(id);
    });
  }
}
