import { adjustStock, type BodyInputOf, type ReplyOf } from '@hidewright/contract';
import { unitWord, type HardwareUnit } from '@hidewright/domain';
import { useQueryClient } from '@tanstack/react-query';
import { useRef, useState, type ReactNode } from 'react';
import { AreaField } from '../../../components/area-field.tsx';
import { Form } from '../../../components/form.tsx';
import { Notice } from '../../../components/notice.tsx';
import { NumberField } from '../../../components/number-field.tsx';
import { TextField } from '../../../components/text-field.tsx';
import { say } from '../../../components/toast.ts';
import { ApiProblem } from '../../../lib/api-problem.ts';
import { useWorkshop } from '../../../lib/workshop.tsx';
import { signedText } from '../movement-words.ts';
import { useAdjustStock } from '../stock.mutations.ts';
import { HeldLines } from './held-list.tsx';
import { WeighInto } from './weigh-into.tsx';

type Adjusted = ReplyOf<typeof adjustStock>;

interface AdjustFormProps {
  item: { of: 'lot'; lotId: number } | { of: 'hardware'; hardwareId: number };
  /** What the books say as the page shows it: mm² of a lot, else a count. */
  onHand: string | number;
  /** What one of the hardware is. */
  unit?: HardwareUnit | undefined;
}

/** Sets the books to what is really there, and says which jobs that leaves short. */
export function AdjustForm({ item, onHand, unit = 'piece' }: AdjustFormProps) {
  const adjust = useAdjustStock();
  const [done, setDone] = useState<Adjusted>();
  const workshop = useWorkshop();
  const client = useQueryClient();
  // What stood there when the first figure was typed; the page may be read again meanwhile.
  const seen = useRef<string | number>(undefined);

  async function set(body: BodyInputOf<typeof adjustStock>) {
    try {
      const now = await adjust.mutateAsync({
        body: { ...body, ...seenFields(item, seen.current ?? onHand) },
      });
      seen.current = undefined;
      return now;
    } catch (refusal) {
      if (refusal instanceof ApiProblem && refusal.status === 409) {
        await client.invalidateQueries({ predicate: ({ queryKey }) => queryKey[0] !== 'session' });
        seen.current = undefined;
      }
      throw refusal;
    }
  }

  return (
    <div className="space-y-4" onInput={() => (seen.current ??= onHand)}>
      {done && done.broken.length > 0 && <LeftShort done={done} />}
      <Form
        schema={adjustStock.body}
        defaults={blankFor(item)}
        submitWord="Set it"
        submitTone="secondary"
        again
        onSend={async (body) => {
          const now = await set(body);
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
            help={(examples) => `${examples}; 0 when it is used up.`}
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

function seenFields({ of }: AdjustFormProps['item'], seen: string | number) {
  return of === 'lot' ? { onHandSeenAreaMm2: String(seen) } : { onHandSeenQuantity: Number(seen) };
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
