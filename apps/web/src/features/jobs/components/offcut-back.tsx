import { putOffcutBack, type Job, type JobLot, type Lot } from '@hidewright/contract';
import { useState } from 'react';
import { AreaField } from '../../../components/area-field.tsx';
import { Button } from '../../../components/button.tsx';
import { Dialog } from '../../../components/dialog.tsx';
import { Form } from '../../../components/form.tsx';
import { LengthField } from '../../../components/length-field.tsx';
import { LinkButton } from '../../../components/link-button.tsx';
import { More } from '../../../components/more.tsx';
import { Notice } from '../../../components/notice.tsx';
import { TextField } from '../../../components/text-field.tsx';
import { areaText } from '../../../lib/formatting.ts';
import { useWorkshop } from '../../../lib/workshop.tsx';
import { usePutOffcutBack } from '../jobs.mutations.ts';

interface OffcutBackProps {
  job: Job;
  lot: JobLot;
}

/** What is left of leather that was taken goes back on the rack with a tag of its own. */
export function OffcutBack({ job, lot }: OffcutBackProps) {
  const [open, setOpen] = useState(false);
  const [offcut, setOffcut] = useState<Lot>();
  const close = () => {
    setOpen(false);
    setOffcut(undefined);
  };
  return (
    <>
      <Button className="min-h-11 print:hidden" onClick={() => setOpen(true)}>
        Put an offcut back<span className="sr-only"> of lot {lot.tag}</span>
      </Button>
      <Dialog open={open} onOpenChange={close} title={`Offcut of lot ${lot.tag}`}>
        {offcut ? (
          <OnTheRack offcut={offcut} onDone={close} />
        ) : (
          <OffcutForm job={job} lot={lot} onBack={setOffcut} />
        )}
      </Dialog>
    </>
  );
}

function OffcutForm({ job, lot, onBack }: OffcutBackProps & { onBack: (offcut: Lot) => void }) {
  const { areaUnit } = useWorkshop();
  const { mutateAsync } = usePutOffcutBack();
  return (
    <Form
      schema={putOffcutBack.body}
      defaults={{ lotId: lot.lotId, widthMm: null, heightMm: null, areaMm2: null, place: '' }}
      onSend={async (body) => onBack(await mutateAsync({ params: { id: job.id }, body }))}
      submitWord="Put it back"
      submitSize="bench"
    >
      <p className="text-ink-soft">
        Taken for {job.number}: {areaText(lot.takenAreaMm2, areaUnit)}.
      </p>
      <LengthField name="widthMm" label="Width" whenEmpty="null" />
      <LengthField name="heightMm" label="Height" whenEmpty="null" />
      <More word="It is no rectangle" names={['areaMm2']}>
        <AreaField
          name="areaMm2"
          label="Area"
          whenEmpty="null"
          optional
          help="As you measured it, with its width and height or without."
        />
      </More>
      <TextField name="place" label="Place" optional help="Where it lies, such as offcut bin 2." />
    </Form>
  );
}

function OnTheRack({ offcut, onDone }: { offcut: Lot; onDone: () => void }) {
  const { areaUnit } = useWorkshop();
  return (
    <Notice
      tone="ok"
      live
      title={`Write ${offcut.tag} on it.`}
      actions={
        <>
          <LinkButton to={`/stockroom/tags?lots=${offcut.id}`} className="min-h-11">
            Print its tag
          </LinkButton>
          <Button tone="primary" className="min-h-11" onClick={onDone}>
            Done
          </Button>
        </>
      }
    >
      {areaText(offcut.measuredAreaMm2, areaUnit)} on the rack, free for the next job.
    </Notice>
  );
}
