import { Plus, X } from 'lucide-react';
import { useFieldArray } from 'react-hook-form';
import { Button } from '../../../components/button.tsx';
import { MoneyField } from '../../../components/money-field.tsx';
import { TextField } from '../../../components/text-field.tsx';

const most = 8;

interface ToolingFieldsProps {
  /** What the pattern asks for, such as "Stamp plate": one press adds it. */
  suggestions: readonly string[];
}

/** Tools that the run needs made: what they cost the shop, and what the customer is charged, once. */
export function ToolingFields({ suggestions }: ToolingFieldsProps) {
  const { fields, append, remove } = useFieldArray({ name: 'tooling' });
  const add = (name: string) =>
    append(
      { name, cost: '', charge: '' },
      { focusName: `tooling.${fields.length}.${name === '' ? 'name' : 'cost'}` },
    );
  return (
    <fieldset>
      <legend className="mb-1 text-lg font-semibold">Tooling</legend>
      <p className="mb-3 text-sm text-ink-soft">
        Always a line of its own, charged once. Leave it out where the tools are there already.
      </p>
      <div className="space-y-4">
        {fields.map((field, at) => (
          <div key={field.id} className="flex flex-wrap items-start gap-x-4 gap-y-2">
            <div className="w-full">
              <TextField name={`tooling.${at}.name`} label="Tool" />
            </div>
            <div className="w-44">
              <MoneyField name={`tooling.${at}.cost`} label="Costs the shop" />
            </div>
            <div className="w-44">
              <MoneyField name={`tooling.${at}.charge`} label="Charged" />
            </div>
            <button
              type="button"
              onClick={() => remove(at)}
              aria-label={`Remove tool ${at + 1}`}
              className="mt-7 grid size-10 place-items-center rounded text-ink-soft hover:bg-manila"
            >
              <X size={18} aria-hidden="true" />
            </button>
          </div>
        ))}
      </div>
      {fields.length < most && (
        <div className="mt-2 -ml-3 flex flex-wrap">
          {[...suggestions, ''].map((name) => (
            <Button key={name} tone="quiet" onClick={() => add(name)}>
              <Plus size={18} aria-hidden="true" /> {name === '' ? 'Another tool' : name}
            </Button>
          ))}
        </div>
      )}
    </fieldset>
  );
}
