import type { Quote } from '@hidewright/contract';
import { Button } from '../../../components/button.tsx';
import { Card } from '../../../components/card.tsx';
import { countText } from '../../../lib/formatting.ts';

interface QuantitiesCardProps {
  quote: Quote;
  chosen: number;
  onChoose: (quantity: number) => void;
}

/** What is asked for, without any price: for whoever checks whether it can be made. */
export function QuantitiesCard({ quote, chosen, onChoose }: QuantitiesCardProps) {
  return (
    <Card title="Quantities" subtitle="pick one to check">
      <ul className="flex flex-wrap gap-2">
        {quote.breaks.map(({ quantity }) => (
          <li key={quantity}>
            <Button
              tone={quantity === chosen ? 'primary' : 'secondary'}
              size="bench"
              aria-pressed={quantity === chosen}
              onClick={() => onChoose(quantity)}
            >
              {countText(quantity)}
            </Button>
          </li>
        ))}
      </ul>
    </Card>
  );
}
