import { changeCustomer, readCustomer, type Customer } from '@hidewright/contract';
import { useQueryClient } from '@tanstack/react-query';
import { Checkbox } from '../../../components/checkbox.tsx';
import { Form } from '../../../components/form.tsx';
import { say } from '../../../components/toast.ts';
import { call } from '../../../lib/api.ts';
import { useChangeCustomer } from '../customers.mutations.ts';
import { customerQuery } from '../customers.queries.ts';
import { CustomerFields } from './customer-fields.tsx';

export function ChangeCustomerForm({ customer }: { customer: Customer }) {
  const send = useChangeCustomer();
  const client = useQueryClient();
  const { queryKey } = customerQuery(customer.id);

  async function reload() {
    const now = await call(readCustomer, { params: { id: customer.id } });
    client.setQueryData(queryKey, now);
    return typedOf(now);
  }

  return (
    <Form
      schema={changeCustomer.body}
      defaults={typedOf(customer)}
      submitWord="Save"
      draftKey={`customer-${customer.id}`}
      onReload={reload}
      onSend={async (body) => {
        const version = client.getQueryData<Customer>(queryKey)?.version ?? customer.version;
        await send.mutateAsync({ params: { id: customer.id }, body, ifMatch: version });
        say(`${body.name ?? customer.name} is saved.`);
      }}
    >
      <CustomerFields />
      <Checkbox name="active" label="We still make for them" />
    </Form>
  );
}

function typedOf({ name, contactName, email, phone, address, note, active }: Customer) {
  return { name, contactName, email, phone, address, note, active };
}
