import { Plus, X } from 'lucide-react';
import { useFieldArray, useFormContext, useWatch } from 'react-hook-form';
import { Button } from '../../../components/button.tsx';
import { MoneyField } from '../../../components/money-field.tsx';
import { PriceRuleField } from '../../../components/price-rule-field.tsx';
import { NumberField } from '../../../components/number-field.tsx';
import { unitPriceText } from '../../../lib/formatting.ts';

const most = 8;

interface RungFieldsProps {
  /** The price each that is worked out for a quantity, as far as it can be. */
  workedOut: ReadonlyMap<number, string>;
}

/** The quantities asked for, each with the price that is worked out and, if wanted, the owner's own. */
export function RungFields({ workedOut }: RungFieldsProps) {
  const { fields, append, remove } = useFieldArray({ name: 'breaks' });
  return (
    <fieldset>
      <legend className="mb-1 text-lg font-semibold">Quantities</legend>
      <p className="mb-3 text-sm text-ink-soft">
        Leave the price empty and it is worked out; type one to set it yourself.
      </p>
      <div className="space-y-3">
        {fields.map((field, at) => (
          <RungRow
            key={field.id}
            at={at}
            workedOut={workedOut}
            onRemove={fields.length > 1 ? () => remove(at) : undefined}
          />
        ))}
      </div>
      {fields.length < most && (
        <Button
          tone="quiet"
          className="mt-2 -ml-3"
          onClick={() =>
            append(
              { quantity: '', typedPrice: null, rule: null },
              { focusName: `breaks.${fields.length}.quantity` },
            )
          }
        >
          <Plus size={18} aria-hidden="true" /> Another quantity
        </Button>
      )}
    </fieldset>
  );
}

interface RungRowProps extends RungFieldsProps {
  at: number;
  onRemove: (() => void) | undefined;
}

function RungRow({ at, workedOut, onRemove }: RungRowProps) {
  return (
    <div className="flex flex-wrap items-start gap-x-4 gap-y-2">
      <div className="w-44">
        <NumberField name={`breaks.${at}.quantity`} label="Pieces" />
      </div>
      <div className="w-44">
        <MoneyField
          name={`breaks.${at}.typedPrice`}
          label="Your price"
          per="piece"
          optional
          whenEmpty="null"
        />
        <WorkedOutPrice at={at} workedOut={workedOut} />
        <OwnRule at={at} />
      </div>
      {onRemove && (
        <button
          type="button"
          onClick={onRemove}
          aria-label={`Remove quantity ${at + 1}`}
          className="mt-7 grid size-10 place-items-center rounded text-ink-soft hover:bg-manila"
        >
          <X size={18} aria-hidden="true" />
        </button>
      )}
    </div>
  );
}

/** A rule for this quantity alone, out of the way until it is wanted. */
function OwnRule({ at }: { at: number }) {
  const rule = useWatch({ name: `breaks.${at}.rule` }) as unknown;
  return (
    <details open={rule !== null && rule !== undefined ? true : undefined}>
      <summary className="min-h-8 rounded py-1 text-sm text-ink-soft">a rule of its own</summary>
      <div className="mt-1">
        <PriceRuleField
          name={`breaks.${at}.rule`}
          label={`Worked out, quantity ${at + 1}`}
          emptyWord="as the others"
        />
      </div>
    </details>
  );
}

function WorkedOutPrice({ at, workedOut }: { at: number; workedOut: ReadonlyMap<number, string> }) {
  const { setValue } = useFormContext();
  const rung = useWatch({ name: `breaks.${at}` }) as
    { quantity: unknown; typedPrice: unknown } | undefined;
  const price = workedOut.get(Number(rung?.quantity));
  if (price === undefined) return null;
  const typed = typeof rung?.typedPrice === 'string' && rung.typedPrice !== '';
  return (
    <p className="mt-1 flex min-h-8 items-center gap-2 text-sm text-ink-soft">
      <span>{`worked out: ${unitPriceText(price)}`}</span>
      {typed && (
        <button
          type="button"
          className="min-h-8 rounded px-1 font-semibold text-verdigris underline underline-offset-3"
          onClick={() =>
            setValue(`breaks.${at}.typedPrice`, null, { shouldDirty: true, shouldValidate: false })
          }
        >
          Use it
        </button>
      )}
    </p>
  );
}
