import type { PatternDefinition } from '@hidewright/contract';
import { Exact, toAtMost, toPlaces, type SideInput } from '@hidewright/domain';
import type { Context } from '../../context.ts';
import { Lot } from '../../modules/lots/lot.entity.ts';
import { sideLayoutFor } from '../../modules/layouts/stored-layouts.ts';
import { freeLotsOf } from '../check/leather-for-check.ts';
import { sideInputOf } from '../lay-on-lot.ts';
import type { PressReach } from '../press-reach.ts';
import type { AdvisedSource, Note } from './advised-source.ts';

/**
 * Each lot on the rack that gives a piece, and how many: laid out where it is drawn, whole and, where no press takes
 * it whole, in strips; otherwise reckoned from what is free of it, its usable share and the leather that each piece
 * takes.
 * @param areaPerPieceMm2 in the middle of a good layout; null where none is known
 */
export async function lotSources(
  context: Context,
  definition: PatternDefinition,
  reach: PressReach,
  areaPerPieceMm2: number | null,
  note: Note,
): Promise<AdvisedSource[]> {
  const em = context.orm.em.fork();
  const free = await freeLotsOf(em, definition.leatherId);
  const lots = await em.find(Lot, { id: { $in: free.map(({ lotId }) => lotId) } });
  const sources = await Promise.all(
    free.map(async ({ lotId, freeAreaMm2 }) => {
      const lot = lots.find(({ id }) => id === lotId);
      if (!lot) return [];
      const input = sideInputOf(lot, definition);
      const known =
        typeof input === 'string'
          ? [{ whole: usablePieces(lot, areaPerPieceMm2), drawn: false, stripsMm: null }]
          : await Promise.all(waysFor(input, reach).map((way) => laidOn(context, way, note)));
      return known.map((each) => sourceOf(lot, freeAreaMm2, each));
    }),
  );
  return sources.flat().filter(({ source }) => source.pieces > 0);
}

const waysFor = (input: SideInput, { takesWhole, widestStripMm }: PressReach): SideInput[] => [
  { ...input, search: 'rows' },
  ...(takesWhole(input.side) ? [] : [{ ...input, widestMm: widestStripMm }]),
];

async function laidOn(context: Context, input: SideInput, note: Note): Promise<Known> {
  const { layout } = note(await sideLayoutFor(context, input));
  return { whole: layout.pieces, drawn: true, stripsMm: input.widestMm ?? null };
}

/** What the whole lot gives, and how that is known. */
interface Known {
  whole: number;
  drawn: boolean;
  stripsMm: number | null;
}

function sourceOf(lot: Lot, freeAreaMm2: string, { whole, drawn, stripsMm }: Known): AdvisedSource {
  const share = new Exact(freeAreaMm2).div(lot.measuredAreaMm2.toString());
  return {
    source: {
      key: `lot ${lot.id}${stripsMm === null ? '' : ' in strips'}`,
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
      stripsMm: stripsMm === null ? null : String(stripsMm),
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
