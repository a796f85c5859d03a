import type { OrderSuggestionReply } from '@hidewright/contract';
import { useState } from 'react';
import { Button } from '../../../components/button.tsx';
import { Notice } from '../../../components/notice.tsx';
import { ApiProblem } from '../../../lib/api-problem.ts';
import { useWorkshop } from '../../../lib/workshop.tsx';
import { useDraftSuggested } from '../to-order.mutations.ts';
import { proposedText, readQuantity } from '../typed-quantity.ts';
import { DraftedNotice } from './drafted-notice.tsx';
import { ItemCard } from './item-card.tsx';
import { OrderControls } from './order-controls.tsx';

type Item = OrderSuggestionReply;

const groups = [
  { state: 'now', title: 'Order now' },
  { state: 'drafted', title: 'On a draft, to be sent' },
  { state: 'soon', title: 'Soon' },
  { state: 'fine', title: 'Enough' },
] as const;

const mayBeDrafted = ({ state, supplierId }: Item): boolean =>
  state !== 'drafted' && supplierId !== null;

const keyOf = ({ of, id, drafted }: Item): string => `${of} ${id} ${drafted}`;

interface ToOrderListProps {
  items: readonly Item[];
  mayOrder: boolean;
  /** Of placing an order, where it may be known. */
  orderCost: string | undefined;
  holdingPercent: string;
  servicePercent: string;
}

/** What is due, by how much it presses; the owner ticks, changes quantities and drafts. */
export function ToOrderList({ items, mayOrder, ...rates }: ToOrderListProps) {
  const { texts, ticked, ...list } = useTypedOrders();
  const send = useDraftSuggested();
  const [asked, setAsked] = useState<readonly string[]>([]);

  async function draft(chosen: readonly Item[]) {
    setAsked(chosen.map(keyOf));
    const lines = chosen.flatMap((item) => {
      const quantity = list.quantityOf(item);
      const { of, id, drafted } = item;
      return quantity === undefined ? [] : [{ of, id, quantity, drafted }];
    });
    if (lines.length < chosen.length) return;
    await send.mutateAsync({ body: { lines } });
    list.forget();
    setAsked([]);
  }
  const press = (chosen: readonly Item[]) => void draft(chosen).catch(() => undefined);
  const chosen = items.filter((item) => ticked(item));
  const several = items.filter(mayBeDrafted).length > 1;

  return (
    <div className="space-y-6">
      {mayOrder && (
        <div className="space-y-3">
          {send.error && (
            <Notice tone="danger" live>
              {send.error instanceof ApiProblem
                ? send.error.detail
                : 'That did not work. Try again.'}
            </Notice>
          )}
          {send.data && <DraftedNotice drafted={send.data} />}
          {several && chosen.length > 0 && (
            <Button tone="primary" busy={send.isPending} onClick={() => press(chosen)}>
              {chosen.length === 1
                ? 'Draft the one that is ticked'
                : `Draft the ${chosen.length} that are ticked`}
            </Button>
          )}
        </div>
      )}
      {groups.map(({ state, title }) => {
        const own = items.filter((item) => item.state === state);
        if (own.length === 0) return null;
        return (
          <section key={state} aria-label={title}>
            <h2 className="mb-3">{title}</h2>
            <div className="space-y-4">
              {own.map((item) => (
                <ItemCard key={`${item.of} ${item.id}`} item={item} mayOrder={mayOrder} {...rates}>
                  {mayOrder && item.state !== 'drafted' && (
                    <OrderControls
                      item={item}
                      text={texts(item)}
                      wrong={asked.includes(keyOf(item)) && list.quantityOf(item) === undefined}
                      ticked={several ? ticked(item) : undefined}
                      busy={send.isPending}
                      onText={(text) => list.type(item, text)}
                      onTick={(on) => list.tick(item, on)}
                      onDraft={() => press([item])}
                    />
                  )}
                </ItemCard>
              ))}
            </div>
          </section>
        );
      })}
    </div>
  );
}

/** What was typed and ticked; what is due now and can be ordered is ticked from the start. */
function useTypedOrders() {
  const workshop = useWorkshop();
  const [typed, setTyped] = useState<Readonly<Record<string, string>>>({});
  const [ticks, setTicks] = useState<Readonly<Record<string, boolean>>>({});
  const texts = (item: Item) => typed[keyOf(item)] ?? proposedText(item, workshop);
  return {
    texts,
    ticked: (item: Item) => mayBeDrafted(item) && (ticks[keyOf(item)] ?? item.state === 'now'),
    quantityOf: (item: Item) => readQuantity(texts(item), item, workshop),
    type: (item: Item, text: string) => setTyped({ ...typed, [keyOf(item)]: text }),
    tick: (item: Item, on: boolean) => setTicks({ ...ticks, [keyOf(item)]: on }),
    forget: () => {
      setTyped({});
      setTicks({});
    },
  };
}
