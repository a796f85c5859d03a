import { useSuspenseQuery } from '@tanstack/react-query';
import { EmptyState } from '../../../components/empty-state.tsx';
import { LinkButton } from '../../../components/link-button.tsx';
import type { Choice } from '../../../components/select-field.tsx';
import { hardwareListQuery } from '../../../features/hardware/hardware.queries.ts';
import { leathersQuery } from '../../../features/leathers/leathers.queries.ts';
import type { Goods } from '../../../features/purchase-orders/typed-order.ts';
import { suppliersQuery } from '../../../features/suppliers/suppliers.queries.ts';
import { queryClient } from '../../../lib/query-client.ts';
import { choicesOf, hardwareGoods, leatherGoods } from './choices.ts';

/** What an order is made of: from whom, and what. */
export async function loadOrderBasics(): Promise<void> {
  await Promise.all([
    queryClient.ensureQueryData(suppliersQuery()),
    queryClient.ensureQueryData(leathersQuery()),
    queryClient.ensureQueryData(hardwareListQuery()),
  ]);
}

interface OrderBasics {
  suppliers: Choice[];
  leathers: Goods[];
  hardware: Goods[];
}

export function useOrderBasics(): OrderBasics {
  const { data: suppliers } = useSuspenseQuery(suppliersQuery());
  const { data: leathers } = useSuspenseQuery(leathersQuery());
  const { data: hardware } = useSuspenseQuery(hardwareListQuery());
  return {
    suppliers: choicesOf(suppliers.items),
    leathers: leatherGoods(leathers.items),
    hardware: hardwareGoods(hardware.items),
  };
}

/** Before there is anybody to order from. */
export function NoSupplier() {
  return (
    <EmptyState
      title="Add a supplier first."
      action={
        <LinkButton to="/stockroom/suppliers/new" tone="primary">
          New supplier
        </LinkButton>
      }
    >
      An order goes to a supplier; a name is enough.
    </EmptyState>
  );
}
