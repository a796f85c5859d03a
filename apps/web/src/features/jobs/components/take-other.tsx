import type { Job } from '@hidewright/contract';
import { takeForJob } from '@hidewright/contract';
import { useState } from 'react';
import { z } from 'zod';
import { AreaField } from '../../../components/area-field.tsx';
import { Button } from '../../../components/button.tsx';
import { Dialog } from '../../../components/dialog.tsx';
import { Form } from '../../../components/form.tsx';
import { NumberField } from '../../../components/number-field.tsx';
import { SelectField } from '../../../components/select-field.tsx';
import { say } from '../../../components/toast.ts';
import { areaText } from '../../../lib/formatting.ts';
import { useWorkshop } from '../../../lib/workshop.tsx';
import { useTakeForJob } from '../jobs.mutations.ts';

/** Another amount, or from another lot, than what is held. */
export function TakeOther({ job }: { job: Job }) {
  const [open, setOpen] = useState<'leather' | 'hardware'>();
  const close = () => setOpen(undefined);
  return (
    <div className="mt-3 flex flex-wrap gap-2">
      {job.lots.length > 0 && (
        <Button className="min-h-11" onClick={() => setOpen('leather')}>
          Take another amount of leather
        </Button>
      )}
      {job.hardware.length > 0 && (
        <Button className="min-h-11" onClick={() => setOpen('hardware')}>
          Take other hardware
        </Button>
      )}
      <Dialog open={open === 'leather'} onOpenChange={close} title="Take leather">
        <TakeLeather job={job} onDone={close} />
      </Dialog>
      <Dialog open={open === 'hardware'} onOpenChange={close} title="Take hardware">
        <TakeHardware job={job} onDone={close} />
      </Dialog>
    </div>
  );
}

const [leatherTaking, hardwareTaking] = shapesOf();

/** The two shapes of a taking, as the contract has them. */
function shapesOf() {
  if (!(takeForJob.body instanceof z.ZodUnion))
    throw new TypeError('A taking is of leather or of hardware');
  return takeForJob.body.options;
}

interface TakeProps {
  job: Job;
  onDone: () => void;
}

function TakeLeather({ job, onDone }: TakeProps) {
  const { areaUnit } = useWorkshop();
  const { mutateAsync } = useTakeForJob();
  const choices = job.lots.map((lot) => ({
    value: lot.lotId,
    label: `${lot.tag}: ${areaText(lot.freeAreaMm2, areaUnit)} free, ${areaText(lot.heldAreaMm2, areaUnit)} held`,
  }));
  return (
    <Form
      schema={leatherTaking}
      defaults={{ ...(job.lots[0] && { lotId: job.lots[0].lotId }), areaMm2: '' }}
      onSend={async (body) => {
        await mutateAsync({ params: { id: job.id }, body });
        say('Taken from the rack.');
        onDone();
      }}
      submitWord="Take it"
      submitSize="bench"
    >
      <SelectField name="lotId" label="Lot" choices={choices} />
      <AreaField name="areaMm2" label="How much" />
    </Form>
  );
}

function TakeHardware({ job, onDone }: TakeProps) {
  const { mutateAsync } = useTakeForJob();
  const choices = job.hardware.map((item) => ({
    value: item.hardwareId,
    label: `${item.name}: ${item.free} free`,
  }));
  return (
    <Form
      schema={hardwareTaking}
      defaults={job.hardware[0] ? { hardwareId: job.hardware[0].hardwareId } : {}}
      onSend={async (body) => {
        await mutateAsync({ params: { id: job.id }, body });
        say('Taken from the shelf.');
        onDone();
      }}
      submitWord="Take it"
      submitSize="bench"
    >
      <SelectField name="hardwareId" label="Hardware" choices={choices} />
      <NumberField name="quantity" label="How many" />
    </Form>
  );
}
