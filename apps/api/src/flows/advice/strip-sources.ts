import type { LayoutInput } from '@hidewright/domain';
import type { Context } from '../../context.ts';
import { stripLayoutFor } from '../../modules/layouts/stored-layouts.ts';
import type { AdvisedSource, Note } from './advised-source.ts';
import type { Price } from './price-of-area.ts';

const shownAtMost = 3;

/** Strips without an end, of several widths: the few that take the least leather for each piece. */
export async function stripSources(
  context: Pick<Context, 'orm' | 'workers'>,
  rules: Omit<LayoutInput, 'container'>,
  widths: readonly number[],
  priceOf: Price,
  note: Note,
): Promise<AdvisedSource[]> {
  const laid = await Promise.all(
    widths.map(async (widthMm) => {
      const container = { form: 'strip' as const, widthMm };
      return note(await stripLayoutFor(context, { ...rules, container })).layout;
    }),
  );
  return laid
    .flatMap(({ period, containerAreaMm2, container }) =>
      period === null ? [] : [stripSource(container.widthMm, period, containerAreaMm2, priceOf)],
    )
    .sort((a, b) => areaPerPiece(a) - areaPerPiece(b))
    .slice(0, shownAtMost);
}

export const areaPerPiece = ({ source }: AdvisedSource): number =>
  Number(source.areaMm2) / source.pieces;

function stripSource(
  widthMm: number,
  period: { mm: number; pieces: number },
  areaMm2: string,
  priceOf: Price,
): AdvisedSource {
  return {
    source: {
      key: `strip ${widthMm}`,
      pieces: period.pieces,
      areaMm2,
      price: priceOf(areaMm2),
      available: null,
    },
    shown: {
      kind: 'strip',
      widthMm: String(widthMm),
      heightMm: null,
      lotId: null,
      tag: null,
      stripsMm: null,
      estimated: false,
    },
    periodMm: period.mm,
    offcutAfter: null,
  };
}
