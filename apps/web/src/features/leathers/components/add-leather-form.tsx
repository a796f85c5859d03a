import { addLeather, type Leather } from '@hidewright/contract';
import { Form } from '../../../components/form.tsx';
import type { Choice } from '../../../components/select-field.tsx';
import { useAddLeather } from '../leathers.mutations.ts';
import { LeatherFields } from './leather-fields.tsx';

const blank = {
  name: '',
  pricePerFt2: '',
  weightLowOz: null,
  weightHighOz: null,
  tannage: '',
  colour: '',
  finish: '',
  supplierId: null,
  reorderAtMm2: null,
  wholeForm: null,
  wholeAreaMm2: null,
  wholeUsablePercent: '85',
};

interface AddLeatherFormProps {
  suppliers: readonly Choice[];
  onAdded: (leather: Leather) => void;
}

export function AddLeatherForm({ suppliers, onAdded }: AddLeatherFormProps) {
  const send = useAddLeather();
  return (
    <Form
      schema={addLeather.body}
      defaults={blank}
      submitWord="Add the leather"
      draftKey="leather-new"
      onSend={async (body) => onAdded(await send.mutateAsync({ body }))}
    >
      <LeatherFields suppliers={suppliers} />
    </Form>
  );
}
