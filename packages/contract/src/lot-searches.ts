import { z } from 'zod';
import { endpoint } from './endpoint.ts';
import { choice, idParams } from './fields.ts';
import { lotLayout } from './lots.ts';

/** A search for the most pieces: it goes on by itself, tells how far it is, and can be stopped. */
export const lotSearch = z
  .object({
    /** Tells nothing; whoever asks must be signed in all the same. */
    id: z.string().meta({ example: 'kq2Zt0mJw5nT3c8YxL1pVg' }),
    state: z.enum(['looking', 'done', 'stopped', 'refused']),
    /** The share of its tries that is behind it, 0 to 1. */
    done: z.number().min(0).max(1),
    /** The most found so far; null until there is a first layout. */
    pieces: z.int().min(0).nullable(),
    /** Once it has ended: the layout found, or as far as it was found. */
    layout: lotLayout.nullable(),
    /** Why there is none. */
    refusal: z.string().nullable(),
  })
  .meta({ id: 'LotSearch' });
export type LotSearch = z.infer<typeof lotSearch>;

const access = ['owner', 'maker'] as const;
const searchParams = z.strictObject({ id: z.string().regex(/^[\w-]{22}$/) });

export const startLotSearch = endpoint({
  method: 'POST',
  path: '/lots/{id}/searches',
  summary: 'Look for the most pieces of a pattern on a drawn lot, or join those who look already',
  access,
  starts: true,
  params: idParams,
  body: z.strictObject({ patternId: choice('Choose a pattern.') }),
  reply: lotSearch,
});

export const readLotSearch = endpoint({
  method: 'GET',
  path: '/searches/{id}',
  summary: 'How far a search is, or what it found; it is kept for some minutes',
  access,
  params: searchParams,
  reply: lotSearch,
});

export const stopLotSearch = endpoint({
  method: 'DELETE',
  path: '/searches/{id}',
  summary: 'Stop a search: what was found so far is its answer',
  access,
  params: searchParams,
  reply: lotSearch,
});
