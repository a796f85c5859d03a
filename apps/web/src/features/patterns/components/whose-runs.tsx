import type { Learned } from '@hidewright/contract';
import { useId } from 'react';
import { Button } from '../../../components/button.tsx';
import { Notice } from '../../../components/notice.tsx';
import { SelectInput } from '../../../components/select-input.tsx';
import { say } from '../../../components/toast.ts';
import { dayText } from '../../../lib/formatting.ts';
import { useWorkshop } from '../../../lib/workshop.tsx';
import { runsWord } from '../learned-words.ts';
import { useDropDesign } from '../patterns.mutations.ts';

interface WhoseRunsProps {
  learned: Learned;
  /** Undefined for everybody's. */
  onChoose: (customerId: number | undefined) => void;
}

/** Whose runs are looked at: a customer who always takes the same piece can have an estimate of their own. */
export function WhoseRuns({ learned, onChoose }: WhoseRunsProps) {
  const id = useId();
  const { customers, customerId, design } = learned;
  if (customers.length === 0) return null;
  return (
    <div className="space-y-3">
      <div className="max-w-sm">
        <label htmlFor={id} className="mb-1 block font-semibold">
          Runs of
        </label>
        <SelectInput
          id={id}
          value={customerId ?? ''}
          onChange={(event) => onChoose(Number(event.target.value) || undefined)}
        >
          <option value="">everybody</option>
          {customers.map((each) => (
            <option key={each.id} value={each.id}>
              {`${each.name}, ${runsWord(each.runs)}`}
            </option>
          ))}
        </SelectInput>
      </div>
      {design !== null && <OwnDesign design={design} />}
    </div>
  );
}

function OwnDesign({ design }: { design: NonNullable<Learned['design']> }) {
  const { today } = useWorkshop();
  const send = useDropDesign();
  const { customerName, learnedOn, runs } = design;
  return (
    <Notice
      tone="info"
      actions={
        <Button
          busy={send.isPending}
          onClick={() =>
            send.mutate(
              { params: { id: design.id } },
              { onSuccess: () => say(`Quotes for ${customerName} go by the pattern again.`) },
            )
          }
        >
          Go by the pattern again
        </Button>
      }
    >
      {`Quotes for ${customerName} go by their own ${runsWord(runs)}, since ${dayText(learnedOn, today)}.`}
    </Notice>
  );
}
