import { countedWords } from '@hidewright/domain';
import { takeForJob, type Job } from '@hidewright/contract';
import { useState } from 'react';
import { useWatch } from 'react-hook-form';
import { z } from 'zod';
import { AreaField } from '../../../components/area-field.tsx';
import { Button } from '../../../components/button.tsx';
import { Dialog } from '../../../components/dialog.tsx';
import { Form } from '../../../components/form.tsx';
import { NumberField } from '../../../components/number-field.tsx';
import { SelectField } from '../../../components/select-field.tsx';
import { say } from '../../../components/toast.ts';
import { rackAreaText } from '../../../lib/formatting.ts';
import { useWorkshop } from '../../../lib/workshop.tsx';
import { useHoldForJob, useTakeForJob } from '../jobs.mutations.ts';
import { standsInText } from '../stand-in-words.ts';
import { MisfitNotice } from './misfit-notice.tsx';
import { MixNotice } from './mix-notice.tsx';

const does = {
  take: { leather: 'Take leather', hardware: 'Take hardware', submit: 'Take it' },
  hold: { leather: 'Hold leather', hardware: 'Hold hardware', submit: 'Hold it' },
};
type Deed = keyof typeof does;
type Kind = 'leather' | 'hardware';

interface TakeOtherProps {
  job: Job;
  /** A job that waits or is paused can hold, and takes nothing. */
  canTake: boolean;
}

/** Another amount, or from another lot, than what is held; or more to be held. */
export function TakeOther({ job, canTake }: TakeOtherProps) {
  const [open, setOpen] = useState<{ deed: Deed; kind: Kind }>();
  const close = () => setOpen(undefined);
  const kinds = {
    leather: job.lots.length > 0,
    hardware: job.hardware.length + job.standIns.length > 0,
  };
  const button = (deed: Deed, kind: Kind, word: string) =>
    kinds[kind] && (
      <Button key={word} className="min-h-11" onClick={() => setOpen({ deed, kind })}>
        {word}
      </Button>
    );
  return (
    <div className="mt-3 flex flex-wrap gap-2">
      {canTake && button('take', 'leather', 'Take another amount of leather')}
      {canTake && button('take', 'hardware', 'Take other hardware')}
      {button('hold', 'leather', 'Hold more leather')}
      {button('hold', 'hardware', 'Hold more hardware')}
      <Dialog
        open={open !== undefined}
        onOpenChange={close}
        title={open && does[open.deed][open.kind]}
      >
        {open?.kind === 'leather' && <MoveLeather job={job} deed={open.deed} onDone={close} />}
        {open?.kind === 'hardware' && <MoveHardware job={job} deed={open.deed} onDone={close} />}
      </Dialog>
    </div>
  );
}

const [ofLeather, ofHardware] = shapesOf();

/** The two shapes of an amount of stock, as the contract has them. */
function shapesOf() {
  if (!(takeForJob.body instanceof z.ZodUnion))
    throw new TypeError('A taking is of leather or of hardware');
  return takeForJob.body.options;
}

interface MoveProps {
  job: Job;
  deed: Deed;
  onDone: () => void;
}

function useDeed({ job, deed, onDone }: MoveProps) {
  const take = useTakeForJob();
  const hold = useHoldForJob();
  const { mutateAsync } = deed === 'take' ? take : hold;
  return async (body: Parameters<typeof mutateAsync>[0]['body'], from: string) => {
    await mutateAsync({ params: { id: job.id }, body });
    say(deed === 'take' ? `Taken from the ${from}.` : `Held for ${job.number}.`);
    onDone();
  };
}

function MoveLeather(props: MoveProps) {
  const workshop = useWorkshop();
  const send = useDeed(props);
  const { job, deed } = props;
  const choices = job.lots.map((lot) => ({
    value: lot.lotId,
    label: `${lot.tag}: ${rackAreaText(lot.freeAreaMm2, workshop)} free, ${rackAreaText(lot.heldAreaMm2, workshop)} held`,
  }));
  return (
    <Form
      schema={ofLeather}
      defaults={{ ...(job.lots[0] && { lotId: job.lots[0].lotId }), areaMm2: '' }}
      onSend={(body) => send(body, 'rack')}
      submitWord={does[deed].submit}
      submitSize="bench"
    >
      <SelectField name="lotId" label="Lot" choices={choices} />
      <ChosenLot job={job} />
      <AreaField name="areaMm2" label="How much" />
    </Form>
  );
}

/** What speaks against the lot that is chosen just now. */
function ChosenLot({ job }: { job: Job }) {
  const chosen = Number(useWatch({ name: 'lotId' }));
  const lot = job.lots.find(({ lotId }) => lotId === chosen);
  return (
    <>
      <MixNotice lot={lot} />
      <MisfitNotice lot={lot} />
    </>
  );
}

function MoveHardware(props: MoveProps) {
  const send = useDeed(props);
  const { job, deed } = props;
  const choices = [...job.hardware, ...job.standIns].map((item) => ({
    value: item.hardwareId,
    label: [`${item.name}: ${countedWords(item.free, item.unit)} free`, standsInText(item)]
      .filter(Boolean)
      .join(', '),
  }));
  return (
    <Form
      schema={ofHardware}
      defaults={job.hardware[0] ? { hardwareId: job.hardware[0].hardwareId } : {}}
      onSend={(body) => send(body, 'shelf')}
      submitWord={does[deed].submit}
      submitSize="bench"
    >
      <SelectField name="hardwareId" label="Hardware" choices={choices} />
      <NumberField name="quantity" label="How many" />
    </Form>
  );
}
