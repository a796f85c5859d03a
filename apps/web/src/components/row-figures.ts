import type { LayoutReply } from '@hidewright/contract';
import { countText, lengthText, sizeText } from '../lib/formatting.ts';
import type { Workshop } from '../lib/workshop.tsx';
import type { KeyFigure } from './key-figures.tsx';

type Rows = Pick<
  LayoutReply,
  'pitchMm' | 'rowStepMm' | 'shiftMm' | 'rows' | 'piecesPerRow' | 'period' | 'offcut'
>;

/** The numbers by which a hand places the die: pitch, row step, shift, rows, the pull of a strip; and what is left. */
export function rowFigures(layout: Rows, unit: Workshop['lengthUnit']): KeyFigure[] {
  const mm = (value: number) => lengthText(value.toFixed(4), unit, unit === 'mm' ? 1 : 3);
  const { pitchMm, rowStepMm, shiftMm, rows, piecesPerRow, period, offcut } = layout;
  const figures: (KeyFigure | false)[] = [
    pitchMm !== null &&
      rowStepMm !== null && {
        word: 'pitch · row step',
        figure: `${mm(pitchMm)} · ${mm(rowStepMm)}`,
        note: shiftMm !== null && shiftMm > 0.05 ? `each row shifted by ${mm(shiftMm)}` : undefined,
      },
    rows !== null &&
      piecesPerRow !== null &&
      rows > 0 && {
        word: 'rows',
        figure: countText(rows),
        note: `of up to ${countText(piecesPerRow)}`,
      },
    offcut !== null && {
      word: 'goes back',
      figure: sizeText(offcut.widthMm.toFixed(0), offcut.heightMm.toFixed(0), unit),
      note: 'the largest piece left, dashed',
    },
    period !== null && {
      word: 'pull the strip',
      figure: mm(period.mm),
      note: `for every ${countText(period.pieces)}`,
    },
  ];
  return figures.filter((figure) => figure !== false);
}
