import { outlineOf, type Pattern } from '@hidewright/contract';
import { stripCuts, takesPanel, widestStripMm, type StripCuts } from '@hidewright/domain';
import { useQuery } from '@tanstack/react-query';
import { LayoutDrawing } from '../../../features/patterns/components/layout-drawing.tsx';
import { limitsOf } from '../../../features/presses/press-limits.ts';
import { pressesQuery } from '../../../features/presses/presses.queries.ts';
import { lengthText } from '../../../lib/formatting.ts';
import { useWorkshop } from '../../../lib/workshop.tsx';

/** The pattern's layout, with the cuts that part its panel into strips where no press takes it whole. */
export function LaidForPress({ pattern }: { pattern: Pattern }) {
  const { data: presses } = useQuery(pressesQuery());
  const { lengthUnit } = useWorkshop();
  const cuts = cutsFor(
    pattern,
    (presses?.items ?? []).filter(({ active }) => active).map(limitsOf),
  );
  return (
    <>
      <LayoutDrawing
        layout={pattern.layout}
        outlinePath={pattern.outlinePath}
        name={pattern.name}
        cuts={cuts}
      />
      {cuts && (
        <p className="mt-3">
          {`For the press, cut it into strips of ${cuts.widths
            .map((width) => lengthText(width.toFixed(1), lengthUnit))
            .join(', ')}.`}
        </p>
      )}
    </>
  );
}

function cutsFor(pattern: Pattern, presses: ReturnType<typeof limitsOf>[]): StripCuts | undefined {
  const { container } = pattern.layout;
  const { outline } = pattern.definition;
  if (presses.length === 0 || outline === null || container.form !== 'panel') return undefined;
  const { widthMm, heightMm } = container;
  if (presses.some((press) => takesPanel(press, widthMm, heightMm))) return undefined;
  const widest = Math.max(...presses.map(widestStripMm));
  return stripCuts(container, pattern.layout.placements, outlineOf(outline), widest) ?? undefined;
}
