import { addHardware, type Hardware } from '@hidewright/contract';
import { Form } from '../../../components/form.tsx';
import type { Choice } from '../../../components/select-field.tsx';
import { useAddHardware } from '../hardware.mutations.ts';
import { HardwareFields } from './hardware-fields.tsx';

const blank = {
  kind: 'hardware' as const,
  name: '',
  unitPrice: '',
  packSize: 1,
  reorderAt: 0,
  supplierId: null,
  unit: 'piece' as const,
  metal: '',
  colour: '',
  bin: '',
  fromCustomer: false,
  priceFromParts: false,
  parts: [],
  standIns: [],
  postLengthMm: null,
  stackMinMm: null,
  stackMaxMm: null,
  settingDie: '',
  settingDieHere: true,
};

interface AddHardwareFormProps {
  suppliers: readonly Choice[];
  onAdded: (hardware: Hardware) => void;
}

export function AddHardwareForm({ suppliers, onAdded }: AddHardwareFormProps) {
  const send = useAddHardware();
  return (
    <Form
      schema={addHardware.body}
      defaults={blank}
      submitWord="Add it"
      draftKey="hardware-new"
      onSend={async (body) => onAdded(await send.mutateAsync({ body }))}
    >
      <HardwareFields suppliers={suppliers} />
    </Form>
  );
}
