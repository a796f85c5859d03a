import { countedWords, unitWord } from '@hidewright/domain';
import { returnFromJob, type Job, type JobHardware, type JobLot } from '@hidewright/contract';
import { useState, type ReactNode } from 'react';
import { z } from 'zod';
import { AreaField } from '../../../components/area-field.tsx';
import { Button } from '../../../components/button.tsx';
import { Dialog } from '../../../components/dialog.tsx';
import { Form } from '../../../components/form.tsx';
import { NumberField } from '../../../components/number-field.tsx';
import { say } from '../../../components/toast.ts';
import { areaText } from '../../../lib/formatting.ts';
import { useWorkshop } from '../../../lib/workshop.tsx';
import { useReturnFromJob } from '../jobs.mutations.ts';

const [ofLeather, ofHardware] = shapesOf();

/** The two shapes of an amount of stock, as the contract has them. */
function shapesOf() {
  if (!(returnFromJob.body instanceof z.ZodUnion))
    throw new TypeError('What comes back is leather or hardware');
  return returnFromJob.body.options;
}

function BringBack({ what, form }: { what: string; form: (onDone: () => void) => ReactNode }) {
  const [open, setOpen] = useState(false);
  return (
    <>
      <Button className="min-h-11 print:hidden" onClick={() => setOpen(true)}>
        Bring back<span className="sr-only"> {what}</span>
      </Button>
      <Dialog open={open} onOpenChange={setOpen} title={`Bring back ${what}`}>
        {form(() => setOpen(false))}
      </Dialog>
    </>
  );
}

/** Leather that was taken and not cut goes back on its lot. */
export function BringLeatherBack({ job, lot }: { job: Job; lot: JobLot }) {
  const { areaUnit } = useWorkshop();
  const { mutateAsync } = useReturnFromJob();
  return (
    <BringBack
      what={`to lot ${lot.tag}`}
      form={(onDone) => (
        <Form
          schema={ofLeather}
          defaults={{ lotId: lot.lotId, areaMm2: lot.takenAreaMm2 }}
          onSend={async (body) => {
            await mutateAsync({ params: { id: job.id }, body });
            onDone();
            say(`Back on lot ${lot.tag}.`);
          }}
          submitWord="Bring it back"
          submitSize="bench"
        >
          <AreaField
            name="areaMm2"
            label="How much"
            help={`${areaText(lot.takenAreaMm2, areaUnit)} is taken. What is cut up stays spent; a piece worth keeping goes back as an offcut.`}
          />
        </Form>
      )}
    />
  );
}

/** Hardware that was taken and not set goes back in its bin. */
export function BringHardwareBack({ job, item }: { job: Job; item: JobHardware }) {
  const { mutateAsync } = useReturnFromJob();
  return (
    <BringBack
      what={item.name}
      form={(onDone) => (
        <Form
          schema={ofHardware}
          defaults={{ hardwareId: item.hardwareId, quantity: item.taken }}
          onSend={async (body) => {
            await mutateAsync({ params: { id: job.id }, body });
            onDone();
            say(`${item.name}: back on the shelf.`);
          }}
          submitWord="Bring it back"
          submitSize="bench"
        >
          <NumberField
            name="quantity"
            label="How many"
            unit={item.unit === 'piece' ? undefined : unitWord(item.unit, 2)}
            help={`Taken: ${countedWords(item.taken, item.unit)}.`}
          />
        </Form>
      )}
    />
  );
}
