import type { Job } from '@hidewright/contract';
import { Card } from '../../../components/card.tsx';
import { KeyFigures } from '../../../components/key-figures.tsx';
import { rowFigures } from '../../../components/row-figures.ts';
import { LayoutPicture } from '../../../components/layout-picture.tsx';
import { sizeText } from '../../../lib/formatting.ts';
import { useWorkshop } from '../../../lib/workshop.tsx';
import { containersText } from '../containers-text.ts';

/** How the pieces lie on each panel, for whoever cuts them. */
export function JobLayout({ job }: { job: Job }) {
  const { lengthUnit } = useWorkshop();
  const { layout, outlinePath } = job;
  const { container } = layout;
  const height = container.form === 'panel' ? container.heightMm : container.widthMm;
  const width =
    container.form === 'panel'
      ? container.widthMm
      : (container.lengthMm ?? layout.period?.mm ?? container.widthMm);
  const size = sizeText(String(width), String(height), lengthUnit);
  const from = containersText(job.containers, container.form).text;
  return (
    <Card title="Layout" subtitle={`${layout.pieces} from ${size}, ${from}`}>
      {outlinePath !== null && layout.placements.length > 0 ? (
        <>
          <LayoutPicture
            outlinePath={outlinePath}
            placements={layout.placements}
            widthMm={width}
            heightMm={height}
            offcut={layout.offcut}
            title={`Layout of ${job.patternName}`}
          />
          <div className="mt-4">
            <KeyFigures figures={rowFigures(layout, lengthUnit)} />
          </div>
        </>
      ) : (
        <p className="text-ink-soft">Counted by hand, so there is no picture of it.</p>
      )}
    </Card>
  );
}
