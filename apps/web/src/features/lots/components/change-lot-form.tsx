import { changeLot, readLot, type Lot } from '@hidewright/contract';
import { useQueryClient } from '@tanstack/react-query';
import { Form } from '../../../components/form.tsx';
import { TextField } from '../../../components/text-field.tsx';
import { WeightField } from '../../../components/weight-field.tsx';
import { say } from '../../../components/toast.ts';
import { call } from '../../../lib/api.ts';
import { useChangeLot } from '../lots.mutations.ts';
import { lotQuery } from '../lots.queries.ts';

/** Where it lies and how it looks; its area is changed by adjusting. */
export function ChangeLotForm({ lot }: { lot: Lot }) {
  const send = useChangeLot();
  const client = useQueryClient();
  const { queryKey } = lotQuery(lot.id);

  async function reload() {
    const now = await call(readLot, { params: { id: lot.id } });
    client.setQueryData(queryKey, now);
    return typedOf(now);
  }

  return (
    <Form
      schema={changeLot.body}
      defaults={typedOf(lot)}
      submitWord="Save"
      submitTone="secondary"
      draftKey={`lot-${lot.id}`}
      onReload={reload}
      onSend={async (body) => {
        const ifMatch = client.getQueryData<Lot>(queryKey)?.version ?? lot.version;
        const saved = await send.mutateAsync({ params: { id: lot.id }, body, ifMatch });
        say(`Lot ${saved.tag} is saved.`);
      }}
    >
      <TextField name="place" label="Place" optional />
      <TextField name="shade" label="Shade" optional />
      <WeightField name="weightOz" label="Weight" help="or as thick as it is: 2.4 mm" />
      <TextField name="grade" label="Grade" optional />
      <TextField name="supplierLot" label="Supplier’s lot" optional />
      <TextField name="tag" label="Tag" help="As it hangs on the leather." />
    </Form>
  );
}

function typedOf({ tag, weightOz, place, shade, grade, supplierLot }: Lot) {
  return { tag, weightOz, place, shade, grade, supplierLot };
}
