import type { Quote } from '@hidewright/contract';
import type { BreakNumbers } from '@hidewright/domain';
import { Card } from '../../../components/card.tsx';
import { KeyFigures, type KeyFigure } from '../../../components/key-figures.tsx';
import { LayoutPicture } from '../../../components/layout-picture.tsx';
import { countText, percentText } from '../../../lib/formatting.ts';
import { rowFigures } from '../../../components/row-figures.ts';
import { useWorkshop } from '../../../lib/workshop.tsx';

type Layout = Quote['layout'];

interface LayoutCardProps {
  layout: Layout;
  outlinePath: string | null;
  patternName: string;
  /** The rung that the page is about, where its numbers may be seen. */
  rung?: BreakNumbers | undefined;
}

/** How the pieces lie: looked at before any number is read. */
export function LayoutCard({ layout, outlinePath, patternName, rung }: LayoutCardProps) {
  const { container } = layout;
  const heightMm = container.form === 'panel' ? container.heightMm : container.widthMm;
  const widthMm =
    container.form === 'panel' ? container.widthMm : (container.lengthMm ?? layout.period?.mm ?? 0);
  return (
    <Card title="Layout" subtitle={inWords(layout)}>
      {outlinePath === null || layout.by === 'hand count' ? (
        <p className="mb-4 rounded bg-panel/40 px-4 py-8 text-center">
          Counted by hand, so there is no picture.
        </p>
      ) : (
        <LayoutPicture
          className="mb-5"
          title={`Layout of ${patternName}`}
          outlinePath={outlinePath}
          placements={layout.placements}
          widthMm={widthMm}
          heightMm={heightMm}
          offcut={layout.offcut}
          allowance={rung ? allowanceOf(rung, layout) : 0}
        />
      )}
      <Figures layout={layout} rung={rung} />
    </Card>
  );
}

function Figures({ layout, rung }: Pick<LayoutCardProps, 'layout' | 'rung'>) {
  const { lengthUnit } = useWorkshop();
  const { form } = layout.container;
  const figures: KeyFigure[] = [];
  if (rung) {
    const noun = rung.containers === 1 ? form : `${form}s`;
    figures.push({
      word: `cut for ${countText(rung.quantity)}`,
      figure: countText(rung.cutCount),
      note: `${countText(rung.containers)} ${noun}${layout.placements.length > 0 ? ', hatched: allowed for' : ''}`,
    });
  }
  if (layout.yieldPercent !== null) {
    figures.push({
      word: 'yield',
      figure: percentText(layout.yieldPercent),
      note:
        layout.boundPieces === null
          ? undefined
          : `at most ${countText(layout.boundPieces)} could fit`,
    });
  }
  figures.push(...rowFigures(layout, lengthUnit));
  return <KeyFigures figures={figures} />;
}

/** The pieces of one panel that the rejects will cost, so that enough good ones remain. */
function allowanceOf({ cutCount, quantity, containers }: BreakNumbers, layout: Layout): number {
  return Math.min(layout.pieces, Math.ceil((cutCount - quantity) / containers));
}

const turns = {
  none: '',
  'every other row': ', rows turned in turn',
  'every other piece': ', pieces turned in turn',
};

function inWords({ pieces, container, by, turned }: Layout): string {
  const how = {
    rows: turns[turned],
    'best found': ', as many as could be found',
    'hand count': ', counted by hand',
  }[by];
  return `${countText(pieces)} from a ${container.form}${how}`;
}
