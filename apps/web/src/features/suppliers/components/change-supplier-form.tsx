import { changeSupplier, readSupplier, type Supplier } from '@hidewright/contract';
import { useQueryClient } from '@tanstack/react-query';
import { Checkbox } from '../../../components/checkbox.tsx';
import { Form } from '../../../components/form.tsx';
import { say } from '../../../components/toast.ts';
import { call } from '../../../lib/api.ts';
import { useChangeSupplier } from '../suppliers.mutations.ts';
import { supplierQuery } from '../suppliers.queries.ts';
import { SupplierFields } from './supplier-fields.tsx';

export function ChangeSupplierForm({ supplier }: { supplier: Supplier }) {
  const send = useChangeSupplier();
  const client = useQueryClient();
  const { queryKey } = supplierQuery(supplier.id);

  async function reload() {
    const now = await call(readSupplier, { params: { id: supplier.id } });
    client.setQueryData(queryKey, now);
    return typedOf(now);
  }

  return (
    <Form
      schema={changeSupplier.body}
      defaults={typedOf(supplier)}
      submitWord="Save"
      draftKey={`supplier-${supplier.id}`}
      onReload={reload}
      onSend={async (body) => {
        const ifMatch = client.getQueryData<Supplier>(queryKey)?.version ?? supplier.version;
        const saved = await send.mutateAsync({ params: { id: supplier.id }, body, ifMatch });
        say(`${saved.name} is saved.`);
      }}
    >
      <SupplierFields />
      <Checkbox name="active" label="We still buy from them" />
    </Form>
  );
}

function typedOf({ name, email, phone, leadDays, note, active }: Supplier) {
  return { name, email, phone, leadDays, note, active };
}
