import type { Context } from '../../context.ts';
import { Person } from '../../modules/people/person.entity.ts';
import type { SetClock } from '../../outside/clock.ts';
import { inTransaction, type Actor, type Work } from '../../work.ts';

type Role = 'owner' | 'maker' | 'bookkeeper';

/** The demo workshop while its year is played: who acts, on which database, at what time. */
export class DemoShop {
  readonly context: Context;
  readonly clock: SetClock;
  readonly #people = new Map<Role, Actor>();

  constructor(context: Context, clock: SetClock) {
    this.context = context;
    this.clock = clock;
  }

  async meetPeople(): Promise<void> {
    for (const { id, name, role } of await this.context.orm.em.fork().findAll(Person)) {
      this.#people.set(role, { id, name, role });
    }
  }

  person(role: Role): Actor {
    const person = this.#people.get(role);
    if (person === undefined) throw new Error(`The demo workshop has no ${role}`);
    return person;
  }

  /** One use case, done by this person now. */
  as<T>(role: Role, useCase: (work: Work) => Promise<T>): Promise<T> {
    return inTransaction(this.context, this.person(role), useCase);
  }

  byCustomer<T>(useCase: (work: Work) => Promise<T>): Promise<T> {
    return inTransaction(
      this.context,
      { id: null, name: 'The customer', role: 'customer' },
      useCase,
    );
  }
}

/** Finds by name what an earlier part of the demo made. */
export class Named {
  readonly #kind: string;
  readonly #ids = new Map<string, number>();

  constructor(kind: string) {
    this.#kind = kind;
  }

  set(name: string, id: number): void {
    this.#ids.set(name, id);
  }

  id(name: string): number {
    const id = this.#ids.get(name);
    if (id === undefined) throw new Error(`The demo has no ${this.#kind} called ${name}`);
    return id;
  }
}
