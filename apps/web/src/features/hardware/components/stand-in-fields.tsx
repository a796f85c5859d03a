import { Plus } from 'lucide-react';
import { useFieldArray } from 'react-hook-form';
import { Button } from '../../../components/button.tsx';
import { Checkbox } from '../../../components/checkbox.tsx';
import { More } from '../../../components/more.tsx';
import { RemoveButton } from '../../../components/remove-button.tsx';
import { SelectField, type Choice } from '../../../components/select-field.tsx';
import { countText } from '../../../lib/formatting.ts';

const most = 10;

/** What may be taken in its place when it is short. */
export function StandInFields({ choices }: { choices: readonly Choice[] }) {
  const { fields, append, remove } = useFieldArray({ name: 'standIns' });
  return (
    <More
      word="What may stand in for it"
      note={fields.length === 0 ? '' : countText(fields.length)}
      names={['standIns']}
    >
      <p className="text-sm text-ink-soft">
        Where a run is short of it, these are offered in its place.
      </p>
      {fields.map((field, at) => (
        <div key={field.id} className="flex flex-wrap items-start gap-x-4 gap-y-2">
          <div className="min-w-48 grow basis-48">
            <SelectField
              key={choices.length}
              name={`standIns.${at}.hardwareId`}
              label={`In its place ${at + 1}`}
              placeholder="Choose one"
              whenEmpty="text"
              choices={choices}
            />
          </div>
          <div className="sm:mt-8">
            <Checkbox name={`standIns.${at}.bothWays`} label="and the other way round" />
          </div>
          <RemoveButton label={`Remove stand-in ${at + 1}`} onRemove={() => remove(at)} />
        </div>
      ))}
      {fields.length < most && (
        <Button
          tone="quiet"
          className="-ml-3"
          onClick={() =>
            append(
              { hardwareId: '', bothWays: false },
              { focusName: `standIns.${fields.length}.hardwareId` },
            )
          }
        >
          <Plus size={18} aria-hidden="true" /> {fields.length === 0 ? 'One' : 'Another one'}
        </Button>
      )}
    </More>
  );
}
