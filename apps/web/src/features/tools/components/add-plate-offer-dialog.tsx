import { addPlateOffer, plateMetals, type PlateOfferReply } from '@hidewright/contract';
import { Dialog } from '../../../components/dialog.tsx';
import { Form } from '../../../components/form.tsx';
import { Notice } from '../../../components/notice.tsx';
import { SelectField } from '../../../components/select-field.tsx';
import { say } from '../../../components/toast.ts';
import { useAddPlateOffer } from '../tools.mutations.ts';
import { PlateOfferFields } from './plate-offer-fields.tsx';

interface AddPlateOfferDialogProps {
  offers: readonly PlateOfferReply[];
  onClose: () => void;
}

export function AddPlateOfferDialog({ offers, onClose }: AddPlateOfferDialogProps) {
  const send = useAddPlateOffer();
  const left = plateMetals.filter((metal) => offers.every((offer) => offer.metal !== metal));
  return (
    <Dialog open onOpenChange={onClose} title="Price of a new plate">
      {left.length === 0 ? (
        <Notice>Every metal has its price. Change one of them instead.</Notice>
      ) : (
        <Form
          schema={addPlateOffer.body}
          defaults={{ metal: undefined, price: '', lifeUses: '' as unknown as number }}
          submitWord="Add the metal"
          onSend={async (body) => {
            const { metal } = await send.mutateAsync({ body });
            onClose();
            say(`The price of ${metal} plates is kept.`);
          }}
        >
          <SelectField
            name="metal"
            label="Metal"
            placeholder="Choose a metal"
            choices={left.map((metal) => ({ value: metal, label: metal }))}
            short
          />
          <PlateOfferFields />
        </Form>
      )}
    </Dialog>
  );
}
