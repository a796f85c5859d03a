import { changePlateOffer, listPlateOffers, type PlateOfferReply } from '@hidewright/contract';
import { useQueryClient } from '@tanstack/react-query';
import { Button } from '../../../components/button.tsx';
import { Dialog } from '../../../components/dialog.tsx';
import { Form } from '../../../components/form.tsx';
import { say } from '../../../components/toast.ts';
import { call } from '../../../lib/api.ts';
import { useChangePlateOffer, useRemovePlateOffer } from '../tools.mutations.ts';
import { plateOffersQuery } from '../tools.queries.ts';
import { PlateOfferFields } from './plate-offer-fields.tsx';

interface ChangePlateOfferDialogProps {
  offer: PlateOfferReply;
  onClose: () => void;
}

export function ChangePlateOfferDialog({ offer, onClose }: ChangePlateOfferDialogProps) {
  const send = useChangePlateOffer();
  const remove = useRemovePlateOffer();
  const client = useQueryClient();
  const { queryKey } = plateOffersQuery();
  const { id, metal } = offer;
  const params = { id };

  async function reload() {
    const now = await call(listPlateOffers);
    client.setQueryData(queryKey, now);
    return typedOf(now.items.find((each) => each.id === id) ?? offer);
  }

  async function takeOff() {
    await remove.mutateAsync({ params });
    onClose();
    say(`The price of ${metal} plates is off the list.`);
  }

  return (
    <Dialog open onOpenChange={onClose} title={`A new plate of ${metal}`}>
      <Form
        schema={changePlateOffer.body}
        defaults={typedOf(offer)}
        submitWord="Save"
        onReload={reload}
        onSend={async (body) => {
          const known = client.getQueryData(queryKey)?.items.find((each) => each.id === id);
          await send.mutateAsync({ params, body, ifMatch: known?.version ?? offer.version });
          onClose();
          say(`The price of ${metal} plates is saved.`);
        }}
        actions={
          <Button tone="quiet" busy={remove.isPending} onClick={() => void takeOff()}>
            Take it off the list
          </Button>
        }
      >
        <PlateOfferFields />
      </Form>
    </Dialog>
  );
}

const typedOf = ({ price, lifeUses }: PlateOfferReply) => ({ price, lifeUses });
