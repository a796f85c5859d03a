import { outlineOf, type Pattern, type ToolReply } from '@hidewright/contract';
import { cuttingEdgeMm, leastSpacing, type LeastSpacing } from '@hidewright/domain';
import { useQuery } from '@tanstack/react-query';
import { Card } from '../../../components/card.tsx';
import { Notice } from '../../../components/notice.tsx';
import { AtThePress } from '../../../features/presses/components/at-the-press.tsx';
import { pressesQuery } from '../../../features/presses/presses.queries.ts';
import { toolsQuery } from '../../../features/tools/tools.queries.ts';
import { lengthText } from '../../../lib/formatting.ts';
import { useWorkshop } from '../../../lib/workshop.tsx';

/** What one strike of the pattern asks of the presses, and whether its spacing leaves room for die and plate. */
export function PressCard({ pattern }: { pattern: Pattern }) {
  const { data: tools } = useQuery(toolsQuery(pattern.id));
  const { data: presses } = useQuery(pressesQuery());
  const inUse = (presses?.items ?? []).filter(({ active }) => active);
  const { outline } = pattern.definition;
  if (outline === null || inUse.length === 0 || tools === undefined) return null;
  const kept = tools.items.filter(({ state }) => state === 'on the rack' || state === 'on order');
  const die = kept.find(({ kind }) => kind === 'cutting die');
  const plates = kept.filter(({ kind }) => kind === 'stamp plate');
  const relief = largest(plates.map(({ reliefAreaMm2 }) => reliefAreaMm2));
  const least = leastSpacing({
    ruleThicknessMm: largest([die?.ruleThicknessMm ?? null]),
    borderMm: largest(plates.map(({ borderMm }) => borderMm)),
  });
  return (
    <Card title="At the press" subtitle={strikeWords(die)}>
      <SpacingNote least={least} spacingMm={Number(pattern.definition.spacingMm)} />
      <AtThePress
        presses={inUse}
        cuttingEdgeMm={cuttingEdgeMm(outlineOf(outline)) * (die?.piecesPerStrike ?? 1)}
        reliefAreaMm2={relief}
        laid={pattern.layout.container}
      />
    </Card>
  );
}

function strikeWords(die: ToolReply | undefined): string {
  const pieces = die?.piecesPerStrike ?? 1;
  return pieces === 1 ? 'one piece at a strike' : `${pieces} pieces at a strike`;
}

function largest(texts: readonly (string | null)[]): number | null {
  const numbers = texts.flatMap((text) => (text === null ? [] : [Number(text)]));
  return numbers.length === 0 ? null : Math.max(...numbers);
}

function SpacingNote({ least, spacingMm }: { least: LeastSpacing; spacingMm: number }) {
  const { lengthUnit } = useWorkshop();
  if (least.because === null) return null;
  const mm = lengthText(String(least.mm), lengthUnit, lengthUnit === 'mm' ? 2 : 3);
  const why = least.because === 'rule' ? 'the die’s rule' : 'the border of the plate';
  if (spacingMm >= least.mm) {
    return (
      <p className="mb-3 text-ink-soft">{`Spacing can be no less than ${mm}: ${why} asks for it.`}</p>
    );
  }
  return (
    <Notice tone="attention" className="mb-3" title="The spacing is too small.">
      {`It needs ${mm}, since ${why} reaches that far. Change the pattern’s spacing.`}
    </Notice>
  );
}
