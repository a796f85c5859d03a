import { Plus } from 'lucide-react';
import { useFieldArray } from 'react-hook-form';
import { Button } from '../../../components/button.tsx';
import { More } from '../../../components/more.tsx';
import { TextField } from '../../../components/text-field.tsx';
import { countText } from '../../../lib/formatting.ts';
import { blankSwap } from '../typed-parts.ts';
import { RemoveButton } from '../../../components/remove-button.tsx';
import { SwapFields } from './swap-fields.tsx';

const name = 'definition.options';
const most = 6;

/** The same piece with other hardware, for the customer to choose. */
export function OptionFields() {
  const { fields, append, remove } = useFieldArray({ name });
  const note = fields.length > 0 ? countText(fields.length) : undefined;
  return (
    <More word="Options for the customer" note={note} names={[name]}>
      <p className="text-sm text-ink-soft">
        The same piece with other hardware. A quote can offer it beside the usual one.
      </p>
      {fields.length > 0 && (
        <ol className="space-y-4">
          {fields.map((field, at) => (
            <li key={field.id} className="rounded border border-stitch p-3">
              <div className="flex flex-wrap items-start gap-x-2">
                <div className="min-w-40 grow">
                  <TextField
                    name={`${name}.${at}.name`}
                    label={`Option ${at + 1}`}
                    help="such as With a brass ring"
                  />
                </div>
                <RemoveButton label={`Remove option ${at + 1}`} onRemove={() => remove(at)} />
              </div>
              <SwapFields option={at} />
            </li>
          ))}
        </ol>
      )}
      {fields.length < most && (
        <Button
          tone="quiet"
          className="-ml-3"
          onClick={() =>
            append(
              { name: '', swaps: [{ ...blankSwap }] },
              { focusName: `${name}.${fields.length}.name` },
            )
          }
        >
          <Plus size={18} aria-hidden="true" /> Another option
        </Button>
      )}
    </More>
  );
}
