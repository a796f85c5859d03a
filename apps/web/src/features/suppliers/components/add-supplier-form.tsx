import { addSupplier, type Supplier } from '@hidewright/contract';
import { Form } from '../../../components/form.tsx';
import { useAddSupplier } from '../suppliers.mutations.ts';
import { SupplierFields } from './supplier-fields.tsx';

const blank = { name: '', email: '', phone: '', leadDays: 7, note: '' };

export function AddSupplierForm({ onAdded }: { onAdded: (supplier: Supplier) => void }) {
  const send = useAddSupplier();
  return (
    <Form
      schema={addSupplier.body}
      defaults={blank}
      submitWord="Add the supplier"
      draftKey="supplier-new"
      onSend={async (body) => onAdded(await send.mutateAsync({ body }))}
    >
      <SupplierFields />
    </Form>
  );
}
