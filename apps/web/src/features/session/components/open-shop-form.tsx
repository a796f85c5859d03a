import { openShop } from '@hidewright/contract';
import { Form } from '../../../components/form.tsx';
import { TextField } from '../../../components/text-field.tsx';
import { useOpenShop } from '../session.mutations.ts';

/** All that a new shop must say; everything else has a sensible value that can be changed later. */
export function OpenShopForm({ onOpened }: { onOpened: () => void }) {
  const send = useOpenShop();
  return (
    <Form
      schema={openShop.body}
      defaults={{ workshopName: '', ownerName: '', email: '', password: '' }}
      submitWord="Open the shop"
      onSend={async (body) => {
        await send.mutateAsync({ body });
        onOpened();
      }}
    >
      <TextField name="workshopName" label="Name of the shop" autoComplete="organization" />
      <TextField name="ownerName" label="Your name" autoComplete="name" />
      <TextField
        name="email"
        type="email"
        label="E-mail address"
        help="You sign in with it."
        autoComplete="username"
      />
      <TextField
        name="password"
        type="password"
        label="Password"
        help="At least 15 characters. A few words in a row are easy to remember."
        autoComplete="new-password"
      />
    </Form>
  );
}
