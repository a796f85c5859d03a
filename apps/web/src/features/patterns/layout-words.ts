import type { LayoutReply } from '@hidewright/contract';
import type { KeyFigure } from '../../components/key-figures.tsx';
import { rowFigures } from '../../components/row-figures.ts';
import { areaText, countText, lengthText, percentText, sizeText } from '../../lib/formatting.ts';
import type { Workshop } from '../../lib/workshop.tsx';

type Units = Pick<Workshop, 'areaUnit' | 'lengthUnit'>;

const turnedWords = {
  none: 'all the same way round',
  'every other row': 'every other row turned',
  'every other piece': 'every other piece turned',
};

/** "26 from a panel" */
export function piecesWords(pieces: number, form: 'panel' | 'strip'): string {
  return `${countText(pieces)} from a ${form}`;
}

/** How the pieces lie, in a few words. */
export function layoutSubtitle(layout: LayoutReply): string {
  if (layout.pieces === 0) return `nothing from a ${layout.container.form}`;
  const how = {
    rows: turnedWords[layout.turned],
    'best found': 'as many as could be found',
    'hand count': 'counted by hand',
  }[layout.by];
  return `${piecesWords(layout.pieces, layout.container.form)}, ${how}`;
}

/** The figures that a person reads after the picture. */
export function layoutFigures(layout: LayoutReply, { areaUnit, lengthUnit }: Units): KeyFigure[] {
  const mm = (value: number) =>
    lengthText(value.toFixed(4), lengthUnit, lengthUnit === 'mm' ? 1 : 3);
  const figures: (KeyFigure | false)[] = [
    layout.by === 'hand count' &&
      layout.container.form === 'panel' && {
        word: 'panel',
        figure: sizeText(
          String(layout.container.widthMm),
          String(layout.container.heightMm),
          lengthUnit,
        ),
      },
    layout.yieldPercent !== null && {
      word: 'yield',
      figure: percentText(layout.yieldPercent),
      note:
        layout.boundPieces !== null && `no layout gives more than ${countText(layout.boundPieces)}`,
    },
    layout.piecesInRows !== null && {
      word: 'rows would give',
      figure: countText(layout.piecesInRows),
      note: `${countText(layout.pieces - layout.piecesInRows)} fewer`,
    },
    layout.wasteBetweenPercent !== null && {
      word: 'waste between pieces',
      figure: percentText(layout.wasteBetweenPercent),
      note:
        layout.edgeWastePercent !== null &&
        `and ${percentText(layout.edgeWastePercent)} along the edges`,
    },
    layout.areaPerPieceMm2 !== null && {
      word: 'leather for each piece',
      figure: areaText(layout.areaPerPieceMm2, areaUnit, 4),
      note: 'waste included',
    },
    layout.mmPerPiece !== null && {
      word: 'strip for each piece',
      figure: mm(layout.mmPerPiece),
      note: 'in the middle of a long strip',
    },
  ];
  return [...figures.filter((figure) => figure !== false), ...rowFigures(layout, lengthUnit)];
}
