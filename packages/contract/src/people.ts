import { z } from 'zod';
import { endpoint } from './endpoint.ts';
import { email, id, idParams, line, money, version } from './fields.ts';
import { newPassword, role } from './session.ts';

export const person = z
  .object({
    id,
    name: z.string(),
    email: z.string(),
    role,
    active: z.boolean(),
    /** What an hour of theirs is paid; null where it is the shop's wage. */
    wagePerHour: z.string().nullable(),
    version,
  })
  .meta({ id: 'Person' });
export type Person = z.infer<typeof person>;

const typed = { name: line(80, 'Enter a name.'), email, role, password: newPassword };

export const listPeople = endpoint({
  method: 'GET',
  path: '/people',
  summary: 'Who signs in',
  access: ['owner'],
  reply: z.object({ items: z.array(person) }),
});

export const addPerson = endpoint({
  method: 'POST',
  path: '/people',
  summary: 'Let somebody sign in',
  access: ['owner'],
  creates: true,
  body: z.strictObject(typed),
  reply: person,
});

export const changePerson = endpoint({
  method: 'PATCH',
  path: '/people/{id}',
  summary: 'Change somebody’s name, role or password, or end their access',
  access: ['owner'],
  edits: true,
  params: idParams,
  body: z.strictObject({ ...typed, active: z.boolean(), wagePerHour: money.nullable() }).partial(),
  reply: person,
});
