import { drawLot, type Lot, type LotDrawing } from '@hidewright/contract';
import { DecimalField } from '../../../components/decimal-field.tsx';
import { Form } from '../../../components/form.tsx';
import { say } from '../../../components/toast.ts';
import { useDrawLot } from '../lots.mutations.ts';

interface UsableShareFormProps {
  lot: Lot;
  drawing: LotDrawing;
}

/** Where nothing is drawn: how much of the lot can be cut. */
export function UsableShareForm({ lot, drawing }: UsableShareFormProps) {
  const send = useDrawLot();
  const { outline, flaws, usablePercent, version } = drawing;
  return (
    <Form
      schema={drawLot.body}
      defaults={{ outline, flaws, usablePercent }}
      submitWord="Save"
      submitTone="secondary"
      onSend={async (body) => {
        await send.mutateAsync({ params: { id: lot.id }, body, ifMatch: version });
        say(`Of lot ${lot.tag}, ${body.usablePercent} % can be cut.`);
      }}
    >
      <DecimalField
        name="usablePercent"
        label="Usable share"
        unit="%"
        help="by your own eye; edges, brands and holes taken off"
      />
    </Form>
  );
}
