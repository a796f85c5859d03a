import { useState, type ReactNode } from 'react';
import { useFormContext } from 'react-hook-form';
import { Button } from '../../../components/button.tsx';
import { Dialog } from '../../../components/dialog.tsx';
import { RadioCards, type RadioCard } from '../../../components/radio-cards.tsx';

export interface RateFieldProps {
  rates: readonly RadioCard[];
  newRate: (onAdded: (id: number) => void) => ReactNode;
}

/** Which tax these pieces bear; a rate that is missing is entered on the spot. */
export function RateField({ rates, newRate }: RateFieldProps) {
  const { setValue } = useFormContext();
  const [adding, setAdding] = useState(false);
  return (
    <div className="space-y-2">
      <RadioCards
        name="taxRateId"
        label="Tax"
        help="On the draft it can still be changed, line by line."
        cards={[...rates, { value: null, label: 'No tax applies' }]}
      />
      <Button onClick={() => setAdding(true)}>Enter a tax rate</Button>
      <Dialog open={adding} onOpenChange={setAdding} title="Enter a tax rate">
        {newRate((id) => {
          setValue('taxRateId', id, { shouldDirty: true, shouldValidate: true });
          setAdding(false);
        })}
      </Dialog>
    </div>
  );
}
