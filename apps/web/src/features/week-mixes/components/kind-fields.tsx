import type { KindOfWorkTyped } from '@hidewright/contract';
import { Plus, X } from 'lucide-react';
import { useFieldArray } from 'react-hook-form';
import { Button } from '../../../components/button.tsx';
import { DecimalField } from '../../../components/decimal-field.tsx';
import { SelectField } from '../../../components/select-field.tsx';
import { TextField } from '../../../components/text-field.tsx';
import { useWorkshop } from '../../../lib/workshop.tsx';
import { blankKind } from '../typed-week.ts';

const kindChoices = [
  { value: 'run', label: 'runs' },
  { value: 'large piece', label: 'a large piece' },
];
const most = 40;

/** The work of the week, kind by kind. */
export function KindFields({ deskMinutes }: { deskMinutes: string | undefined }) {
  const { fields, append, remove } = useFieldArray({ name: 'kinds' });
  const add = (kind: KindOfWorkTyped['kind']) =>
    append(blankKind(kind, deskMinutes), { focusName: `kinds.${fields.length}.name` });
  return (
    <fieldset className="min-w-0">
      <legend className="mb-1 text-lg font-semibold">The work</legend>
      <p className="mb-3 text-sm text-ink-soft">
        What one run or one large piece takes, and what is left of its price after everything
        bought, before wages; how many a week can be sold, and how many are promised.
      </p>
      <ol className="space-y-4">
        {fields.map((field, at) => (
          <KindRow key={field.id} at={at} onRemove={() => remove(at)} />
        ))}
      </ol>
      {fields.length < most && (
        <div className="mt-2 -ml-3 flex flex-wrap">
          <Button tone="quiet" onClick={() => add('large piece')}>
            <Plus size={18} aria-hidden="true" /> A large piece
          </Button>
          <Button tone="quiet" onClick={() => add('run')}>
            <Plus size={18} aria-hidden="true" /> Another run
          </Button>
        </div>
      )}
    </fieldset>
  );
}

function KindRow({ at, onRemove }: { at: number; onRemove: () => void }) {
  const field = (part: keyof KindOfWorkTyped) => `kinds.${at}.${part}`;
  const { currency } = useWorkshop();
  return (
    <li className="rounded border border-stitch p-3">
      <div className="grid grid-cols-[minmax(0,1fr)_auto] items-start gap-x-3 gap-y-2 sm:grid-cols-[minmax(0,1fr)_9rem_auto]">
        <TextField name={field('name')} label={`Work ${at + 1}`} />
        <button
          type="button"
          onClick={onRemove}
          aria-label={`Remove work ${at + 1}`}
          className="mt-7 grid size-10 place-items-center rounded text-ink-soft hover:bg-manila sm:order-last"
        >
          <X size={18} aria-hidden="true" />
        </button>
        <SelectField name={field('kind')} label="It is" choices={kindChoices} short />
      </div>
      <div className="mt-2 grid grid-cols-2 items-end gap-x-3 gap-y-2 sm:grid-cols-5">
        <DecimalField name={field('left')} label={`Left, ${currency}`} />
        <DecimalField name={field('benchMinutes')} label="Bench, min" />
        <DecimalField name={field('deskMinutes')} label="Desk, min" />
        <DecimalField
          name={field('mostPerWeek')}
          label="Can be sold"
          placeholder="any"
          whenEmpty="null"
        />
        <DecimalField name={field('leastPerWeek')} label="Promised" />
      </div>
    </li>
  );
}
