import { Plus } from 'lucide-react';
import { useFieldArray } from 'react-hook-form';
import { Button } from '../../../components/button.tsx';
import { MoneyField } from '../../../components/money-field.tsx';
import { More } from '../../../components/more.tsx';
import { SelectField } from '../../../components/select-field.tsx';
import { TextField } from '../../../components/text-field.tsx';
import { countText } from '../../../lib/formatting.ts';
import { perChoices } from '../pattern-words.ts';
import { FieldRow } from './field-row.tsx';
import { RemoveButton } from '../../../components/remove-button.tsx';

const name = 'definition.supplies';
const most = 20;

/** Dye, thread, glue of which no stock is kept: their cost alone goes into the price. */
export function SupplyFields() {
  const { fields, append, remove } = useFieldArray({ name });
  const note = fields.length > 0 ? countText(fields.length) : undefined;
  return (
    <More word="Dye, thread, glue" note={note} names={[name]}>
      <p className="text-sm text-ink-soft">
        What is used up by the way and not counted: its cost goes into the price. Supplies that you
        keep stock of stand above, with the hardware.
      </p>
      {fields.map((field, at) => (
        <div key={field.id} className="flex flex-wrap items-start gap-x-4 gap-y-2">
          <div className="min-w-48 grow basis-48">
            <TextField name={`${name}.${at}.name`} label={`Supply ${at + 1}`} />
          </div>
          <RemoveButton label={`Remove supply ${at + 1}`} onRemove={() => remove(at)} />
          <div className="basis-full">
            <FieldRow>
              <MoneyField name={`${name}.${at}.cost`} label="Cost" />
              <SelectField name={`${name}.${at}.per`} label="Counted" choices={perChoices} short />
            </FieldRow>
          </div>
        </div>
      ))}
      {fields.length < most && (
        <Button
          tone="quiet"
          className="-ml-3"
          onClick={() =>
            append(
              { name: '', cost: '', per: 'hundred' },
              { focusName: `${name}.${fields.length}.name` },
            )
          }
        >
          <Plus size={18} aria-hidden="true" /> Another supply
        </Button>
      )}
    </More>
  );
}
