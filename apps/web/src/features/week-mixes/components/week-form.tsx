import { workOutWeekMix, type WeekMixReply, type WeekStart } from '@hidewright/contract';
import { Button } from '../../../components/button.tsx';
import { DecimalField } from '../../../components/decimal-field.tsx';
import { Form } from '../../../components/form.tsx';
import { MoneyField } from '../../../components/money-field.tsx';
import { Stitch } from '../../../components/stitch.tsx';
import { draftKey, keepWeek, weekToType } from '../typed-week.ts';
import { useWorkOutWeekMix } from '../week-mixes.mutations.ts';
import { KindFields } from './kind-fields.tsx';

interface WeekFormProps {
  start: WeekStart;
  /** Whose last week it begins with. */
  person: string;
  onMix: (mix: WeekMixReply) => void;
  onStartAfresh: () => void;
}

/** The hours there are, what the shop needs, and each kind of work that the week can hold. */
export function WeekForm({ start, person, onMix, onStartAfresh }: WeekFormProps) {
  const send = useWorkOutWeekMix();
  return (
    <Form
      schema={workOutWeekMix.body}
      defaults={weekToType(start, person)}
      submitWord="Work it out"
      draftKey={draftKey}
      actions={
        <Button tone="quiet" onClick={onStartAfresh}>
          Start from our runs again
        </Button>
      }
      onSend={async (body) => {
        onMix(await send.mutateAsync({ body }));
        keepWeek(person, body);
      }}
    >
      <DecimalField
        name="hoursPerWeek"
        label="Hours a week"
        unit="h"
        help="All hands together, at the bench and at the desk."
      />
      <DecimalField
        name="deskHoursPerWeek"
        label="Desk time of no order"
        unit="h"
        help="Books, buying, mail: it comes off first."
      />
      <MoneyField
        name="incomeNeeded"
        label="Income the shop needs a week"
        help="Before wages: rent, wages, everything that is not bought for one order."
      />
      <Stitch />
      <KindFields deskMinutes={start.week.kinds[0]?.deskMinutes} />
    </Form>
  );
}
