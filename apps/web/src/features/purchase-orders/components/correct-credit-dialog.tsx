import { correctCredit, type SupplierClaim } from '@hidewright/contract';
import { Dialog } from '../../../components/dialog.tsx';
import { Form } from '../../../components/form.tsx';
import { TextField } from '../../../components/text-field.tsx';
import { say } from '../../../components/toast.ts';
import { useCorrectCredit } from '../purchase-orders.mutations.ts';
import { CreditFields } from './credit-fields.tsx';

interface CorrectCreditDialogProps {
  claim: SupplierClaim;
  onClose: () => void;
}

/** For a credit that was noted wrongly: what was noted before stays written beside it. */
export function CorrectCreditDialog({ claim, onClose }: CorrectCreditDialogProps) {
  const correct = useCorrectCredit();
  const { id, version, credited } = claim;
  return (
    <Dialog
      open
      onOpenChange={onClose}
      title="What did they really credit?"
      description="What was noted before stays written. Enter 0 if they credited nothing: the claim is then open again."
    >
      <Form
        schema={correctCredit.body}
        defaults={{ credited: credited ?? '', moreThanClaimed: false, reason: '' }}
        submitWord="Put it right"
        onSend={async (body) => {
          await correct.mutateAsync({ params: { id }, body, ifMatch: version });
          onClose();
          say('The credit is put right.');
        }}
      >
        <CreditFields claim={claim} />
        <TextField name="reason" label="What was wrong" />
      </Form>
    </Dialog>
  );
}
