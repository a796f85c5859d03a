import { closeClaim, type SupplierClaim } from '@hidewright/contract';
import { Dialog } from '../../../components/dialog.tsx';
import { Form } from '../../../components/form.tsx';
import { TextField } from '../../../components/text-field.tsx';
import { say } from '../../../components/toast.ts';
import { useCloseClaim } from '../purchase-orders.mutations.ts';
import { CreditFields } from './credit-fields.tsx';

interface CloseClaimDialogProps {
  claim: SupplierClaim;
  as: 'credited' | 'given up';
  onClose: () => void;
}

export function CloseClaimDialog({ claim, as, onClose }: CloseClaimDialogProps) {
  const close = useCloseClaim();
  const credited = as === 'credited';
  return (
    <Dialog
      open
      onOpenChange={onClose}
      title={credited ? 'What did they credit?' : 'Give the claim up?'}
      description={
        credited
          ? 'What came keeps what it cost: a credit is money, not goods.'
          : 'It stays with the order and cannot be taken up again.'
      }
    >
      <Form
        schema={closeClaim.body}
        defaults={
          credited
            ? { state: as, credited: claim.worth ?? '', moreThanClaimed: false }
            : { state: as, note: '' }
        }
        submitWord={credited ? 'Note the credit' : 'Give it up'}
        submitTone={credited ? 'primary' : 'danger'}
        onSend={async (body) => {
          const { id, version } = claim;
          await close.mutateAsync({ params: { id }, body, ifMatch: version });
          onClose();
          say(credited ? 'The credit is noted.' : 'The claim is given up.');
        }}
      >
        {credited ? <CreditFields claim={claim} /> : <TextField name="note" label="Why" />}
      </Form>
    </Dialog>
  );
}
