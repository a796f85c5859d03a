import { mixedWith, type LotMix, type LotOfOrder } from '@hidewright/domain';
import type { EntityManager } from '@mikro-orm/sqlite';
import { lineTo, readRelatives } from '../../modules/lots/read-lineage.ts';

interface Chosen {
  lotId: number;
  tag: string;
  shade: string;
  held: number;
  taken: number;
}

/** What would mix, for each lot that the job may take from, with those that it holds or has taken from. */
export async function mixesOf(
  em: EntityManager,
  lots: readonly Chosen[],
): Promise<Map<number, LotMix | null>> {
  const relatives = await readRelatives(
    em,
    lots.map(({ lotId }) => lotId),
  );
  const named = (lot: Chosen): LotOfOrder => ({
    lotId: lot.lotId,
    tag: lot.tag,
    shade: lot.shade,
    sideId: lineTo(relatives, lot.lotId)[0]?.lotId ?? lot.lotId,
  });
  const ofOrder = lots.filter(({ held, taken }) => held > 0 || taken > 0);
  return new Map(
    lots.map((lot) => {
      const others = ofOrder.filter(({ lotId }) => lotId !== lot.lotId);
      return [lot.lotId, mixedWith(named(lot), others.map(named))];
    }),
  );
}
