import type { FinishedPiece } from '@hidewright/contract';
import { Card } from '../../../components/card.tsx';
import { KeyFigures } from '../../../components/key-figures.tsx';
import { countText, moneyText } from '../../../lib/formatting.ts';
import { useWorkshop } from '../../../lib/workshop.tsx';

/** What is there of one kind, and what it cost to make. */
export function FinishedFacts({ piece }: { piece: FinishedPiece }) {
  const { currency } = useWorkshop();
  const { onHand, place, value, valueEach, customerName } = piece;
  const worth =
    value === undefined
      ? []
      : [
          {
            word: `At cost, ${currency}`,
            figure: moneyText(value),
            note: 'leather and hardware; wages left out',
          },
          {
            word: `Each, ${currency}`,
            figure: valueEach ? moneyText(valueEach) : '–',
          },
        ];
  return (
    <Card>
      <KeyFigures
        figures={[
          {
            word: 'On the shelf',
            figure: countText(onHand),
            note: piece.sort === 'seconds' ? 'seconds' : 'good ones',
          },
          { word: 'Place', figure: place || 'not said' },
          {
            word: 'With the mark of',
            figure: customerName ?? 'nobody',
            note: customerName === null ? 'for whoever wants them' : 'for them alone',
          },
          ...worth,
        ]}
      />
    </Card>
  );
}
