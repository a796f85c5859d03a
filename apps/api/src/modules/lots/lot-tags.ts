import { hardwareOfBin } from '@hidewright/domain';
import type { EntityManager } from '@mikro-orm/sqlite';
import { drawPaperNumber, numberLetters } from '../../db/counters.ts';
import { invalid } from '../../http/problem.ts';

/** A scan reads one as the other, so no lot may look like a quote, an order, a job or an invoice. */
const paperNumber = new RegExp(
  `^[${numberLetters.filter((letter) => letter !== 'T').join('')}]-\\d+$`,
  'i',
);

/** @throws {Problem} 422 beside `field` when another lot, a bin or a paper goes by that tag, in whatever capitals */
export async function requireFreeTag(
  em: EntityManager,
  tag: string,
  field: string,
  id?: number,
): Promise<void> {
  const refuse = (message: string) => invalid([{ field, message }]);
  if (hardwareOfBin(tag) !== undefined)
    throw refuse(`Tags such as ${tag} are for bins. Choose another tag.`);
  if (paperNumber.test(tag))
    throw refuse(`Numbers such as ${tag} are for orders and other papers. Choose another tag.`);
  const other = await tagInUse(em, tag, id);
  if (other !== undefined)
    throw refuse(`The tag ${other} is on another lot already. Choose another tag.`);
}

/** The next tag that no lot has: a person may have written some of them by hand. */
export async function drawTag(em: EntityManager): Promise<string> {
  let tag = await drawPaperNumber(em, 'T');
  while ((await tagInUse(em, tag)) !== undefined) tag = await drawPaperNumber(em, 'T');
  return tag;
}

/** How it is written on a lot other than `id`; a scan does not tell capitals from small letters. */
async function tagInUse(em: EntityManager, tag: string, id = 0): Promise<string | undefined> {
  const [lot] = await em.execute<{ tag: string }[]>(
    'SELECT tag FROM lot WHERE tag = ? COLLATE NOCASE AND id <> ? LIMIT 1',
    [tag, id],
  );
  return lot?.tag;
}
