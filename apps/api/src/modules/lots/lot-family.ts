import type { CutFrom, LotFamily } from '@hidewright/contract';
import type { EntityManager } from '@mikro-orm/sqlite';
import { notFound } from '../../http/problem.ts';
import { lineTo, memberOf, readRelatives } from './read-lineage.ts';
import { readUses } from './read-uses.ts';

/** @throws {Problem} 404 */
export async function readFamily(em: EntityManager, lotId: number): Promise<LotFamily> {
  const relatives = await readRelatives(em, [lotId]);
  const [head] = lineTo(relatives, lotId);
  if (head === undefined) throw notFound('lot');
  const lots = [...relatives.values()];
  const below = lots.filter((lot) =>
    lineTo(relatives, lot.lotId).some((each) => each.lotId === lotId),
  );
  return {
    origin: head.origin,
    lots: lots.map(memberOf),
    wentInto: await readUses(em, { lotIds: below.map((lot) => lot.lotId) }),
  };
}

/** What an order was cut from, back to the side that came in. */
export async function readCutFrom(em: EntityManager, orderId: number): Promise<CutFrom[]> {
  const uses = await readUses(em, { orderId });
  const relatives = await readRelatives(
    em,
    uses.map(({ lotId }) => lotId),
  );
  return uses.flatMap(({ lotId, areaMm2 }) => {
    const chain = lineTo(relatives, lotId);
    const [head] = chain;
    return head ? [{ lotId, areaMm2, chain: chain.map(memberOf), origin: head.origin }] : [];
  });
}
