import type { FinishedPiece } from '@hidewright/contract';
import { useWatch } from 'react-hook-form';
import { Notice } from '../../../components/notice.tsx';
import { moneyText } from '../../../lib/formatting.ts';
import { useWorkshop } from '../../../lib/workshop.tsx';
import { saleWorth } from '../sale-words.ts';

/** What the sale brings as it is typed, and whether that pays for what is in the pieces. */
export function SaleSum({ piece }: { piece: FinishedPiece }) {
  const { currency } = useWorkshop();
  const [quantity, unitPrice] = useWatch({ name: ['quantity', 'unitPrice'] }) as unknown[];
  const worth = saleWorth({ quantity, unitPrice }, piece, currency);
  if (worth === undefined) return null;
  const { amount, cost, belowCost } = worth;
  if (belowCost && cost !== undefined) {
    return (
      <Notice tone="attention" live title={`${moneyText(amount)} ${currency} before tax.`}>
        That is less than their leather and hardware cost: {moneyText(cost)} {currency}.
      </Notice>
    );
  }
  return (
    <p role="status">
      <strong>
        {moneyText(amount)} {currency}
      </strong>{' '}
      before tax
      {cost !== undefined && (
        <span className="text-ink-soft">
          ; their leather and hardware cost {moneyText(cost)} {currency}
        </span>
      )}
    </p>
  );
}
