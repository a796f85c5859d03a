import { signIn } from '@hidewright/contract';
import { Form } from '../../../components/form.tsx';
import { TextField } from '../../../components/text-field.tsx';
import { useSignIn } from '../session.mutations.ts';

export function SignInForm({ onSignedIn }: { onSignedIn: () => void }) {
  const send = useSignIn();
  return (
    <Form
      schema={signIn.body}
      defaults={{ email: '', password: '' }}
      submitWord="Sign in"
      onSend={async (body) => {
        await send.mutateAsync({ body });
        onSignedIn();
      }}
    >
      <TextField name="email" type="email" label="E-mail address" autoComplete="username" />
      <TextField name="password" type="password" label="Password" autoComplete="current-password" />
    </Form>
  );
}
