import { changeLeather, readLeather, type Leather } from '@hidewright/contract';
import { useQueryClient } from '@tanstack/react-query';
import { Checkbox } from '../../../components/checkbox.tsx';
import { Form } from '../../../components/form.tsx';
import type { Choice } from '../../../components/select-field.tsx';
import { say } from '../../../components/toast.ts';
import { call } from '../../../lib/api.ts';
import { useChangeLeather } from '../leathers.mutations.ts';
import { leatherQuery } from '../leathers.queries.ts';
import { LeatherFields } from './leather-fields.tsx';

interface ChangeLeatherFormProps {
  leather: Leather;
  suppliers: readonly Choice[];
}

export function ChangeLeatherForm({ leather, suppliers }: ChangeLeatherFormProps) {
  const send = useChangeLeather();
  const client = useQueryClient();
  const { queryKey } = leatherQuery(leather.id);

  async function reload() {
    const now = await call(readLeather, { params: { id: leather.id } });
    client.setQueryData(queryKey, now);
    return typedOf(now);
  }

  return (
    <Form
      schema={changeLeather.body}
      defaults={typedOf(leather)}
      submitWord="Save"
      submitTone="secondary"
      draftKey={`leather-${leather.id}`}
      onReload={reload}
      onSend={async (body) => {
        const ifMatch = client.getQueryData<Leather>(queryKey)?.version ?? leather.version;
        const saved = await send.mutateAsync({ params: { id: leather.id }, body, ifMatch });
        say(`${saved.name} is saved.`);
      }}
    >
      <LeatherFields suppliers={suppliers} />
      <Checkbox name="active" label="We still buy it" />
    </Form>
  );
}

/** What the form asks for, from what is known of the leather now. */
function typedOf(leather: Leather) {
  return {
    name: leather.name,
    pricePerFt2: leather.pricePerFt2 ?? '',
    tannage: leather.tannage,
    colour: leather.colour,
    finish: leather.finish,
    weightLowOz: leather.weightLowOz,
    weightHighOz: leather.weightHighOz,
    supplierId: leather.supplierId,
    reorderAtMm2: leather.reorderAtMm2,
    wholeForm: leather.wholeForm,
    wholeAreaMm2: leather.wholeAreaMm2,
    wholeUsablePercent: leather.wholeUsablePercent,
    active: leather.active,
  };
}
