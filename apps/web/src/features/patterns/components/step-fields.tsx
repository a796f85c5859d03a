import { stepUnits } from '@hidewright/contract';
import { ArrowDown, ArrowUp, Plus } from 'lucide-react';
import type { ReactNode } from 'react';
import { useFieldArray, useFormContext } from 'react-hook-form';
import { Button } from '../../../components/button.tsx';
import { DecimalField } from '../../../components/decimal-field.tsx';
import { SelectField } from '../../../components/select-field.tsx';
import { TextField } from '../../../components/text-field.tsx';
import { afterMove, afterRemoval, linesThatWait } from '../typed-parts.ts';
import { blankStep } from '../typed-work.ts';
import { FieldRow } from './field-row.tsx';
import { MoreOfStep } from './more-of-step.tsx';
import { RemoveButton } from '../../../components/remove-button.tsx';

const name = 'definition.work.steps';
const perChoices = stepUnits.map((unit) => ({ value: unit, label: `per ${unit}` }));
const most = 40;

/** The operations of the work, in their order on the ticket. */
export function StepFields() {
  const { fields, append, remove, move } = useFieldArray({ name });
  const hardwareFollows = useHardwareThatFollows();
  const moveStep = (from: number, to: number) => {
    move(from, to);
    hardwareFollows((step) => afterMove(step, from, to));
  };
  const removeStep = (at: number) => {
    remove(at);
    hardwareFollows((step) => afterRemoval(step, at));
  };
  return (
    <div>
      <ol className="space-y-4">
        {fields.map((field, at) => (
          <StepRow key={field.id} at={at}>
            <MoveButton up at={at} disabled={at === 0} onMove={() => moveStep(at, at - 1)} />
            <MoveButton
              at={at}
              disabled={at === fields.length - 1}
              onMove={() => moveStep(at, at + 1)}
            />
            {fields.length > 1 && (
              <RemoveButton label={`Remove step ${at + 1}`} onRemove={() => removeStep(at)} />
            )}
          </StepRow>
        ))}
      </ol>
      {fields.length < most && (
        <Button
          tone="quiet"
          className="mt-2 -ml-3"
          onClick={() => append(blankStep, { focusName: `${name}.${fields.length}.name` })}
        >
          <Plus size={18} aria-hidden="true" /> Another step
        </Button>
      )}
    </div>
  );
}

/** Hardware that waits for a step goes on waiting for it when it changes places. */
function useHardwareThatFollows() {
  const { getValues, setValue } = useFormContext();
  return (follow: (step: number) => number | undefined) => {
    for (const line of linesThatWait(getValues('definition') as Record<string, unknown>)) {
      const step: unknown = getValues(`${line}.fromStep`);
      if (typeof step !== 'number') continue;
      setValue(`${line}.fromStep`, follow(step), { shouldDirty: true });
    }
  };
}

function StepRow({ at, children }: { at: number; children: ReactNode }) {
  const field = (part: string) => `${name}.${at}.${part}`;
  return (
    <li className="rounded border border-stitch p-3">
      <div className="flex flex-wrap items-start gap-x-2">
        <div className="min-w-40 grow">
          <TextField name={field('name')} label={`Step ${at + 1}`} />
        </div>
        <div className="flex">{children}</div>
      </div>
      <div className="mt-3">
        <FieldRow>
          <DecimalField name={field('setupMinutes')} label="Setup" unit="min" />
          <DecimalField name={field('secondsPerUnit')} label="Each takes" unit="s" />
          <SelectField name={field('per')} label="Counted" choices={perChoices} short />
          <DecimalField name={field('rejectPercent')} label="Rejects" unit="%" />
        </FieldRow>
      </div>
      <div className="mt-2">
        <MoreOfStep at={at} />
      </div>
    </li>
  );
}

interface MoveButtonProps {
  at: number;
  up?: boolean;
  disabled: boolean;
  onMove: () => void;
}

function MoveButton({ at, up = false, disabled, onMove }: MoveButtonProps) {
  const Icon = up ? ArrowUp : ArrowDown;
  return (
    <button
      type="button"
      onClick={onMove}
      disabled={disabled}
      aria-label={`Move step ${at + 1} ${up ? 'up' : 'down'}`}
      className="mt-7 grid size-10 place-items-center rounded text-ink-soft hover:bg-manila disabled:opacity-40"
    >
      <Icon size={18} aria-hidden="true" />
    </button>
  );
}
