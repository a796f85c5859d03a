import type { PatternDefinition } from '@hidewright/contract';
import { Exact, toAtMost, toPlaces } from '@hidewright/domain';
import type { Context } from '../../context.ts';
import { Lot } from '../../modules/lots/lot.entity.ts';
import { sideLayoutFor } from '../../modules/layouts/stored-layouts.ts';
import { freeLotsOf } from '../check/leather-for-check.ts';
import { sideInputOf } from '../lay-on-lot.ts';
import type { AdvisedSource } from './advised-source.ts';

/**
 * Each lot on the rack that gives a piece, and how many: laid out where it is drawn, otherwise reckoned from what is
 * free of it, its usable share and the leather that each piece takes.
 * @param areaPerPieceMm2 in the middle of a good layout; null where none is known
 */
export async function lotSources(
  context: Context,
  definition: PatternDefinition,
  areaPerPieceMm2: number | null,
): Promise<AdvisedSource[]> {
  const em = context.orm.em.fork();
  const free = await freeLotsOf(em, definition.leatherId);
  const lots = await em.find(Lot, { id: { $in: free.map(({ lotId }) => lotId) } });
  const sources = await Promise.all(
    free.flatMap((each) => {
      const lot = lots.find(({ id }) => id === each.lotId);
      return lot ? [lotSource(context, lot, each.freeAreaMm2, definition, areaPerPieceMm2)] : [];
    }),
  );
  return sources.filter(({ source }) => source.pieces > 0);
}

async function lotSource(
  context: Context,
  lot: Lot,
  freeAreaMm2: string,
  definition: PatternDefinition,
  areaPerPieceMm2: number | null,
): Promise<AdvisedSource> {
  const share = new Exact(freeAreaMm2).div(lot.measuredAreaMm2.toString());
  const input = sideInputOf(lot, definition);
  const drawn = typeof input !== 'string';
  const whole = drawn
    ? (await sideLayoutFor(context, { ...input, search: 'rows' })).layout.pieces
    : usablePieces(lot, areaPerPieceMm2);
  return {
    source: {
      key: `lot ${lot.id}`,
      // What is gone of a side is not drawn, so its pieces go down in proportion.
      pieces: share.times(whole).floor().toNumber(),
      areaMm2: toAtMost(new Exact(freeAreaMm2), 3),
      price: toPlaces(share.times(lot.cost.toString()), 4),
      available: 1,
    },
    shown: {
      kind: 'lot',
      widthMm: null,
      heightMm: null,
      lotId: lot.id,
      tag: lot.tag,
      estimated: !drawn || share.lt(1),
    },
    periodMm: null,
    offcutAfter: null,
  };
}

function usablePieces({ measuredAreaMm2, usablePercent }: Lot, areaPerPieceMm2: number | null) {
  if (areaPerPieceMm2 === null) return 0;
  const usable = measuredAreaMm2.times(usablePercent).div(100);
  return usable.div(areaPerPieceMm2).floor().toNumber();
}
