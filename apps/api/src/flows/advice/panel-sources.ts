import { largestOffcut, placedRing, type Layout, type Outline } from '@hidewright/domain';
import type { LayoutAsked } from '@hidewright/contract';
import type { Context } from '../../context.ts';
import { layoutFor } from '../../modules/layouts/stored-layouts.ts';
import type { AdvisedSource, Note } from './advised-source.ts';
import type { Price } from './price-of-area.ts';

interface Panel {
  widthMm: string;
  heightMm: string;
  price: string | null;
}

/** Each panel on offer with the pieces that it gives and what is left of the last one. */
export async function panelSources(
  context: Context,
  asked: LayoutAsked,
  outline: Outline,
  panels: readonly Panel[],
  priceOf: Price,
  note: Note,
): Promise<AdvisedSource[]> {
  return Promise.all(
    panels.map(async ({ widthMm, heightMm, price }, at) => {
      const container = { form: 'panel' as const, widthMm, heightMm };
      const { layout } = note(await layoutFor(context, { ...asked, container }));
      return {
        source: {
          key: `panel ${at}`,
          pieces: layout.pieces,
          areaMm2: layout.containerAreaMm2,
          price: price ?? priceOf(layout.containerAreaMm2),
          available: null,
        },
        shown: {
          kind: 'panel',
          widthMm,
          heightMm,
          lotId: null,
          tag: null,
          stripsMm: null,
          estimated: false,
        },
        periodMm: null,
        offcutAfter: (pieces) => offcutOf(outline, layout, pieces),
      };
    }),
  );
}

function offcutOf(outline: Outline, { container, placements }: Layout, pieces: number) {
  if (container.form !== 'panel') return null;
  const { widthMm: width, heightMm: height } = container;
  const edge = [
    { x: 0, y: 0 },
    { x: width, y: 0 },
    { x: width, y: height },
    { x: 0, y: height },
  ];
  const taken = placements.slice(0, pieces).map((placement) => placedRing(outline, placement));
  const found = largestOffcut(edge, taken, 40);
  return found && { widthMm: found.widthMm.toFixed(0), heightMm: found.heightMm.toFixed(0) };
}
