import type { RunBasis } from '@hidewright/contract';
import type { RunNumbers } from '@hidewright/domain';
import { useEffect } from 'react';
import { useFieldArray } from 'react-hook-form';
import { MoneyField } from '../../../components/money-field.tsx';
import { unitPriceText } from '../../../lib/formatting.ts';

interface OptionFieldsProps {
  basis: RunBasis | undefined;
  numbers: RunNumbers | undefined;
}

/** Which of the pattern's options the customer may choose from, and what each costs beyond the piece as it is. */
export function OptionFields({ basis, numbers }: OptionFieldsProps) {
  const { fields, append, remove } = useFieldArray({ name: 'terms.options' });
  const chosen = fields as unknown as { id: string; name: string }[];
  const gone = chosen.findIndex(({ name }) => basis?.options.every((each) => each.name !== name));
  // Another pattern has other options.
  useEffect(() => {
    if (gone >= 0) remove(gone);
  }, [gone, remove]);
  if (!basis || basis.options.length === 0) return null;
  return (
    <fieldset>
      <legend className="mb-1 text-lg font-semibold">Options</legend>
      <p className="mb-3 text-sm text-ink-soft">
        Offered beside the piece as it is; the customer chooses one or none.
      </p>
      <div className="space-y-3">
        {basis.options.map(({ name }) => {
          const at = chosen.findIndex((each) => each.name === name);
          return (
            <div key={name}>
              <label className="flex min-h-8 items-start gap-3">
                <input
                  type="checkbox"
                  checked={at >= 0}
                  onChange={() => (at >= 0 ? remove(at) : append({ name, typedExtra: null }))}
                  className="mt-1 size-4.5 shrink-0 accent-verdigris"
                />
                <span>{name}</span>
              </label>
              {at >= 0 && (
                <div className="mt-1 ml-7.5">
                  <MoneyField
                    key={chosen[at]?.id}
                    name={`terms.options.${at}.typedExtra`}
                    label={`${name}, more for each piece`}
                    optional
                    whenEmpty="null"
                    help={differenceOf(numbers, name)}
                  />
                </div>
              )}
            </div>
          );
        })}
      </div>
    </fieldset>
  );
}

function differenceOf(numbers: RunNumbers | undefined, name: string): string {
  const option = numbers?.options.find((each) => each.name === name);
  const [rung, base] = [option?.breaks[0], numbers?.breaks[0]];
  if (!rung || !base) return 'Worked out, if left empty.';
  return `Left empty, it is worked out: ${unitPriceText(rung.priceEach)} at ${rung.quantity}, against ${unitPriceText(base.priceEach)}.`;
}
