import { addPerson } from '@hidewright/contract';
import { Form } from '../../../components/form.tsx';
import { SelectField } from '../../../components/select-field.tsx';
import { TextField } from '../../../components/text-field.tsx';
import { say } from '../../../components/toast.ts';
import { useAddPerson } from '../office.mutations.ts';

const roles = [
  { value: 'maker', label: 'maker: works the tickets, sees no prices' },
  { value: 'bookkeeper', label: 'bookkeeper: invoices, payments, sales sheets' },
  { value: 'owner', label: 'owner: everything' },
];

export function AddPersonForm() {
  const send = useAddPerson();
  return (
    <Form
      schema={addPerson.body}
      defaults={{ name: '', email: '', role: 'maker', password: '' }}
      submitWord="Add"
      again
      onSend={async (body) => {
        const person = await send.mutateAsync({ body });
        say(`${person.name} can sign in now.`);
      }}
    >
      <TextField name="name" label="Name" />
      <TextField name="email" type="email" label="E-mail address" />
      <SelectField name="role" label="Role" choices={roles} />
      <TextField
        name="password"
        type="password"
        label="First password"
        help="At least 15 characters. Tell it to them in person."
        autoComplete="new-password"
      />
    </Form>
  );
}
