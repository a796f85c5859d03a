import type { Quote } from '@hidewright/contract';
import { useNavigate } from 'react-router-dom';
import { Card } from '../../../components/card.tsx';
import { TextLink } from '../../../components/text-link.tsx';
import { say } from '../../../components/toast.ts';
import { CanWeMakeIt } from '../../../features/checks/components/can-we-make-it.tsx';
import { LastTimeCard } from '../../../features/lots/components/last-time-card.tsx';
import { TakeOnForm } from '../../../features/orders/components/take-on-form.tsx';
import { classNames } from '../../../lib/class-names.ts';

interface AcceptRunProps {
  quote: Quote;
  quantity: number;
  /** The option that it is about; null for the piece as it is. */
  option: string | null;
  className?: string;
}

/** From the question whether the shop can make it to the order that it takes on. */
export function AcceptRun({ quote, quantity, option, className }: AcceptRunProps) {
  const navigate = useNavigate();
  const { orderId, orderNumber, orderCancelled, state, inHandsOn } = quote;
  if (orderId !== null) {
    return (
      <div className={className}>
        <Card title="Taken on">
          <p>
            As <TextLink to={`/counter/orders/${orderId}`}>{orderNumber}</TextLink>
            {orderCancelled ? ', which was cancelled. For another run, write another quote.' : '.'}
          </p>
        </Card>
      </div>
    );
  }
  if (state !== 'draft' && state !== 'sent' && state !== 'agreed') return null;
  return (
    <div className={classNames('space-y-5', className)}>
      <LastTimeCard of="quote" id={quote.id} />
      <CanWeMakeIt
        key={option}
        quoteId={quote.id}
        quantity={quantity}
        option={option ?? undefined}
        by={inHandsOn ?? undefined}
        mayOrder
      >
        {(check) =>
          state === 'agreed' && (
            <TakeOnForm
              quoteId={quote.id}
              inHandsOn={inHandsOn}
              check={check}
              onTakenOn={async (order) => {
                say(`${order.number} is taken on.`);
                await navigate(`/counter/orders/${order.id}`);
              }}
            />
          )
        }
      </CanWeMakeIt>
    </div>
  );
}
