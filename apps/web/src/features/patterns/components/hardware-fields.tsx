import { kitWords, unitWord, type HardwareUnit } from '@hidewright/domain';
import { useQuery } from '@tanstack/react-query';
import { Plus } from 'lucide-react';
import { useState } from 'react';
import { useFieldArray } from 'react-hook-form';
import { Button } from '../../../components/button.tsx';
import { NumberField } from '../../../components/number-field.tsx';
import { SelectField } from '../../../components/select-field.tsx';
import { unitPriceText } from '../../../lib/formatting.ts';
import { perChoices } from '../pattern-words.ts';
import { hardwareChoicesQuery } from '../patterns.queries.ts';
import { blankHardware } from '../typed-parts.ts';
import { AddHardwareDialog } from './add-hardware-dialog.tsx';
import { FieldRow } from './field-row.tsx';
import { LineRemarks } from './line-remarks.tsx';
import { MoreOfHardware } from './more-of-hardware.tsx';
import { RemoveButton } from '../../../components/remove-button.tsx';

const name = 'definition.hardware';

/** ", 0.04 per ml"; nothing for whoever may not see it. */
function priceOf(unitPrice: string | undefined, unit: HardwareUnit): string {
  if (unitPrice === undefined) return '';
  const per = unit === 'piece' ? '' : ` per ${unitWord(unit)}`;
  return `, ${unitPriceText(unitPrice)}${per}`;
}

/** What goes on each piece: rivets, snaps, a box. */
export function HardwareFields() {
  const { fields, append, remove } = useFieldArray({ name });
  const { data: hardware = [] } = useQuery(hardwareChoicesQuery());
  const [adding, setAdding] = useState(false);
  const choices = hardware.map(({ id, name: label, unitPrice, unit, parts }) => ({
    value: id,
    label: `${label}${priceOf(unitPrice, unit)}${parts.length > 0 ? `, ${kitWords(parts)}` : ''}`,
  }));
  return (
    <fieldset>
      <legend className="mb-1 text-lg font-semibold">Hardware and supplies</legend>
      <p className="mb-3 text-sm text-ink-soft">
        What goes on each piece, and what is used up with it and kept in stock, such as thread;
        leave it empty where there is none.
      </p>
      <div className="space-y-3">
        {fields.map((field, at) => (
          <div key={field.id} className="flex flex-wrap items-start gap-x-4 gap-y-2">
            <div className="min-w-56 grow basis-56">
              <SelectField
                key={choices.length}
                name={`${name}.${at}.hardwareId`}
                label="Hardware"
                placeholder="Choose one"
                whenEmpty="text"
                choices={choices}
              />
            </div>
            <RemoveButton label={`Remove hardware ${at + 1}`} onRemove={() => remove(at)} />
            <div className="basis-full space-y-2">
              <FieldRow>
                <NumberField name={`${name}.${at}.perPiece`} label="How many" whenEmpty="text" />
                <SelectField
                  name={`${name}.${at}.per`}
                  label="Counted"
                  choices={perChoices}
                  short
                />
              </FieldRow>
              <MoreOfHardware at={at} />
              <LineRemarks at={at} />
            </div>
          </div>
        ))}
      </div>
      <div className="mt-2 -ml-3 flex flex-wrap">
        {choices.length > 0 && (
          <Button
            tone="quiet"
            onClick={() =>
              append(
                { ...blankHardware, hardwareId: '' },
                { focusName: `${name}.${fields.length}.hardwareId` },
              )
            }
          >
            <Plus size={18} aria-hidden="true" /> Hardware from the list
          </Button>
        )}
        <Button tone="quiet" onClick={() => setAdding(true)}>
          <Plus size={18} aria-hidden="true" /> New hardware
        </Button>
      </div>
      <AddHardwareDialog
        open={adding}
        onOpenChange={setAdding}
        onAdded={({ id }) => append({ ...blankHardware, hardwareId: id }, { shouldFocus: false })}
      />
    </fieldset>
  );
}
