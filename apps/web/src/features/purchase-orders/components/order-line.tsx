import { X } from 'lucide-react';
import { useEffect } from 'react';
import { useFormContext, useWatch } from 'react-hook-form';
import { AreaField } from '../../../components/area-field.tsx';
import { MoneyField } from '../../../components/money-field.tsx';
import { NumberField } from '../../../components/number-field.tsx';
import { SelectField } from '../../../components/select-field.tsx';
import type { Goods } from '../typed-order.ts';

interface OrderLineProps {
  at: number;
  of: 'leather' | 'hardware';
  goods: readonly Goods[];
  onRemove: () => void;
}

/** One line: what, how much of it, at which price; its last price is there as soon as it is chosen. */
export function OrderLine({ at, of, goods, onRemove }: OrderLineProps) {
  const line = `lines.${at}`;
  const what = of === 'leather' ? `${line}.leatherId` : `${line}.hardwareId`;
  const chosen = useChosen(what, `${line}.unitPrice`, goods);
  const packs =
    chosen?.packSize === undefined || chosen.packSize === 1
      ? undefined
      : `in packs of ${chosen.packSize}`;
  return (
    <div className="flex flex-wrap items-start gap-x-4 gap-y-2">
      <div className="w-full sm:w-64">
        <SelectField
          name={what}
          label={of === 'leather' ? 'Leather' : 'Hardware or supplies'}
          placeholder="Choose one"
          choices={goods.map(({ id, name }) => ({ value: id, label: name }))}
        />
      </div>
      {of === 'leather' ? (
        <AreaField name={`${line}.areaMm2`} label="Area" help="24.75 or 24³" />
      ) : (
        <NumberField name={`${line}.quantity`} label="How many" help={packs} />
      )}
      <MoneyField
        name={`${line}.unitPrice`}
        label="Price"
        per={of === 'leather' ? 'ft²' : 'piece'}
      />
      <button
        type="button"
        onClick={onRemove}
        aria-label={`Remove line ${at + 1}`}
        className="mt-7 grid size-10 place-items-center rounded text-ink-soft hover:bg-manila"
      >
        <X size={18} aria-hidden="true" />
      </button>
    </div>
  );
}

/** What is chosen; its price goes into the price field while that is empty. */
function useChosen(what: string, price: string, goods: readonly Goods[]): Goods | undefined {
  const { getValues, setValue } = useFormContext();
  const id: unknown = useWatch({ name: what });
  const chosen = goods.find((item) => String(item.id) === String(id));
  const known = chosen?.price;
  useEffect(() => {
    if (known !== undefined && getValues(price) === '')
      setValue(price, known, { shouldDirty: true });
  }, [known, price, getValues, setValue]);
  return chosen;
}
