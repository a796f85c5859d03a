import { quantityThatReaches, type BreakNumbers, type RunInput } from '@hidewright/domain';
import { useMemo } from 'react';
import { Card } from '../../../../components/card.tsx';
import { KeyFigures } from '../../../../components/key-figures.tsx';
import { countText, moneyText, unitPriceText } from '../../../../lib/formatting.ts';

interface ReachCardProps {
  input: RunInput;
  rung: BreakNumbers;
}

/** Which price, and which quantity, reaches the target. */
export function ReachCard({ input, rung }: ReachCardProps) {
  const quantity = useMemo(
    () => quantityThatReaches({ ...input, options: [] }, rung.priceEach),
    [input, rung.priceEach],
  );
  return (
    <Card
      title="What reaches the target"
      subtitle={`${moneyText(input.targetPerHour)} per bench hour, tooling included`}
    >
      <KeyFigures
        figures={[
          {
            word: `price each at ${countText(rung.quantity)}`,
            figure: unitPriceText(rung.priceThatReachesTarget),
            note: `you ask ${unitPriceText(rung.priceEach)}`,
          },
          {
            word: `pieces at ${unitPriceText(rung.priceEach)}`,
            figure: quantity === null ? 'none' : countText(quantity),
            note: quantity === null ? 'no quantity reaches it at this price' : 'or more',
          },
        ]}
      />
    </Card>
  );
}
