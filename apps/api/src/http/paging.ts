import { Problem } from './problem.ts';

interface Page<T> {
  items: T[];
  next: string | null;
}

/** The id to continue below, from a cursor that an earlier page handed out. */
export function readCursor(cursor: string | undefined): number | undefined {
  if (cursor === undefined) return undefined;
  const id = Number(Buffer.from(cursor, 'base64url').toString('utf8'));
  if (!Number.isSafeInteger(id) || id < 1) {
    throw new Problem(
      400,
      'Not a cursor',
      'This page of the list cannot be found. Start from its first page.',
    );
  }
  return id;
}

/** Cuts a list read with one row too many into a page, newest (highest id) first. */
export function toPage<T>(rows: T[], limit: number, idOf: (row: T) => number): Page<T> {
  const items = rows.slice(0, limit);
  const last = items.at(-1);
  const more = rows.length > limit && last !== undefined;
  return { items, next: more ? Buffer.from(String(idOf(last))).toString('base64url') : null };
}
