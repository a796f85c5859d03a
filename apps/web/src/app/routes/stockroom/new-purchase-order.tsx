import {
  useLoaderData,
  useNavigate,
  useSearchParams,
  type LoaderFunctionArgs,
} from 'react-router-dom';
import { Card } from '../../../components/card.tsx';
import { PageHeader } from '../../../components/page-header.tsx';
import { RouteError } from '../../../components/route-error.tsx';
import { say } from '../../../components/toast.ts';
import { PurchaseOrderForm } from '../../../features/purchase-orders/components/purchase-order-form.tsx';
import { useAddPurchaseOrder } from '../../../features/purchase-orders/purchase-orders.mutations.ts';
import {
  blankLine,
  blankOrder,
  blankService,
  type Goods,
  type TypedOrder,
} from '../../../features/purchase-orders/typed-order.ts';
import { draftKeyAt } from '../../../lib/draft.ts';
import { loadOrderBasics, NoSupplier, useOrderBasics } from './order-basics.tsx';
import { readUsualSupplier } from './usual-supplier.ts';

export async function loader({ request }: LoaderFunctionArgs) {
  const [supplierId] = await Promise.all([
    supplierFor(new URL(request.url).searchParams),
    loadOrderBasics(),
  ]);
  return { supplierId };
}

/** The one that the order was begun from, or who usually sells what it was begun from. */
async function supplierFor(search: URLSearchParams): Promise<number | null> {
  const named = (name: string) => Number(search.get(name));
  if (named('supplier') > 0) return named('supplier');
  if (named('leather') > 0) return readUsualSupplier({ leatherId: named('leather') });
  if (named('hardware') > 0) return readUsualSupplier({ hardwareId: named('hardware') });
  return null;
}

export function Component() {
  const navigate = useNavigate();
  const [search] = useSearchParams();
  const { supplierId } = useLoaderData<Awaited<ReturnType<typeof loader>>>();
  const add = useAddPurchaseOrder();
  const basics = useOrderBasics();
  return (
    <>
      <PageHeader title="New purchase order" />
      {basics.suppliers.length === 0 ? (
        <NoSupplier />
      ) : (
        <Card>
          <PurchaseOrderForm
            {...basics}
            defaults={startWith(search, supplierId, basics)}
            draftKey={draftKeyAt('purchase-order-new', search)}
            submitWord="Save the draft"
            cancelTo="/stockroom/purchase-orders"
            onSend={async (body) => {
              const order = await add.mutateAsync({ body });
              say(`${order.number} is drafted. Send it when it is right.`);
              void navigate(`/stockroom/purchase-orders/${order.id}`);
            }}
          />
        </Card>
      )}
    </>
  );
}

/** An order that was begun from a leather, hardware, a lot or a supplier has it in it. */
function startWith(
  search: URLSearchParams,
  supplierId: number | null,
  { leathers, hardware }: { leathers: Goods[]; hardware: Goods[] },
): Partial<TypedOrder> {
  const named = (goods: Goods[], name: string) =>
    goods.filter(({ id }) => String(id) === search.get(name));
  const lotId = Number(search.get('lot'));
  return {
    ...blankOrder,
    ...(supplierId !== null && { supplierId }),
    lines: [
      ...named(leathers, 'leather').map((goods) => blankLine('leather', goods)),
      ...named(hardware, 'hardware').map((goods) => blankLine('hardware', goods)),
      ...(lotId > 0 ? [blankService(lotId)] : []),
    ],
  };
}

export const ErrorBoundary = RouteError;
