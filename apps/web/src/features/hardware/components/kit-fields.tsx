import { Plus } from 'lucide-react';
import { useFieldArray, useWatch } from 'react-hook-form';
import { Button } from '../../../components/button.tsx';
import { Checkbox } from '../../../components/checkbox.tsx';
import { More } from '../../../components/more.tsx';
import { NumberField } from '../../../components/number-field.tsx';
import { RemoveButton } from '../../../components/remove-button.tsx';
import { SelectField, type Choice } from '../../../components/select-field.tsx';
import { countText } from '../../../lib/formatting.ts';

const most = 10;

const noteOn = (parts: number) => {
  if (parts === 0) return '';
  return parts === 1 ? '1 part' : `${countText(parts)} parts`;
};

/** What a kit is made up of. */
export function KitFields({ choices }: { choices: readonly Choice[] }) {
  const { fields, append, remove } = useFieldArray({ name: 'parts' });
  const fromParts = useWatch({ name: 'priceFromParts' }) as boolean;
  return (
    <More
      word="Made up of other hardware"
      note={noteOn(fields.length)}
      names={['parts', 'priceFromParts']}
    >
      <p className="text-sm text-ink-soft">
        A rivet is a cap and a post: jobs then take the parts, and there are as many as the parts
        make up.
      </p>
      {fields.map((field, at) => (
        <div key={field.id} className="flex flex-wrap items-start gap-x-4 gap-y-2">
          <div className="min-w-48 grow basis-48">
            <SelectField
              key={choices.length}
              name={`parts.${at}.hardwareId`}
              label={`Part ${at + 1}`}
              placeholder="Choose a part"
              whenEmpty="text"
              choices={choices}
            />
          </div>
          <NumberField name={`parts.${at}.quantity`} label="In each" whenEmpty="text" />
          <RemoveButton label={`Remove part ${at + 1}`} onRemove={() => remove(at)} />
        </div>
      ))}
      {fields.length < most && (
        <Button
          tone="quiet"
          className="-ml-3"
          onClick={() =>
            append(
              { hardwareId: '', quantity: 1 },
              { focusName: `parts.${fields.length}.hardwareId` },
            )
          }
        >
          <Plus size={18} aria-hidden="true" /> {fields.length === 0 ? 'A part' : 'Another part'}
        </Button>
      )}
      {(fields.length > 0 || fromParts) && (
        <Checkbox name="priceFromParts" label="It costs what its parts cost" />
      )}
    </More>
  );
}
