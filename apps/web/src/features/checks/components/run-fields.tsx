import { useQuery } from '@tanstack/react-query';
import { Plus, X } from 'lucide-react';
import { useFieldArray, useWatch } from 'react-hook-form';
import { Button } from '../../../components/button.tsx';
import { DayField } from '../../../components/day-field.tsx';
import { NumberField } from '../../../components/number-field.tsx';
import { SelectField } from '../../../components/select-field.tsx';
import { useWorkshop } from '../../../lib/workshop.tsx';
import {
  openQuotesQuery,
  patternChoicesQuery,
  patternOptionsQuery,
  quoteOptionsQuery,
} from '../checks.queries.ts';

/** A row is of a quote or of a pattern from the moment it is added. */
interface TypedRun {
  quoteId?: number | null;
  patternId?: number | null;
}

const most = 20;

/** The runs to check, one under the other. */
export function RunFields() {
  const { fields, append, remove } = useFieldArray({ name: 'runs' });
  const { data: quotes = [] } = useQuery(openQuotesQuery());
  const add = (name: 'quoteId' | 'patternId') =>
    append({ [name]: null }, { focusName: `runs.${fields.length}.${name}` });
  return (
    <fieldset className="min-w-0">
      <legend className="sr-only">The runs</legend>
      <ol className="space-y-4">
        {fields.map((field, at) => (
          <RunRow
            key={field.id}
            at={at}
            ofQuote={'quoteId' in field}
            onRemove={fields.length > 1 ? () => remove(at) : undefined}
          />
        ))}
      </ol>
      {fields.length < most && (
        <div className="mt-2 -ml-3 flex flex-wrap">
          {quotes.length > 0 && (
            <Button tone="quiet" onClick={() => add('quoteId')}>
              <Plus size={18} aria-hidden="true" /> A quote
            </Button>
          )}
          <Button tone="quiet" onClick={() => add('patternId')}>
            <Plus size={18} aria-hidden="true" /> So many of a pattern
          </Button>
        </div>
      )}
    </fieldset>
  );
}

interface RunRowProps {
  at: number;
  ofQuote: boolean;
  onRemove: (() => void) | undefined;
}

function RunRow({ at, ofQuote, onRemove }: RunRowProps) {
  const { today } = useWorkshop();
  const { data: quotes = [] } = useQuery(openQuotesQuery());
  const { data: patterns = [] } = useQuery(patternChoicesQuery());
  const name = (part: string) => `runs.${at}.${part}`;
  return (
    <li className="rounded border border-stitch p-3">
      <div className="grid grid-cols-[minmax(0,1fr)_auto] items-start gap-x-3">
        {ofQuote ? (
          <SelectField
            name={name('quoteId')}
            label={`Quote of run ${at + 1}`}
            choices={quotes}
            placeholder="Choose a quote"
          />
        ) : (
          <SelectField
            name={name('patternId')}
            label={`Pattern of run ${at + 1}`}
            choices={patterns}
            placeholder="Choose a pattern"
          />
        )}
        {onRemove && (
          <button
            type="button"
            onClick={onRemove}
            aria-label={`Remove run ${at + 1}`}
            className="mt-6 grid size-11 place-items-center rounded text-ink-soft hover:bg-manila"
          >
            <X size={18} aria-hidden="true" />
          </button>
        )}
      </div>
      <div className="mt-3 grid grid-cols-2 items-start gap-3">
        <NumberField
          name={name('quantity')}
          label="How many"
          help={ofQuote ? 'Empty: as agreed.' : undefined}
        />
        <DayField name={name('by')} label="Packed by" min={today} />
      </div>
      <OptionField at={at} />
    </li>
  );
}

/** Only where there is something to choose. */
function OptionField({ at }: { at: number }) {
  const run = (useWatch({ name: `runs.${at}` }) ?? {}) as TypedRun;
  const ofQuote = useQuery(quoteOptionsQuery(run.quoteId ?? undefined));
  const ofPattern = useQuery(patternOptionsQuery(run.patternId ?? undefined));
  const options = ofQuote.data ?? ofPattern.data ?? [];
  if (options.length === 0) return null;
  return (
    <div className="mt-3">
      <SelectField
        name={`runs.${at}.option`}
        label="Option"
        choices={options.map((option) => ({ value: option, label: option }))}
        placeholder={run.quoteId ? 'As agreed, or as it is' : 'As it is'}
      />
    </div>
  );
}
