import { z } from 'zod';
import { endpoint } from './endpoint.ts';
import { areaMm2, id, idParams, lengthBetween, line, version } from './fields.ts';

const side = (word: string) => lengthBetween(word, 1, 20_000);

const typed = {
  name: line(60, 'Enter a name, such as Clicker by the window.'),
  bedWidthMm: side('width of the bed'),
  bedDepthMm: side('depth of the bed'),
  /** From the column to the front edge; null where the press is open on both sides. */
  throatMm: side('throat').nullable(),
  shutHeightMm: side('shut height').nullable(),
  /** Millimetres of cutting edge that one strike manages, as the owner has found. */
  ruleMm: lengthBetween('cutting edge that it manages', 1, 100_000).nullable(),
  /** Area of relief that one strike manages, as the owner has found. */
  reliefAreaMm2: areaMm2
    .refine((text) => Number(text) > 0, 'Enter how much relief it manages, or leave it empty.')
    .nullable(),
};

export const press = z
  .object({
    id,
    name: z.string(),
    bedWidthMm: z.string(),
    bedDepthMm: z.string(),
    throatMm: z.string().nullable(),
    shutHeightMm: z.string().nullable(),
    ruleMm: z.string().nullable(),
    reliefAreaMm2: z.string().nullable(),
    active: z.boolean(),
    version,
  })
  .meta({ id: 'Press' });
export type PressReply = z.infer<typeof press>;

const readers = ['owner', 'maker'] as const;

export const listPresses = endpoint({
  method: 'GET',
  path: '/presses',
  summary: 'The presses, by name',
  access: readers,
  reply: z.object({ items: z.array(press) }),
});

export const readPress = endpoint({
  method: 'GET',
  path: '/presses/{id}',
  summary: 'One press',
  access: readers,
  params: idParams,
  reply: press,
});

export const addPress = endpoint({
  method: 'POST',
  path: '/presses',
  summary: 'Add a press, with what its bed takes and what one strike manages',
  access: ['owner'],
  creates: true,
  body: z.strictObject(typed),
  reply: press,
});

export const changePress = endpoint({
  method: 'PATCH',
  path: '/presses/{id}',
  summary: 'Change a press',
  access: ['owner'],
  edits: true,
  params: idParams,
  body: z.strictObject({ ...typed, active: z.boolean() }).partial(),
  reply: press,
});
