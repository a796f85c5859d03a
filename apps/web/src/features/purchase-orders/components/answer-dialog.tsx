import { answerDelivery, type Receipt } from '@hidewright/contract';
import { Dialog } from '../../../components/dialog.tsx';
import { Form } from '../../../components/form.tsx';
import { TextField } from '../../../components/text-field.tsx';
import { say } from '../../../components/toast.ts';
import { useAnswerDelivery } from '../purchase-orders.mutations.ts';

const words = {
  price: {
    title: 'Let the price stand?',
    description: 'Today asks no more, unless another cost is typed for this delivery.',
    submit: 'Let it stand',
    help: 'Such as a new price list.',
    done: 'The price stands.',
  },
  short: {
    title: 'Do not claim what is short?',
    description: 'Today asks no more. It can still be claimed later.',
    submit: 'Do not claim',
    help: 'Such as too little to be worth a letter.',
    done: 'It is not claimed.',
  },
};

interface AnswerDialogProps {
  receipt: Receipt;
  matter: keyof typeof words;
  onClose: () => void;
}

/** The owner has looked, and lets it be. */
export function AnswerDialog({ receipt, matter, onClose }: AnswerDialogProps) {
  const answer = useAnswerDelivery();
  const { title, description, submit, help, done } = words[matter];
  return (
    <Dialog open onOpenChange={onClose} title={title} description={description}>
      <Form
        schema={answerDelivery.body}
        defaults={{ matter, reason: '' }}
        submitWord={submit}
        onSend={async (body) => {
          const { id, version } = receipt;
          await answer.mutateAsync({ params: { id }, body, ifMatch: version });
          onClose();
          say(done);
        }}
      >
        <TextField name="reason" label="Why" help={help} optional />
      </Form>
    </Dialog>
  );
}
