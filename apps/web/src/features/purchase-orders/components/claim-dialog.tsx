import { draftClaim, openClaim, type PurchaseOrder, type Receipt } from '@hidewright/contract';
import { useQuery } from '@tanstack/react-query';
import { Dialog } from '../../../components/dialog.tsx';
import { Form } from '../../../components/form.tsx';
import { PageLoading } from '../../../components/loading.tsx';
import { RadioCards } from '../../../components/radio-cards.tsx';
import { TextArea } from '../../../components/text-area.tsx';
import { say } from '../../../components/toast.ts';
import { call } from '../../../lib/api.ts';
import { areaText, moneyText } from '../../../lib/formatting.ts';
import { useWorkshop } from '../../../lib/workshop.tsx';
import { useOpenClaim } from '../purchase-orders.mutations.ts';

interface ClaimDialogProps {
  order: PurchaseOrder;
  receipt: Receipt;
  onClose: () => void;
}

/** A letter to the supplier about what is short, ready to be changed and sent. */
export function ClaimDialog({ order, receipt, onClose }: ClaimDialogProps) {
  const { areaUnit, currency } = useWorkshop();
  const open = useOpenClaim();
  const { data: draft } = useQuery({
    queryKey: ['purchase-orders', order.id, 'claim-draft', receipt.id],
    queryFn: ({ signal }) => call(draftClaim, { params: { id: receipt.id }, signal }),
    gcTime: 0,
    // Once it is claimed there is nothing left to draft.
    enabled: open.isIdle || open.isError,
  });
  const mailable = draft !== undefined && draft.supplierEmail !== '';
  return (
    <Dialog
      open
      onOpenChange={onClose}
      title={`Claim from ${order.supplierName}`}
      description={
        draft &&
        `${areaText(draft.missingAreaMm2, areaUnit)} is missing, paid for with ${currency} ${moneyText(draft.worth)}.`
      }
    >
      {draft === undefined ? (
        <PageLoading />
      ) : (
        <Form
          schema={openClaim.body}
          defaults={{ by: mailable ? 'mail' : 'hand', text: draft.text }}
          submitWord="Claim it"
          onSend={async (body) => {
            await open.mutateAsync({ params: { id: receipt.id }, body });
            onClose();
            say(`The claim is ${body.by === 'mail' ? 'on its way' : 'noted'}.`);
          }}
        >
          <TextArea name="text" label="What you write" rows={12} />
          <RadioCards name="by" label="How it goes" cards={waysFor(draft.supplierEmail)} />
        </Form>
      )}
    </Dialog>
  );
}

const waysFor = (email: string) => [
  ...(email === '' ? [] : [{ value: 'mail', label: 'By e-mail', detail: `to ${email}` }]),
  { value: 'hand', label: 'By hand', detail: 'I copy the text, or say it by telephone' },
];
