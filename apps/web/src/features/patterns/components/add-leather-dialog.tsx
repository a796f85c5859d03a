import { addLeather, type Leather } from '@hidewright/contract';
import { Dialog } from '../../../components/dialog.tsx';
import { Form } from '../../../components/form.tsx';
import { AreaPriceField } from '../../../components/area-price-field.tsx';
import { TextField } from '../../../components/text-field.tsx';
import { useAddLeather } from '../patterns.mutations.ts';

interface AddLeatherDialogProps {
  open: boolean;
  onOpenChange: (open: boolean) => void;
  onAdded: (leather: Leather) => void;
}

/** A name and a price are enough to price a run; the rest has its place in the stockroom. */
export function AddLeatherDialog({ open, onOpenChange, onAdded }: AddLeatherDialogProps) {
  const send = useAddLeather();
  return (
    <Dialog open={open} onOpenChange={onOpenChange} title="Another leather">
      <Form
        schema={addLeather.body}
        defaults={{ name: '', pricePerFt2: '' }}
        submitWord="Add the leather"
        onSend={async (body) => {
          onAdded(await send.mutateAsync({ body }));
          onOpenChange(false);
        }}
      >
        <TextField name="name" label="Name" help="such as Oak tan russet 5–6 oz" />
        <AreaPriceField name="pricePerFt2" label="Price" />
      </Form>
    </Dialog>
  );
}
