import { perWords, type HardwarePer } from '@hidewright/domain';
import { useQuery } from '@tanstack/react-query';
import { Plus } from 'lucide-react';
import { useFieldArray, useWatch } from 'react-hook-form';
import { Button } from '../../../components/button.tsx';
import { NumberField } from '../../../components/number-field.tsx';
import { SelectField, type Choice } from '../../../components/select-field.tsx';
import { hardwareChoicesQuery, hardwareNamesQuery } from '../patterns.queries.ts';
import { blankSwap } from '../typed-parts.ts';
import { RemoveButton } from '../../../components/remove-button.tsx';
import { NeededForField } from './needed-for-field.tsx';

const most = 10;

interface Line {
  hardwareId?: unknown;
  per?: HardwarePer;
}

/** What is different in an option: this in place of that, something more, or something less. */
export function SwapFields({ option }: { option: number }) {
  const name = `definition.options.${option}.swaps`;
  const { fields, append, remove } = useFieldArray({ name });
  const { data: names = new Map<number, string>() } = useQuery(hardwareNamesQuery());
  const { data: kept = [] } = useQuery(hardwareChoicesQuery());
  const lines = (useWatch({ name: 'definition.hardware' }) ?? []) as Line[];
  const taken = lines.map(({ hardwareId }) => Number(hardwareId)).filter((id) => id > 0);
  return (
    <div className="mt-3 space-y-3">
      {fields.map((field, at) => (
        <SwapRow
          key={field.id}
          swap={`${name}.${at}`}
          taken={taken}
          lines={lines}
          kept={kept.map(({ id }) => id)}
          names={names}
          onRemove={fields.length > 1 ? () => remove(at) : undefined}
          word={`Remove change ${at + 1} of option ${option + 1}`}
        />
      ))}
      {fields.length < most && (
        <Button
          tone="quiet"
          className="-ml-3"
          onClick={() =>
            append({ ...blankSwap }, { focusName: `${name}.${fields.length}.hardwareId` })
          }
        >
          <Plus size={18} aria-hidden="true" /> Another change
        </Button>
      )}
    </div>
  );
}

interface SwapRowProps {
  swap: string;
  lines: readonly Line[];
  /** The hardware that the pattern takes so far. */
  taken: readonly number[];
  /** What the shop has to offer. */
  kept: readonly number[];
  names: ReadonlyMap<number, string>;
  onRemove: (() => void) | undefined;
  word: string;
}

function SwapRow({ swap, lines, taken, kept, names, onRemove, word }: SwapRowProps) {
  const typed = useWatch({ name: swap }) as
    { hardwareId?: unknown; byHardwareId?: unknown } | undefined;
  // What is chosen stays in sight although it is there no more: the mistake can be seen then.
  const out = choicesOf(names, [...taken, Number(typed?.hardwareId ?? 0)]);
  const comes = choicesOf(names, [...kept, Number(typed?.byHardwareId ?? 0)]);
  const adds = Number(typed?.byHardwareId ?? 0) > 0 && Number(typed?.hardwareId ?? 0) === 0;
  // What comes in its place is counted as that was, and from the same step on.
  const replaced = lines.find(({ hardwareId }) => Number(hardwareId) === Number(typed?.hardwareId));
  return (
    <div className="flex flex-wrap items-start gap-x-4 gap-y-2">
      <div className="min-w-48 grow basis-48">
        <SelectField
          key={keyOf(out)}
          name={`${swap}.hardwareId`}
          label="In place of"
          placeholder="nothing, it is added"
          whenEmpty="null"
          choices={out}
        />
      </div>
      <div className="min-w-48 grow basis-48">
        <SelectField
          key={keyOf(comes)}
          name={`${swap}.byHardwareId`}
          label="comes"
          placeholder="nothing, it is left out"
          whenEmpty="null"
          choices={comes}
        />
      </div>
      {Number(typed?.byHardwareId ?? 0) > 0 && (
        <NumberField
          name={`${swap}.perPiece`}
          label="How many"
          unit={perWords[replaced?.per ?? 'piece']}
          whenEmpty="text"
        />
      )}
      {adds && (
        <div className="min-w-56 grow basis-56">
          <NeededForField name={`${swap}.fromStep`} />
        </div>
      )}
      {onRemove && <RemoveButton label={word} onRemove={onRemove} />}
    </div>
  );
}

const choicesOf = (names: ReadonlyMap<number, string>, ids: readonly number[]): Choice[] =>
  [...new Set(ids)]
    .filter((id) => id > 0)
    .map((id) => ({ value: id, label: names.get(id) ?? 'no longer kept' }));

/** Another list is another field: a choice must stand in it before it can be shown. */
const keyOf = (choices: readonly Choice[]) =>
  choices.map(({ value, label }) => `${value} ${label}`).join();
