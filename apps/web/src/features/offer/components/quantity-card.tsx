import type { Offer } from '@hidewright/contract';
import { classNames } from '../../../lib/class-names.ts';
import { countText, moneyText, unitPriceText } from '../../../lib/formatting.ts';

interface QuantityCardProps {
  rung: Offer['breaks'][number];
  chosen: boolean;
  onChoose: () => void;
}

/** One quantity with its price each and what the pieces come to. */
export function QuantityCard({ rung, chosen, onChoose }: QuantityCardProps) {
  return (
    <label
      className={classNames(
        'flex min-h-12 items-center gap-3 rounded border px-3.5 py-2',
        'has-focus-visible:outline-3 has-focus-visible:outline-offset-2 has-focus-visible:outline-verdigris',
        chosen ? 'border-verdigris bg-verdigris-pale' : 'border-stitch bg-card hover:border-edge',
      )}
    >
      <input
        type="radio"
        name="quantity"
        value={rung.quantity}
        checked={chosen}
        onChange={onChoose}
        className="size-4.5 shrink-0 accent-verdigris outline-none"
      />
      <span className="grow font-semibold">{countText(rung.quantity)}</span>
      <span className="text-right">{`${unitPriceText(rung.priceEach)} each`}</span>
      <span className="min-w-24 text-right font-semibold">{moneyText(rung.goodsTotal)}</span>
    </label>
  );
}
