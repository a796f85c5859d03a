import { unitWord } from '@hidewright/domain';
import { finishJob, type Job } from '@hidewright/contract';
import { AreaField } from '../../../components/area-field.tsx';
import { Card } from '../../../components/card.tsx';
import { Form } from '../../../components/form.tsx';
import { Notice } from '../../../components/notice.tsx';
import { NumberField } from '../../../components/number-field.tsx';
import { say } from '../../../components/toast.ts';
import { useFinishJob } from '../jobs.mutations.ts';

/** The last thing on the ticket: what came out, and what goes back. */
export function FinishCard({ job }: { job: Job }) {
  const { mutateAsync } = useFinishJob();
  const last = job.steps.findLast(({ per }) => per === 'piece' || per === 'strike');
  const leather = job.lots.filter(({ takenAreaMm2 }) => takenAreaMm2 !== '0');
  const hardware = job.hardware.filter(({ taken }) => taken > 0);
  const open = job.steps.filter(({ done }) => !done).map(({ name }) => name);
  return (
    <Card title="Finish" subtitle="What is still held is let go, and the order is packed.">
      {open.length > 0 && (
        <Notice tone="attention" className="mb-4">
          Not all is logged: {open.join(', ')}.
        </Notice>
      )}
      {leather.length === 0 && (
        <Notice tone="attention" className="mb-4">
          No leather is taken for this job yet.
        </Notice>
      )}
      <Form
        schema={finishJob.body}
        draftKey={`finish-${job.id}`}
        defaults={{
          ...(last !== undefined && last.good > 0 && { good: last.good }),
          seconds: last?.seconds ?? 0,
          leatherLeft: leather.map(({ lotId }) => ({ lotId, areaMm2: '0' })),
          hardwareLeft: hardware.map(({ hardwareId }) => ({ hardwareId, quantity: 0 })),
        }}
        onSend={async (body) => {
          await mutateAsync({ params: { id: job.id }, body });
          say(`${job.number} is finished, and ${job.orderNumber} is packed.`);
        }}
        submitWord="Finish and pack"
        submitSize="bench"
      >
        <NumberField
          name="good"
          label="Good pieces"
          help={`${job.quantity} are ordered; more go on the shelf of finished pieces.`}
        />
        <NumberField
          name="seconds"
          label="Seconds"
          help="Good enough to sell for less; they go on the shelf."
        />
        {leather.map(({ lotId, tag }, at) => (
          <AreaField
            key={lotId}
            name={`leatherLeft.${at}.areaMm2`}
            label={`Left of lot ${tag}`}
            help="Goes back to the lot that it was taken from. What is cut off gets a tag of its own above, as an offcut."
          />
        ))}
        {hardware.map(({ hardwareId, name, unit }, at) => (
          <NumberField
            key={hardwareId}
            name={`hardwareLeft.${at}.quantity`}
            label={`Left: ${name}`}
            unit={unit === 'piece' ? undefined : unitWord(unit, 2)}
          />
        ))}
      </Form>
    </Card>
  );
}
