import type { PurchaseOrder } from '@hidewright/contract';
import { useFormContext } from 'react-hook-form';
import { Button } from '../../../components/button.tsx';
import { Notice } from '../../../components/notice.tsx';
import { withoutWhatCame, type TypedDelivery } from '../typed-delivery.ts';

interface LookAgainProps {
  onLookAgain: () => Promise<PurchaseOrder | undefined>;
  onLooked: () => void;
}

/** Somebody else was quicker: what they received is taken out, and the rest of what was typed stays. */
export function LookAgain({ onLookAgain, onLooked }: LookAgainProps) {
  const { getValues, reset } = useFormContext();

  async function look() {
    const order = await onLookAgain();
    if (order === undefined) return;
    const typed = withoutWhatCame(getValues() as TypedDelivery, order);
    reset(typed, { keepDefaultValues: true });
    onLooked();
  }

  return (
    <Notice
      tone="attention"
      title="Nothing of yours is on the rack yet."
      actions={
        <Button className="min-h-11" onClick={() => void look()}>
          Take out what is here already
        </Button>
      }
    >
      What is complete goes from this page, and counts go down to what is still to come.
    </Notice>
  );
}
