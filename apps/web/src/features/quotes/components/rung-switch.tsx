import { Button } from '../../../components/button.tsx';
import { countText } from '../../../lib/formatting.ts';

interface RungSwitchProps {
  quantities: readonly number[];
  chosen: number;
  onChoose: (quantity: number) => void;
}

/** Which of the quantities asked for a page is about. */
export function RungSwitch({ quantities, chosen, onChoose }: RungSwitchProps) {
  return (
    <ul className="mb-3 flex flex-wrap gap-2" aria-label="Quantity">
      {quantities.map((quantity) => (
        <li key={quantity}>
          <Button
            tone={quantity === chosen ? 'primary' : 'secondary'}
            aria-pressed={quantity === chosen}
            onClick={() => onChoose(quantity)}
          >
            {countText(quantity)}
          </Button>
        </li>
      ))}
    </ul>
  );
}
