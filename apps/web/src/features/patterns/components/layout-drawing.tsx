import type { LayoutReply } from '@hidewright/contract';
import type { StripCuts } from '@hidewright/domain';
import { KeyFigures } from '../../../components/key-figures.tsx';
import { LayoutPicture } from '../../../components/layout-picture.tsx';
import { Notice } from '../../../components/notice.tsx';
import { useWorkshop } from '../../../lib/workshop.tsx';
import { layoutFigures } from '../layout-words.ts';

interface LayoutDrawingProps {
  layout: LayoutReply;
  /** None where a hand count stands in for a drawing. */
  outlinePath: string | null;
  /** Straight cuts for the press, where the panel does not go in whole. */
  cuts?: StripCuts | undefined;
  /** What lies there: "Round coaster". */
  name: string;
}

/** How the pieces lie, to scale, and the figures below. */
export function LayoutDrawing({ layout, outlinePath, name, cuts }: LayoutDrawingProps) {
  const workshop = useWorkshop();
  const { container } = layout;
  const heightMm = container.form === 'panel' ? container.heightMm : container.widthMm;
  const widthMm =
    container.form === 'panel' ? container.widthMm : (container.lengthMm ?? container.widthMm);
  return (
    <div className="space-y-4">
      {layout.pieces === 0 && <NothingFits form={container.form} />}
      {layout.by !== 'hand count' && outlinePath !== null && (
        <LayoutPicture
          title={name === '' ? 'Layout' : `Layout of ${name}`}
          outlinePath={outlinePath}
          placements={layout.placements}
          widthMm={widthMm}
          heightMm={heightMm}
          cuts={cuts}
          offcut={layout.offcut}
        />
      )}
      <KeyFigures figures={layoutFigures(layout, workshop)} />
    </div>
  );
}

function NothingFits({ form }: { form: 'panel' | 'strip' }) {
  return (
    <Notice tone="attention" title="Not one piece fits.">
      Make the {form} larger, or the outline, spacing or trim smaller. It can be kept as it is, but
      no quote can be made of it.
    </Notice>
  );
}
