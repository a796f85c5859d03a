import { purchaseOrderPaper, type PurchaseOrder } from '@hidewright/contract';
import { useState } from 'react';
import { buttonLook } from '../../../components/button-look.ts';
import { Button } from '../../../components/button.tsx';
import { LinkButton } from '../../../components/link-button.tsx';
import { addressOf } from '../../../lib/api.ts';
import { isNothing } from '../goods-text.ts';
import { CancelOrderDialog } from './cancel-order-dialog.tsx';
import { ReopenDialog } from './reopen-dialog.tsx';
import { SendOrderDialog } from './send-order-dialog.tsx';

interface OrderActionsProps {
  order: PurchaseOrder;
  isOwner: boolean;
  mayReceive: boolean;
  maySeePrices: boolean;
}

/** What the order's state allows now. */
export function OrderActions(props: OrderActionsProps) {
  const { order, isOwner, mayReceive, maySeePrices } = props;
  const [asking, setAsking] = useState<'send' | 'cancel' | 'reopen'>();
  const { id, state } = order;
  const close = () => setAsking(undefined);
  const awaited = state === 'sent' || state === 'part received';
  const severalShort = order.lines.filter(({ short }) => !isNothing(short)).length > 1;
  return (
    <>
      {isOwner && state === 'draft' && (
        <>
          <LinkButton to={`/stockroom/purchase-orders/${id}/change`}>Change</LinkButton>
          <Button tone="primary" onClick={() => setAsking('send')}>
            Send
          </Button>
        </>
      )}
      {isOwner && (state === 'draft' || state === 'sent') && (
        <Button onClick={() => setAsking('cancel')}>Cancel</Button>
      )}
      {isOwner && severalShort && (
        <Button onClick={() => setAsking('reopen')}>Await all that is missing</Button>
      )}
      {mayReceive && awaited && (
        <LinkButton tone="primary" to={`/stockroom/receive?order=${id}`}>
          Receive
        </LinkButton>
      )}
      {maySeePrices && (
        <a
          href={addressOf(purchaseOrderPaper, { params: { id } })}
          download
          className={buttonLook({})}
        >
          PDF
        </a>
      )}
      <SendOrderDialog order={order} open={asking === 'send'} onOpenChange={close} />
      {asking === 'reopen' && <ReopenDialog order={order} onClose={close} />}
      <CancelOrderDialog order={order} open={asking === 'cancel'} onOpenChange={close} />
    </>
  );
}
