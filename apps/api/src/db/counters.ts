import type { EntityManager } from '@mikro-orm/sqlite';
import { Counter } from './counter.entity.ts';

/** The next number of a kind of paper, gapless because it is drawn in the transaction that uses it. */
export async function drawNumber(em: EntityManager, name: string): Promise<number> {
  const counter = (await em.findOne(Counter, { name })) ?? em.create(Counter, { name, next: 1 });
  const drawn = counter.next;
  counter.next = drawn + 1;
  await em.persistAndFlush(counter);
  return drawn;
}

/** A paper's number as people read it: Q-0241. */
export async function drawPaperNumber(em: EntityManager, letter: string): Promise<string> {
  return `${letter}-${String(await drawNumber(em, letter)).padStart(4, '0')}`;
}
