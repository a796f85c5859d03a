import { addSupplierOffer } from '@hidewright/contract';
import { Dialog } from '../../../components/dialog.tsx';
import { Form } from '../../../components/form.tsx';
import type { Choice } from '../../../components/select-field.tsx';
import { say } from '../../../components/toast.ts';
import { useAddSupplierOffer } from '../supplier-offers.mutations.ts';
import type { OfferedThing } from '../../../lib/supplier-offers.queries.ts';
import { OfferFields } from './offer-fields.tsx';

interface AddOfferDialogProps {
  thing: OfferedThing;
  suppliers: readonly Choice[];
  onClose: () => void;
}

export function AddOfferDialog({ thing, suppliers, onClose }: AddOfferDialogProps) {
  const send = useAddSupplierOffer();
  const of = 'leatherId' in thing ? 'leather' : 'hardware';
  return (
    <Dialog open onOpenChange={onClose} title="What a supplier asks">
      <Form
        schema={addSupplierOffer.body}
        defaults={{
          ...{ leatherId: null, hardwareId: null },
          ...thing,
          supplierId: '' as unknown as number,
          articleNumber: '',
          leadDays: null,
          minimum: null,
          multiple: null,
          breaks: [{ from: of === 'leather' ? '0' : '1', price: '' }],
          preferred: false,
        }}
        submitWord="Add the offer"
        onSend={async (body) => {
          const { supplierName } = await send.mutateAsync({ body });
          say(`${supplierName} is on the list.`);
          onClose();
        }}
      >
        <OfferFields of={of} suppliers={suppliers} />
      </Form>
    </Dialog>
  );
}
