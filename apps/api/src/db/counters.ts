import type { EntityManager } from '@mikro-orm/sqlite';

/** Invoices, jobs, orders, orders to suppliers, quotes, and the tags of lots. */
export const numberLetters = ['I', 'J', 'O', 'P', 'Q', 'T'] as const;
type NumberLetter = (typeof numberLetters)[number];

/** The next number of a kind of paper, gapless because it is drawn in the transaction that uses it. */
export async function drawNumber(em: EntityManager, name: string): Promise<number> {
  const [row] = await em.execute<{ drawn: number }[]>(
    `INSERT INTO counter (name, next) VALUES (?, 2)
    ON CONFLICT (name) DO UPDATE SET next = next + 1 RETURNING next - 1 AS drawn`,
    [name],
  );
  if (row === undefined) throw new TypeError('A counter always gives a number');
  return row.drawn;
}

/** A paper's number as people read it: Q-0241. */
export async function drawPaperNumber(em: EntityManager, letter: NumberLetter): Promise<string> {
  return `${letter}-${String(await drawNumber(em, letter)).padStart(4, '0')}`;
}
