import type { LotLayout } from '@hidewright/contract';
import { countText, lengthText } from '../../../lib/formatting.ts';
import { useWorkshop } from '../../../lib/workshop.tsx';

type Cuts = NonNullable<LotLayout['cuts']>;

/** The cuts of a side as they lie in a picture that begins at a corner of it. */
export function cutsFrom({ along, at }: Cuts, corner: { x: number; y: number }) {
  const from = along === 'width' ? corner.y : corner.x;
  return { along, at: at.map((place) => place - from) };
}

/** Which way to cut, and what every strip measures and gives. */
export function StripsCut({ cuts: { along, at, strips } }: { cuts: Cuts }) {
  const { lengthUnit } = useWorkshop();
  const length = (mm: number) => lengthText(mm.toFixed(1), lengthUnit);
  if (at.length === 0) return <p>The press takes it whole: there is nothing to cut apart.</p>;
  const way = along === 'width' ? 'along the spine' : 'across the spine';
  return (
    <div>
      <p>{`Cut it ${way}, ${timesText(at.length)}, into these strips:`}</p>
      <ol className="mt-2 list-decimal space-y-1 pl-6">
        {strips.map(({ widthMm, lengthMm, pieces }, number) => (
          <li key={number}>
            {`${length(widthMm)} wide, ${length(lengthMm)} long: ${piecesText(pieces)}`}
          </li>
        ))}
      </ol>
    </div>
  );
}

const timesText = (count: number): string => (count === 1 ? 'once' : `${countText(count)} times`);

function piecesText(pieces: number): string {
  if (pieces === 0) return 'left over';
  return pieces === 1 ? '1 piece' : `${countText(pieces)} pieces`;
}
