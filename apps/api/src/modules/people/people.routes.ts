import { Router } from 'express';
import {
  addPerson,
  changePerson,
  listPeople,
  type Person as PersonReply,
} from '@hidewright/contract';
import type { Context } from '../../context.ts';
import { assignDefined } from '../../db/assign-defined.ts';
import { decimals } from '../../db/decimals.ts';
import { requireVersion } from '../../http/conditions.ts';
import { moneyText } from '../../http/decimal-text.ts';
import { invalid, notFound } from '../../http/problem.ts';
import { serve } from '../../http/serve.ts';
import type { Work } from '../../work.ts';
import { logDeed } from '../activity/activity-log.ts';
import { hashPassword } from './passwords.ts';
import { Person } from './person.entity.ts';
import { WebSession } from './web-session.entity.ts';

export function peopleRoutes(context: Context): Router {
  const router = Router();

  serve(router, context, listPeople, async ({ em }) => {
    const people = await em.findAll(Person, { orderBy: { id: 'asc' } });
    return { items: people.map(toReply) };
  });

  serve(
    router,
    context,
    addPerson,
    async (work, { body }, passwordHash: string) => {
      await requireFreeEmail(work, body.email);
      const { name, role } = body;
      const email = body.email.toLowerCase();
      const person = work.em.create(Person, {
        name,
        role,
        email,
        passwordHash,
        createdAt: work.now.toISOString(),
      });
      await work.em.flush();
      await logDeed(work, {
        action: `let ${name} sign in as ${role}`,
        subjectKind: 'person',
        subjectId: person.id,
      });
      return toReply(person);
    },
    ({ body }) => hashPassword(body.password),
  );

  serve(
    router,
    context,
    changePerson,
    async (work, { params, body, ifMatch }, passwordHash: string | undefined) => {
      const person = await work.em.findOne(Person, params.id);
      if (person === null) throw notFound('person');
      await requireVersion(
        work.em,
        { kind: 'person', id: person.id, version: person.version },
        ifMatch,
      );
      if (body.email !== undefined && body.email.toLowerCase() !== person.email)
        await requireFreeEmail(work, body.email);
      const { name, role, active, wagePerHour } = body;
      assignDefined(person, {
        ...{ name, role, active, passwordHash },
        email: body.email?.toLowerCase(),
        ...decimals({ wagePerHour }),
      });
      await work.em.flush();
      await requireAnOwner(work);
      if (passwordHash !== undefined || active === false)
        await work.em.nativeDelete(WebSession, { personId: person.id });
      await logDeed(work, {
        action: `changed how ${person.name} signs in`,
        subjectKind: 'person',
        subjectId: person.id,
        detail: { changed: Object.keys(body) },
      });
      return toReply(person);
    },
    async ({ body }) => (body.password === undefined ? undefined : hashPassword(body.password)),
  );

  return router;
}

async function requireFreeEmail(work: Work, email: string): Promise<void> {
  if ((await work.em.count(Person, { email: email.toLowerCase() })) > 0) {
    throw invalid([
      {
        field: 'email',
        message: 'Somebody signs in with this e-mail address already. Use another one.',
      },
    ]);
  }
}

/** Nobody may lock the shop out of its own office. */
async function requireAnOwner(work: Work): Promise<void> {
  if ((await work.em.count(Person, { role: 'owner', active: true })) === 0) {
    throw invalid([{ field: 'role', message: 'Keep at least one owner who can sign in.' }]);
  }
}

function toReply(person: Person): PersonReply {
  const { id, name, email, role, active, wagePerHour, version } = person;
  return {
    ...{ id, name, email, role, active, version },
    wagePerHour: wagePerHour === null ? null : moneyText(wagePerHour),
  };
}
