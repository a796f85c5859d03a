import { changeSupplierOffer, type SupplierOfferReply } from '@hidewright/contract';
import { Dialog } from '../../../components/dialog.tsx';
import { Form } from '../../../components/form.tsx';
import type { Choice } from '../../../components/select-field.tsx';
import { say } from '../../../components/toast.ts';
import { useChangeSupplierOffer } from '../supplier-offers.mutations.ts';
import { OfferFields } from './offer-fields.tsx';

interface ChangeOfferDialogProps {
  offer: SupplierOfferReply;
  suppliers: readonly Choice[];
  onClose: () => void;
}

export function ChangeOfferDialog({ offer, suppliers, onClose }: ChangeOfferDialogProps) {
  const send = useChangeSupplierOffer();
  const { supplierId, articleNumber, leadDays, minimum, multiple, breaks = [], preferred } = offer;
  return (
    <Dialog open onOpenChange={onClose} title={`What ${offer.supplierName} asks`}>
      <Form
        schema={changeSupplierOffer.body}
        defaults={{ supplierId, articleNumber, leadDays, minimum, multiple, breaks, preferred }}
        submitWord="Save"
        onSend={async (body) => {
          const { id, version } = offer;
          await send.mutateAsync({ params: { id }, body, ifMatch: version });
          say(`${offer.supplierName}’s offer is saved.`);
          onClose();
        }}
      >
        <OfferFields of={offer.of} suppliers={suppliers} />
      </Form>
    </Dialog>
  );
}
