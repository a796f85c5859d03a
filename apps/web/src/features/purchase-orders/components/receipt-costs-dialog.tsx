import { changeReceipt, type Receipt } from '@hidewright/contract';
import { Dialog } from '../../../components/dialog.tsx';
import { Form } from '../../../components/form.tsx';
import { carriageBasisCards } from '../../../components/carriage-bases.ts';
import { MoneyField } from '../../../components/money-field.tsx';
import { RadioCards } from '../../../components/radio-cards.tsx';
import { Stitch } from '../../../components/stitch.tsx';
import { say } from '../../../components/toast.ts';
import { useChangeReceipt } from '../purchase-orders.mutations.ts';

/** What the supplier and the carrier really asked, once their papers are there. */
export function ReceiptCostsDialog({
  receipt,
  onClose,
}: {
  receipt: Receipt;
  onClose: () => void;
}) {
  const change = useChangeReceipt();
  return (
    <Dialog
      open
      onOpenChange={onClose}
      title="What did it cost?"
      description="In the ledger the receipt is taken out and written again at this cost, as long as nothing of it was used."
    >
      <Form
        schema={changeReceipt.body}
        defaults={typedOf(receipt)}
        submitWord="Save the cost"
        onSend={async (body) => {
          const { id, version } = receipt;
          await change.mutateAsync({ params: { id }, body, ifMatch: version });
          onClose();
          say('What the delivery cost is saved.');
        }}
      >
        <MoneyField name="freight" label="Freight" />
        <MoneyField name="duty" label="Duty" />
        <RadioCards name="sharedBy" label="Shared out" cards={carriageBasisCards} />
        <Stitch />
        {receipt.lines.map((line, at) => (
          <MoneyField
            key={line.id}
            name={`goods.${at}.goods`}
            label={line.lotTag === null ? `Paid for ${line.name}` : `Paid for ${line.lotTag}`}
            help={line.lotTag === null ? undefined : line.name}
          />
        ))}
      </Form>
    </Dialog>
  );
}

const typedOf = ({ freight = '0.00', duty = '0.00', sharedBy, lines }: Receipt) => ({
  freight,
  duty,
  sharedBy,
  goods: lines.map(({ id, goods = '0.00' }) => ({ receiptLineId: id, goods })),
});
