import { readScan, type PurchaseOrder } from '@hidewright/contract';
import { useMutation } from '@tanstack/react-query';
import { Link, useNavigate } from 'react-router-dom';
import { Card } from '../../../components/card.tsx';
import { LinkButton } from '../../../components/link-button.tsx';
import { ScanField } from '../../../components/scan-field.tsx';
import { TextLink } from '../../../components/text-link.tsx';
import { call } from '../../../lib/api.ts';
import { dayText } from '../../../lib/formatting.ts';
import { useWorkshop } from '../../../lib/workshop.tsx';
import { isOpen } from '../typed-delivery.ts';

const placeOf = (order: { id: number }) => `/stockroom/receive?order=${order.id}`;

/** Which order has come: scanned off its sheet, or chosen from what is awaited. */
export function AwaitedOrders({ orders }: { orders: readonly PurchaseOrder[] }) {
  const navigate = useNavigate();
  const scan = useMutation({
    mutationFn: (code: string) => findOrder(orders, code),
    onSuccess: (order) => void navigate(placeOf(order)),
  });
  return (
    <div className="max-w-2xl space-y-5">
      <Card>
        <ScanField
          label="Number of the order"
          help="Scan the code on the order’s sheet, or type the number, such as P-0012."
          error={scan.error?.message}
          onScan={(code) => scan.mutate(code)}
        />
      </Card>
      <Card title="Awaited" subtitle="The earliest day first">
        {orders.length === 0 ? (
          <p>No order to a supplier is awaited.</p>
        ) : (
          <ul className="space-y-2">
            {orders.map((order) => (
              <li key={order.id}>
                <AwaitedOrder order={order} />
              </li>
            ))}
          </ul>
        )}
      </Card>
      <div className="flex flex-wrap items-center gap-x-6 gap-y-2">
        <LinkButton to="/stockroom/receive?order=none" className="min-h-11">
          It came without an order
        </LinkButton>
        <TextLink to="/stockroom/deliveries">Earlier deliveries without an order</TextLink>
      </div>
    </div>
  );
}

function AwaitedOrder({ order }: { order: PurchaseOrder }) {
  const { today } = useWorkshop();
  const { awaitedOn, number, supplierName, lines } = order;
  const late = awaitedOn !== null && awaitedOn < today;
  return (
    <Link
      to={placeOf(order)}
      className="block min-h-14 rounded border border-edge bg-card px-4 py-2.5 text-ink no-underline hover:bg-manila"
    >
      <span className="flex flex-wrap justify-between gap-x-4 font-semibold">
        <span>{`${number}, ${supplierName}`}</span>
        {awaitedOn !== null && (
          <span className={late ? 'text-oxblood' : undefined}>
            {late ? `late: ${dayText(awaitedOn, today)}` : dayText(awaitedOn, today)}
          </span>
        )}
      </span>
      <span className="block text-sm text-ink-soft">
        {lines
          .filter(isOpen)
          .map(({ name }) => name)
          .join(', ')}
      </span>
    </Link>
  );
}

/** @throws what was read, where it is no order */
async function findOrder(orders: readonly PurchaseOrder[], code: string): Promise<{ id: number }> {
  const awaited = orders.find(({ number }) => number.toLowerCase() === code.toLowerCase());
  if (awaited) return awaited;
  const { kind, id, tag, name } = await call(readScan, { params: { code } });
  if (kind === 'purchase order') return { id };
  throw new Error(
    `${tag} is no order to a supplier but ${name}. Scan the code on the order’s sheet.`,
  );
}
