import type { Session } from '@hidewright/contract';
import { minorDigits } from '@hidewright/domain';
import type { Context } from '../../context.ts';
import { dayIn } from '../../day-in.ts';
import { Person } from '../people/person.entity.ts';
import { Workshop } from '../workshop/workshop.entity.ts';

export async function describeSession(
  context: Context,
  person: Express.User | undefined,
): Promise<Session> {
  const em = context.orm.em.fork();
  const workshop = await em.findOne(Workshop, 1);
  return {
    person:
      person === undefined ? null : { name: person.name, email: person.email, role: person.role },
    mode: context.config.mode,
    firstRun: (await em.count(Person)) === 0,
    workshop: workshop === null ? null : inWords(workshop, context),
    mailboxUrl: context.config.mailboxUrl ?? null,
  };
}

function inWords(workshop: Workshop, context: Context): NonNullable<Session['workshop']> {
  return {
    name: workshop.name,
    currency: workshop.currency,
    minorDigits: minorDigits(workshop.currency),
    areaUnit: workshop.areaUnit,
    areaShown: workshop.areaShown,
    lengthUnit: workshop.lengthUnit,
    timeZone: workshop.timeZone,
    today: dayIn(workshop.timeZone, context.clock.now()),
  };
}
