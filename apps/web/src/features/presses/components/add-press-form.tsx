import { addPress, type PressReply } from '@hidewright/contract';
import { Form } from '../../../components/form.tsx';
import { useAddPress } from '../presses.mutations.ts';
import { PressFields } from './press-fields.tsx';

const blank = {
  name: '',
  bedWidthMm: '',
  bedDepthMm: '',
  throatMm: null,
  shutHeightMm: null,
  ruleMm: null,
  reliefAreaMm2: null,
};

export function AddPressForm({ onAdded }: { onAdded: (press: PressReply) => void }) {
  const send = useAddPress();
  return (
    <Form
      schema={addPress.body}
      defaults={blank}
      submitWord="Add the press"
      draftKey="press-new"
      again
      onSend={async (body) => onAdded(await send.mutateAsync({ body }))}
    >
      <PressFields />
    </Form>
  );
}
