import { addHardware, type Hardware } from '@hidewright/contract';
import { Dialog } from '../../../components/dialog.tsx';
import { Form } from '../../../components/form.tsx';
import { MoneyField } from '../../../components/money-field.tsx';
import { RadioCards } from '../../../components/radio-cards.tsx';
import { TextField } from '../../../components/text-field.tsx';
import { useAddHardware } from '../patterns.mutations.ts';

interface AddHardwareDialogProps {
  open: boolean;
  onOpenChange: (open: boolean) => void;
  onAdded: (hardware: Hardware) => void;
}

const kinds = [
  { value: 'hardware', label: 'Hardware', detail: 'rivets, snaps, rings' },
  { value: 'supplies', label: 'Supplies', detail: 'thread, boxes' },
];

/** A name and a price are enough to price a run; the rest has its place in the stockroom. */
export function AddHardwareDialog({ open, onOpenChange, onAdded }: AddHardwareDialogProps) {
  const send = useAddHardware();
  return (
    <Dialog open={open} onOpenChange={onOpenChange} title="New hardware">
      <Form
        schema={addHardware.body}
        defaults={{ name: '', kind: 'hardware', unitPrice: '' }}
        submitWord="Add the hardware"
        onSend={async (body) => {
          onAdded(await send.mutateAsync({ body }));
          onOpenChange(false);
        }}
      >
        <RadioCards name="kind" label="Kind" cards={kinds} across />
        <TextField name="name" label="Name" help="such as Copper rivet 9 mm" />
        <MoneyField name="unitPrice" label="Price" per="piece" />
      </Form>
    </Dialog>
  );
}
