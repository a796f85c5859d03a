import { RouteError } from '../../../components/route-error.tsx';
import { AddLeatherForm } from '../../../features/leathers/components/add-leather-form.tsx';
import { loadSuppliers, NewStockItem } from './new-stock-item.tsx';

export const loader = loadSuppliers;

export function Component() {
  return (
    <NewStockItem title="New leather" room="/stockroom/leather">
      {(suppliers, onAdded) => <AddLeatherForm suppliers={suppliers} onAdded={onAdded} />}
    </NewStockItem>
  );
}

export const ErrorBoundary = RouteError;
