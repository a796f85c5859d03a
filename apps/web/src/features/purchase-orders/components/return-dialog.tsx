import { returnToSupplier, type Receipt } from '@hidewright/contract';
import { useState } from 'react';
import { useFormContext } from 'react-hook-form';
import { Dialog } from '../../../components/dialog.tsx';
import { Field } from '../../../components/field.tsx';
import { Form } from '../../../components/form.tsx';
import { NumberField } from '../../../components/number-field.tsx';
import { SelectInput } from '../../../components/select-input.tsx';
import { TextField } from '../../../components/text-field.tsx';
import { say } from '../../../components/toast.ts';
import { rackAreaText } from '../../../lib/formatting.ts';
import { useWorkshop } from '../../../lib/workshop.tsx';
import { useReturnToSupplier } from '../purchase-orders.mutations.ts';

interface ReturnDialogProps {
  orderId: number;
  receipts: readonly Receipt[];
  onClose: () => void;
}

interface Choice {
  key: string;
  label: string;
  values: { of: 'lot'; lotId: number } | { of: 'hardware'; hardwareId: number };
}

/** Everything that came, lots by their tag and hardware once. */
function useChoices(receipts: readonly Receipt[]): Choice[] {
  const workshop = useWorkshop();
  const choices = new Map<string, Choice>();
  for (const line of receipts.flatMap((receipt) => receipt.lines)) {
    const { lotId, lotTag, hardwareId, name, areaMm2 } = line;
    const key = lotId === null ? `hardware-${hardwareId}` : `lot-${lotId}`;
    const label =
      lotId === null ? name : `${lotTag}, ${name}, ${rackAreaText(areaMm2 ?? '0', workshop)}`;
    const values =
      lotId === null
        ? ({ of: 'hardware', hardwareId: hardwareId ?? 0 } as const)
        : ({ of: 'lot', lotId } as const);
    choices.set(key, { key, label, values });
  }
  return [...choices.values()];
}

/** A lot goes back whole, hardware by count; it leaves the stock at what it stands at. */
export function ReturnDialog({ orderId, receipts, onClose }: ReturnDialogProps) {
  const send = useReturnToSupplier();
  const choices = useChoices(receipts);
  return (
    <Dialog
      open
      onOpenChange={onClose}
      title="What goes back?"
      description="What is held for jobs stays. The supplier is not told by this: write to them yourself. What it was paid for stands open among the claims until they credit it."
    >
      <Form
        schema={returnToSupplier.body}
        defaults={{ ...choices[0]?.values, reason: '' } as object}
        submitWord="Send it back"
        onSend={async (body) => {
          const moved = await send.mutateAsync({ params: { id: orderId }, body });
          onClose();
          say(`${moved.lotTag ?? moved.hardwareName} is off the rack.`);
        }}
      >
        <WhatGoesBack choices={choices} />
        <TextField name="reason" label="Why" help="Such as wrong colour, or broken in the box." />
      </Form>
    </Dialog>
  );
}

function WhatGoesBack({ choices }: { choices: readonly Choice[] }) {
  const { reset, getValues } = useFormContext();
  const [key, setKey] = useState(choices[0]?.key ?? '');
  const chosen = choices.find((choice) => choice.key === key);

  function choose(next: string) {
    setKey(next);
    const values = choices.find((choice) => choice.key === next)?.values;
    reset({ ...values, reason: (getValues() as { reason?: string }).reason ?? '' });
  }

  return (
    <>
      <Field id="goes-back" label="What">
        <SelectInput
          id="goes-back"
          value={key}
          invalid={false}
          onChange={(event) => choose(event.target.value)}
        >
          {choices.map((choice) => (
            <option key={choice.key} value={choice.key} className="bg-card text-ink">
              {choice.label}
            </option>
          ))}
        </SelectInput>
      </Field>
      {chosen?.values.of === 'hardware' ? (
        <NumberField name="quantity" label="How many" />
      ) : (
        <p className="text-ink-soft">All that is left of it goes back.</p>
      )}
    </>
  );
}
