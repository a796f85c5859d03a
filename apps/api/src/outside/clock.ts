/** What time it is: handed in, so that the demo's year and the tests have their own. */
export interface Clock {
  now(): Date;
}

export const systemClock: Clock = { now: () => new Date() };

/** A clock that stands where it was set. */
export class SetClock implements Clock {
  #at: Date;

  constructor(at: Date) {
    this.#at = at;
  }

  now(): Date {
    return new Date(this.#at);
  }

  set(at: Date): void {
    this.#at = at;
  }
}
