import { useState } from 'react';
import { EmptyState } from '../../../components/empty-state.tsx';
import { Notice } from '../../../components/notice.tsx';
import type { PreviewSoFar } from '../use-preview.ts';
import { LayoutCard } from './layout-card.tsx';
import { ladderOf, OptionSwitch } from './option-switch.tsx';
import { OnePieceCard } from './one-piece-card.tsx';
import { PriceBreaksCard } from './price-breaks-card.tsx';

/** Below the fields; where there is room, beside them, and in sight while they are typed. */
const beside =
  'grid items-start gap-5 lg:grid-cols-2 xl:sticky xl:top-4 xl:-m-1 xl:max-h-[calc(100dvh-2rem)] xl:grid-cols-1 xl:overflow-y-auto xl:p-1';

/** What the quote would look like if it were saved now. */
export function QuotePreview({ basis, preview }: PreviewSoFar) {
  const [picked, setPicked] = useState<number>();
  const [option, setOption] = useState<string | null>(null);
  if (!basis || !preview) {
    return <EmptyState title="Choose a pattern, and its numbers appear here." />;
  }
  const layout = (
    <LayoutCard
      layout={basis.layout}
      outlinePath={basis.outlinePath}
      patternName={basis.patternName}
      rung={'numbers' in preview ? rungAt(preview.numbers.breaks, picked) : undefined}
    />
  );
  if ('why' in preview) {
    return (
      <div className={beside}>
        <Notice tone="info">{preview.why}</Notice>
        {layout}
      </div>
    );
  }
  const { input } = preview;
  const numbers = ladderOf(preview.numbers, option);
  const rung = rungAt(numbers.breaks, picked);
  return (
    <div className={beside}>
      <OptionSwitch options={preview.numbers.options} chosen={option} onChoose={setOption} />
      {rung && (
        <PriceBreaksCard
          numbers={numbers}
          target={input.targetPerHour}
          chosen={rung.quantity}
          onChoose={setPicked}
        />
      )}
      {rung && <OnePieceCard rung={rung} tooling={input.tooling} />}
      {layout}
    </div>
  );
}

/** The picked rung, or the second one: large enough to be wanted, small enough to be doubted. */
export function rungAt<Rung extends { quantity: number }>(
  rungs: readonly Rung[],
  picked: number | undefined,
) {
  return rungs.find((rung) => rung.quantity === picked) ?? rungs[Math.min(1, rungs.length - 1)];
}
