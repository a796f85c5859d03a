import { adjustStock, type ReplyOf } from '@hidewright/contract';
import { unitWord, type HardwareUnit } from '@hidewright/domain';
import { useState, type ReactNode } from 'react';
import { AreaField } from '../../../components/area-field.tsx';
import { Form } from '../../../components/form.tsx';
import { Notice } from '../../../components/notice.tsx';
import { NumberField } from '../../../components/number-field.tsx';
import { TextField } from '../../../components/text-field.tsx';
import { say } from '../../../components/toast.ts';
import { useWorkshop } from '../../../lib/workshop.tsx';
import { signedText } from '../movement-words.ts';
import { useAdjustStock } from '../stock.mutations.ts';
import { HeldLines } from './held-list.tsx';
import { WeighInto } from './weigh-into.tsx';

type Adjusted = ReplyOf<typeof adjustStock>;

interface AdjustFormProps {
  item: { of: 'lot'; lotId: number } | { of: 'hardware'; hardwareId: number };
  /** What one of the hardware is. */
  unit?: HardwareUnit | undefined;
}

/** Sets the books to what is really there, and says which jobs that leaves short. */
export function AdjustForm({ item, unit = 'piece' }: AdjustFormProps) {
  const adjust = useAdjustStock();
  const [done, setDone] = useState<Adjusted>();
  const workshop = useWorkshop();
  return (
    <div className="space-y-4">
      {done && done.broken.length > 0 && <LeftShort done={done} />}
      <Form
        schema={adjustStock.body}
        defaults={blankFor(item)}
        submitWord="Set it"
        submitTone="secondary"
        again
        onSend={async (body) => {
          const now = await adjust.mutateAsync({ body });
          setDone(now);
          say(
            now.movement
              ? `Adjusted by ${signedText(now.movement, workshop)}.`
              : 'It is as the books say.',
          );
        }}
      >
        {item.of === 'lot' ? (
          <AreaField
            name="areaMm2"
            label="Measured now"
            help="24.75 or 24³; 0 when it is used up."
          />
        ) : (
          <>
            <NumberField name="counted" label="Counted now" unit={unitWord(unit, 2)} />
            <WeighInto name="counted" />
          </>
        )}
        <TextField name="reason" label="Why" />
      </Form>
    </div>
  );
}

function blankFor(item: AdjustFormProps['item']) {
  return item.of === 'lot'
    ? { ...item, areaMm2: '', reason: 'Measured on the rack' }
    : { ...item, counted: '' as unknown as number, reason: 'Counted on the shelf' };
}

function LeftShort({ done }: { done: Adjusted }): ReactNode {
  return (
    <Notice tone="attention" live title="Less is there than jobs hold.">
      One of these will run short; order more, or move one of them.
      <HeldLines held={done.broken} mayOpenJobs />
    </Notice>
  );
}
