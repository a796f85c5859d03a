import { orderByHand, type OrderSuggestionReply } from '@hidewright/contract';
import { useState } from 'react';
import { AreaField } from '../../../components/area-field.tsx';
import { Button } from '../../../components/button.tsx';
import { DecimalField } from '../../../components/decimal-field.tsx';
import { Dialog } from '../../../components/dialog.tsx';
import { Form } from '../../../components/form.tsx';
import { say } from '../../../components/toast.ts';
import { useWorkshop } from '../../../lib/workshop.tsx';
import { amountText } from '../to-order-words.ts';
import { useOrderByHand } from '../to-order.mutations.ts';
import { signOf } from '../typed-quantity.ts';

type Item = OrderSuggestionReply;

/** What the owner set instead of what is worked out, and the way back. */
export function ByHand({ item }: { item: Item }) {
  const workshop = useWorkshop();
  const [open, setOpen] = useState(false);
  const send = useOrderByHand();
  const { point, quantity } = item.byHand;
  const isSet = point !== null || quantity !== null;
  const words = [
    point === null ? '' : `order below ${amountText(point, item, workshop)}`,
    quantity === null ? '' : `${amountText(quantity, item, workshop)} at a time`,
  ].filter(Boolean);
  return (
    <div className="flex flex-wrap items-center gap-3 border-t border-stitch/60 pt-3">
      {isSet && <span>{`Set by hand: ${words.join(', ')}.`}</span>}
      <Button onClick={() => setOpen(true)}>
        Set by hand<span className="sr-only">: {item.name}</span>
      </Button>
      {isSet && (
        <Button
          tone="quiet"
          busy={send.isPending}
          onClick={() =>
            void send
              .mutateAsync({ ...asked(item), body: { point: null, quantity: null } })
              .then(() => say(`${item.name} goes by what is worked out again.`))
              .catch(() => say('That did not work. Try again.'))
          }
        >
          Let it go<span className="sr-only">: {item.name}</span>
        </Button>
      )}
      {open && <ByHandDialog item={item} onClose={() => setOpen(false)} />}
    </div>
  );
}

const asked = ({ of, id, version }: Item) => ({ params: { of, id }, ifMatch: version });

function ByHandDialog({ item, onClose }: { item: Item; onClose: () => void }) {
  const workshop = useWorkshop();
  const send = useOrderByHand();
  const unit = signOf(item, workshop);
  const help = 'Empty where it goes by what is worked out.';
  return (
    <Dialog open onOpenChange={onClose} title={`When and how much of ${item.name}`}>
      <Form
        schema={orderByHand.body}
        defaults={item.byHand}
        submitWord="Save"
        onSend={async (body) => {
          await send.mutateAsync({ ...asked(item), body });
          say(`${item.name} is ordered as you set it.`);
          onClose();
        }}
      >
        {item.of === 'leather' ? (
          <>
            <AreaField name="point" label="Order below" help={help} optional whenEmpty="null" />
            <AreaField name="quantity" label="So much at a time" optional whenEmpty="null" />
          </>
        ) : (
          <>
            <DecimalField
              name="point"
              label="Order below"
              unit={unit}
              help={help}
              optional
              whenEmpty="null"
            />
            <DecimalField
              name="quantity"
              label="So many at a time"
              unit={unit}
              optional
              whenEmpty="null"
            />
          </>
        )}
      </Form>
    </Dialog>
  );
}
