import { Plus } from 'lucide-react';
import { useFieldArray } from 'react-hook-form';
import { AreaField } from '../../../components/area-field.tsx';
import { AreaPriceField } from '../../../components/area-price-field.tsx';
import { Button } from '../../../components/button.tsx';
import { DecimalField } from '../../../components/decimal-field.tsx';
import { MoneyField } from '../../../components/money-field.tsx';
import { RemoveButton } from '../../../components/remove-button.tsx';

const most = 12;

/** The price at each quantity: the first from the least that is sold, every further one lower. */
export function BreakFields({ of }: { of: 'leather' | 'hardware' }) {
  const { fields, append, remove } = useFieldArray({ name: 'breaks' });
  return (
    <fieldset>
      <legend className="mb-1 font-semibold">Prices</legend>
      <p className="mb-2 text-sm text-ink-soft">
        Each holds for the whole order, once it comes to that much. Enter 0 while a price is not
        known.
      </p>
      <div className="space-y-3">
        {fields.map((field, at) => (
          <div key={field.id} className="flex flex-wrap items-start gap-x-4 gap-y-2">
            {of === 'leather' ? (
              <>
                <AreaField name={`breaks.${at}.from`} label="From" />
                <AreaPriceField name={`breaks.${at}.price`} label="Price" />
              </>
            ) : (
              <>
                <DecimalField name={`breaks.${at}.from`} label="From" unit="pieces" />
                <MoneyField name={`breaks.${at}.price`} label="Price" per="piece" />
              </>
            )}
            {fields.length > 1 && (
              <RemoveButton label={`Remove price ${at + 1}`} onRemove={() => remove(at)} />
            )}
          </div>
        ))}
      </div>
      {fields.length < most && (
        <Button
          tone="quiet"
          className="mt-2 -ml-3"
          onClick={() =>
            append({ from: '', price: '' }, { focusName: `breaks.${fields.length}.from` })
          }
        >
          <Plus size={18} aria-hidden="true" /> A lower price for more
        </Button>
      )}
    </fieldset>
  );
}
