import { addCustomer, type Customer } from '@hidewright/contract';
import { Form } from '../../../components/form.tsx';
import { TextField } from '../../../components/text-field.tsx';
import { useAddCustomer } from '../customers.mutations.ts';
import { CustomerFields } from './customer-fields.tsx';

interface AddCustomerFormProps {
  onAdded: (customer: Customer) => void;
  /** Only what a first quote needs; the rest can come later. */
  brief?: boolean;
}

const blank = { name: '', contactName: '', email: '', phone: '', address: '', note: '' };

export function AddCustomerForm({ onAdded, brief = false }: AddCustomerFormProps) {
  const send = useAddCustomer();
  return (
    <Form
      schema={addCustomer.body}
      defaults={blank}
      submitWord="Add the customer"
      draftKey={brief ? undefined : 'customer-new'}
      onSend={async (body) => onAdded(await send.mutateAsync({ body }))}
    >
      {brief ? <BriefFields /> : <CustomerFields />}
    </Form>
  );
}

function BriefFields() {
  return (
    <>
      <TextField name="name" label="Name" />
      <TextField
        name="email"
        type="email"
        label="E-mail address"
        optional
        help="Without one the quote goes by hand, as a link and text to copy."
      />
    </>
  );
}
