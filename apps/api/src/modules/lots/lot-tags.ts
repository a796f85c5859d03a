import { hardwareOfBin } from '@hidewright/domain';
import type { EntityManager } from '@mikro-orm/sqlite';
import { drawPaperNumber } from '../../db/counters.ts';
import { invalid } from '../../http/problem.ts';
import { Lot } from './lot.entity.ts';

/** @throws {Problem} 422 beside `field` when another lot or a bin goes by that tag */
export async function requireFreeTag(
  em: EntityManager,
  tag: string,
  field: string,
  id?: number,
): Promise<void> {
  if (hardwareOfBin(tag) !== undefined) {
    throw invalid([{ field, message: `Tags such as ${tag} are for bins. Choose another tag.` }]);
  }
  const lot = await em.findOne(Lot, { tag });
  if (lot === null || lot.id === id) return;
  throw invalid([
    { field, message: `The tag ${tag} is on another lot already. Choose another tag.` },
  ]);
}

/** The next tag that no lot has: a person may have written some of them by hand. */
export async function drawTag(em: EntityManager): Promise<string> {
  let tag = await drawPaperNumber(em, 'T');
  while ((await em.count(Lot, { tag })) > 0) tag = await drawPaperNumber(em, 'T');
  return tag;
}
