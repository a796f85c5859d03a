import type { ReactNode } from 'react';
import { useWatch } from 'react-hook-form';
import { LinkButton } from '../../../components/link-button.tsx';
import { SelectField, type Choice } from '../../../components/select-field.tsx';

interface PatternFieldProps {
  choices: readonly Choice[];
  shelf?: ((patternId: number, customerId: number | undefined) => ReactNode) | undefined;
}

/** What is to be made; what was typed here is still there after a new pattern was made. */
export function PatternField({ choices, shelf }: PatternFieldProps) {
  const [patternId, customerId] = useWatch<{ patternId?: unknown; customerId?: unknown }>({
    name: ['patternId', 'customerId'],
  }).map((value) => Number(value) || undefined);
  return (
    <div>
      <div className="flex flex-wrap items-start gap-3">
        <div className="min-w-56 grow">
          <SelectField
            name="patternId"
            label="Pattern"
            choices={choices}
            placeholder={choices.length === 0 ? 'None yet: make the first' : 'Choose a pattern'}
          />
        </div>
        <LinkButton to="/pattern-room/patterns/new" className="min-h-10 sm:mt-7">
          New pattern
        </LinkButton>
      </div>
      {patternId !== undefined && shelf?.(patternId, customerId)}
    </div>
  );
}
