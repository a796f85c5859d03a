import { ApiProblem } from './api-problem.ts';

/** What is kept on this device until it has arrived. */
interface Kept {
  /** Whose it is: nobody else's session sends it. */
  person: string;
}

interface Answers<Waiting, Reply> {
  onSent: (sent: Waiting, reply: Reply) => void;
  onRefused: (refused: Waiting, problem: ApiProblem) => void;
}

/**
 * What was typed on this device and is not known to have arrived: it outlives the page, and is sent, first things
 * first, until the workshop's computer has answered.
 */
export class Outbox<Waiting extends Kept, Reply> {
  readonly #place: string;
  readonly #deliver: (waits: Waiting) => Promise<Reply>;
  readonly #listeners = new Set<() => void>();
  #waiting: readonly Waiting[];
  #sending = false;

  /** @param place under which it is kept in the browser's storage */
  constructor(place: string, deliver: (waits: Waiting) => Promise<Reply>) {
    this.#place = place;
    this.#deliver = deliver;
    this.#waiting = this.#read();
  }

  readonly subscribe = (listener: () => void): (() => void) => {
    this.#listeners.add(listener);
    return () => this.#listeners.delete(listener);
  };

  readonly waiting = (): readonly Waiting[] => this.#waiting;

  /** Adds one, instead of those that it replaces. */
  put(next: Waiting, replaces: (other: Waiting) => boolean = () => false): void {
    this.#keep([...this.#waiting.filter((each) => !replaces(each)), next]);
  }

  /** Sends what this person has waiting; stops where the workshop's computer cannot be reached. */
  async send(person: string, answers: Answers<Waiting, Reply>): Promise<void> {
    if (this.#sending) return;
    this.#sending = true;
    const nextOf = () => this.#waiting.find((each) => each.person === person);
    try {
      for (let next = nextOf(); next !== undefined; next = nextOf()) {
        if (!(await this.#sendOne(next, answers))) return;
      }
    } finally {
      this.#sending = false;
    }
  }

  /** Whether there is any use in sending the next. */
  async #sendOne(waits: Waiting, { onSent, onRefused }: Answers<Waiting, Reply>): Promise<boolean> {
    try {
      const reply = await this.#deliver(waits);
      this.#drop(waits);
      onSent(waits, reply);
      return true;
    } catch (error) {
      // Signed out or out of reach: it stays until it can be sent.
      if (!(error instanceof ApiProblem) || error.isPassing || error.status === 401) return false;
      this.#drop(waits);
      onRefused(waits, error);
      return true;
    }
  }

  /** Only what was sent: something later about the same may have come meanwhile. */
  #drop(sent: Waiting): void {
    this.#keep(this.#waiting.filter((each) => each !== sent));
  }

  #read(): readonly Waiting[] {
    try {
      return JSON.parse(localStorage.getItem(this.#place) ?? '[]') as Waiting[];
    } catch {
      return [];
    }
  }

  #keep(next: readonly Waiting[]): void {
    this.#waiting = next;
    try {
      localStorage.setItem(this.#place, JSON.stringify(next));
    } catch {
      // Storage is full or switched off: what waits is kept as long as this page is open.
    }
    for (const listener of this.#listeners) listener();
  }
}
