import type { EntityManager } from '@mikro-orm/sqlite';
import type { Context } from './context.ts';
import { dayIn } from './day-in.ts';
import { Workshop } from './modules/workshop/workshop.entity.ts';

/** Who does something: a person who is signed in, a customer by a link, or the program itself. */
export interface Actor {
  id: number | null;
  name: string;
  role: 'owner' | 'maker' | 'bookkeeper' | 'customer' | 'program';
}

export const theProgram: Actor = { id: null, name: 'Hidewright', role: 'program' };

/** One use case under way: everything it writes commits together or not at all. */
export interface Work {
  em: EntityManager;
  actor: Actor;
  /** The instant of this use case, the same throughout. */
  now: Date;
  /** The shop's calendar day, YYYY-MM-DD. */
  today: string;
}

/** Runs a use case in one IMMEDIATE transaction. Inside it only SQL. */
export async function inTransaction<T>(
  context: Context,
  actor: Actor,
  useCase: (work: Work) => Promise<T>,
): Promise<T> {
  return context.orm.em.fork().transactional(async (em) => {
    const workshop = await em.findOne(Workshop, 1);
    return useCase(workOn(context, em, actor, workshop?.timeZone));
  });
}

/** A use case that only reads, on its own identity map. */
export async function reading<T>(
  context: Context,
  actor: Actor,
  useCase: (work: Work) => Promise<T>,
): Promise<T> {
  const em = context.orm.em.fork();
  // Most that only reads has no use for the rest of the shop's values.
  const [shop] = await em.execute<{ zone: string }[]>(
    'SELECT time_zone AS zone FROM workshop WHERE id = 1',
  );
  return useCase(workOn(context, em, actor, shop?.zone));
}

function workOn(
  { clock }: Context,
  em: EntityManager,
  actor: Actor,
  timeZone: string | undefined,
): Work {
  const now = clock.now();
  return { em, actor, now, today: dayIn(timeZone ?? 'UTC', now) };
}
