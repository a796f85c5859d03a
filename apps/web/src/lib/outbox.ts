import { ApiProblem } from './api-problem.ts';
import { KeptList } from './kept-list.ts';

/** What is kept on this device until it has arrived. */
interface Kept {
  /** Whose it is: nobody else's session sends it. */
  person: string;
}

interface Answers<Waiting, Reply> {
  onSent: (sent: Waiting, reply: Reply) => void;
  onRefused: (refused: Waiting, problem: ApiProblem) => void;
  /** Whether it is finished and may go; everything is, unless said. */
  mayGo?: (waits: Waiting) => boolean;
}

/**
 * What was typed on this device and is not known to have arrived: it outlives the page, and is sent, first things
 * first, until the workshop's computer has answered.
 */
export class Outbox<Waiting extends Kept, Reply> {
  readonly #list: KeptList<Waiting>;
  readonly #deliver: (waits: Waiting) => Promise<Reply>;
  #underWay: Promise<void> | undefined;

  /** @param place under which it is kept in the browser's storage */
  constructor(place: string, deliver: (waits: Waiting) => Promise<Reply>) {
    this.#list = new KeptList(place);
    this.#deliver = deliver;
  }

  readonly subscribe = (listener: () => void): (() => void) => this.#list.subscribe(listener);

  readonly waiting = (): readonly Waiting[] => this.#list.all();

  /** Adds one, instead of those that it replaces. */
  put(next: Waiting, replaces: (other: Waiting) => boolean = () => false): void {
    this.#list.keep([...this.waiting().filter((each) => !replaces(each)), next]);
  }

  /** What was typed does not hold any more: it is not sent. */
  takeBack(which: (waits: Waiting) => boolean): void {
    if (this.waiting().some(which)) this.#list.keep(this.waiting().filter((each) => !which(each)));
  }

  /**
   * Sends what this person has waiting; stops where the workshop's computer cannot be reached. Whoever asks while it
   * is under way waits until that is over: what still waits then has not arrived.
   */
  send(person: string, answers: Answers<Waiting, Reply>): Promise<void> {
    this.#underWay ??= this.#sendAll(person, answers).finally(() => {
      this.#underWay = undefined;
    });
    return this.#underWay;
  }

  async #sendAll(person: string, answers: Answers<Waiting, Reply>): Promise<void> {
    const { mayGo = () => true } = answers;
    const nextOf = () => this.waiting().find((each) => each.person === person && mayGo(each));
    for (let next = nextOf(); next !== undefined; next = nextOf()) {
      if (!(await this.#sendOne(next, answers))) return;
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
    this.#list.keep(this.waiting().filter((each) => each !== sent));
  }
}
