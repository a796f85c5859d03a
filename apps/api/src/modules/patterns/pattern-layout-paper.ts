import { outlinePath, type Layout } from '@hidewright/domain';
import { outlineOf, type PatternDefinition } from '@hidewright/contract';
import { Problem } from '../../http/problem.ts';
import type { LayoutPaper } from '../../papers/layout-pdf.ts';

interface Laid {
  shopName: string;
  patternName: string;
  definition: PatternDefinition;
  layout: Layout;
  day: string;
}

/**
 * What goes on the sheet that hangs beside the press.
 * @throws {Problem} 404 for a hand count, which has no picture
 */
export function layoutPaperOf({
  shopName,
  patternName,
  definition,
  layout,
  day,
}: Laid): LayoutPaper {
  const { container } = layout;
  if (definition.outline === null || layout.by === 'hand count') throw countedByHand();
  const [widthMm, heightMm] =
    container.form === 'panel'
      ? [container.widthMm, container.heightMm]
      : [container.lengthMm ?? 0, container.widthMm];
  const turned = layout.turned === 'none' ? 'all the same way round' : `${layout.turned} turned`;
  return {
    shopName,
    patternName,
    about: `${layout.pieces} from a ${container.form}, ${turned}`,
    day,
    outlinePath: outlinePath(outlineOf(definition.outline)),
    placements: layout.placements,
    widthMm,
    heightMm,
    figures: figuresOf(layout, definition),
  };
}

function figuresOf(layout: Layout, { spacingMm, trimMm }: PatternDefinition) {
  const { container } = layout;
  const size =
    container.form === 'panel'
      ? [container.widthMm, container.heightMm]
      : [container.lengthMm ?? 0, container.widthMm];
  const figure = (value: number | string) => String(Number(Number(value).toFixed(1)));
  const mm = (value: number | string) => `${figure(value)} mm`;
  const lines: [string, string | null][] = [
    [container.form, `${size.map(figure).join(' × ')} mm`],
    ['spacing', mm(spacingMm)],
    ['trim', mm(trimMm)],
    ['pitch', layout.pitchMm === null ? null : mm(layout.pitchMm)],
    ['row step', layout.rowStepMm === null ? null : mm(layout.rowStepMm)],
    ['each row shifted by', layout.shiftMm === null ? null : mm(layout.shiftMm)],
    ['yield', layout.yieldPercent === null ? null : `${layout.yieldPercent} %`],
    ['strip for each piece', layout.mmPerPiece === null ? null : mm(layout.mmPerPiece)],
  ];
  return lines.flatMap(([word, given]) => (given === null ? [] : [{ word, figure: given }]));
}

const countedByHand = () =>
  new Problem(
    404,
    'Not found',
    'This pattern is counted by hand, so there is no picture of its layout. Draw its outline first.',
  );
