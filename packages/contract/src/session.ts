import { z } from 'zod';
import { endpoint, roles } from './endpoint.ts';
import { email, line } from './fields.ts';

export const role = z.enum(roles);

export const signedIn = z
  .object({ name: z.string(), email: z.string(), role })
  .meta({ id: 'SignedIn' });
export type SignedIn = z.infer<typeof signedIn>;

export const session = z
  .object({
    /** Nobody, while nobody is signed in. */
    person: signedIn.nullable(),
    mode: z.enum(['demo', 'shop']),
    /** True while a new shop has no owner yet. */
    firstRun: z.boolean(),
    workshop: z
      .object({
        name: z.string(),
        currency: z.string(),
        minorDigits: z.int(),
        areaUnit: z.enum(['ft2', 'dm2', 'm2']),
        areaShown: z.enum(['tenth', 'quarter']),
        lengthUnit: z.enum(['mm', 'in']),
        timeZone: z.string(),
        today: z.string(),
      })
      .nullable(),
    /** Where the stand-in mailbox can be read, in demo mode. */
    mailboxUrl: z.string().nullable(),
  })
  .meta({ id: 'Session' });
export type Session = z.infer<typeof session>;

/** Spaces and any character count; length is what protects. */
export const newPassword = z
  .string()
  .min(15, 'Use at least 15 characters; a few words in a row are easy to remember.')
  .max(200, 'Keep it to 200 characters.');

export const readSession = endpoint({
  method: 'GET',
  path: '/session',
  summary: 'Who is signed in, and where',
  access: 'anyone',
  reply: session,
});

export const signIn = endpoint({
  method: 'POST',
  path: '/session',
  summary: 'Sign in',
  access: 'anyone',
  body: z.strictObject({
    email: z.string().trim().min(1, 'Enter your e-mail address.').max(254),
    password: z.string().min(1, 'Enter your password.').max(500),
  }),
  reply: session,
});

export const signOut = endpoint({
  method: 'DELETE',
  path: '/session',
  summary: 'Sign out',
  access: 'anyone',
  reply: session,
});

export const openShop = endpoint({
  method: 'POST',
  path: '/first-run',
  summary: 'Open a new shop: its name and its owner',
  access: 'anyone',
  body: z.strictObject({
    workshopName: line(80, 'Enter the name of the shop.'),
    ownerName: line(80, 'Enter your name.'),
    email,
    password: newPassword,
  }),
  reply: session,
});
