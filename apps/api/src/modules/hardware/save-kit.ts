import type { BodyOf, changeHardware } from '@hidewright/contract';
import type { EntityManager } from '@mikro-orm/sqlite';
import { invalid } from '../../http/problem.ts';
import type { Work } from '../../work.ts';
import { StockBalance } from '../stock/stock-balance.entity.ts';
import { Hardware } from './hardware.entity.ts';
import { KitPart } from './kit-part.entity.ts';

type Parts = NonNullable<BodyOf<typeof changeHardware>['parts']>;

/**
 * Makes a hardware a kit of these parts, or with none no kit. One level deep: no part is a kit, and no kit is a part.
 * @throws {Problem} 422 naming the part
 */
export async function saveParts(work: Work, kit: Hardware, parts: Parts): Promise<void> {
  const { em } = work;
  if (parts.length > 0) {
    await requireNoStock(em, kit);
    await requireNoPart(em, kit);
    for (const [at, part] of parts.entries()) await requirePart(em, kit, parts, part, at);
  }
  await em.nativeDelete(KitPart, { kitId: kit.id });
  for (const part of parts) em.create(KitPart, { ...part, kitId: kit.id });
  await em.flush();
}

/** What a kit has lies in its parts: a shelf of its own would be counted twice. */
async function requireNoStock(em: EntityManager, kit: Hardware): Promise<void> {
  const own = await em.findOne(StockBalance, { hardwareId: kit.id });
  if (own === null || (own.onHand === 0 && own.reserved === 0)) return;
  const message =
    own.reserved > 0
      ? `${own.reserved} of ${kit.name} are held for jobs. Let the jobs take them first, or add the kit under another name.`
      : `${own.onHand} of ${kit.name} are on the shelf. Adjust it to 0 first: a kit is counted by its parts.`;
  throw invalid([{ field: 'parts', message }]);
}

async function requireNoPart(em: EntityManager, kit: Hardware): Promise<void> {
  const use = await em.findOne(KitPart, { hardwareId: kit.id });
  if (use === null) return;
  const { name } = await em.findOneOrFail(Hardware, use.kitId);
  const message = `${kit.name} is a part of ${name}, and a part cannot be a kit. Take it out of ${name} first.`;
  throw invalid([{ field: 'parts', message }]);
}

async function requirePart(
  em: EntityManager,
  kit: Hardware,
  parts: Parts,
  { hardwareId }: Parts[number],
  at: number,
): Promise<void> {
  const wrong = (message: string) => invalid([{ field: `parts.${at}.hardwareId`, message }]);
  const part = await em.findOne(Hardware, hardwareId);
  if (part === null) throw wrong('Choose a part from the list.');
  if (part.id === kit.id) throw wrong('A kit cannot be a part of itself. Choose another part.');
  if (parts.findIndex((each) => each.hardwareId === hardwareId) !== at)
    throw wrong('This part is listed already. Enter all of it on one line.');
  if ((await em.findOne(KitPart, { kitId: hardwareId })) !== null)
    throw wrong(`${part.name} is a kit itself. Choose its parts instead.`);
}
