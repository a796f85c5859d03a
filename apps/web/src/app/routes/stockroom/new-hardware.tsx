import { RouteError } from '../../../components/route-error.tsx';
import { AddHardwareForm } from '../../../features/hardware/components/add-hardware-form.tsx';
import { loadSuppliers, NewStockItem } from './new-stock-item.tsx';

export const loader = loadSuppliers;

export function Component() {
  return (
    <NewStockItem title="New hardware or supplies" room="/stockroom/hardware">
      {(suppliers, onAdded) => <AddHardwareForm suppliers={suppliers} onAdded={onAdded} />}
    </NewStockItem>
  );
}

export const ErrorBoundary = RouteError;
