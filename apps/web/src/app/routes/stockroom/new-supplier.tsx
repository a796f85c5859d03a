import { useNavigate } from 'react-router-dom';
import { Card } from '../../../components/card.tsx';
import { PageHeader } from '../../../components/page-header.tsx';
import { RouteError } from '../../../components/route-error.tsx';
import { say } from '../../../components/toast.ts';
import { AddSupplierForm } from '../../../features/suppliers/components/add-supplier-form.tsx';

export function Component() {
  const navigate = useNavigate();
  return (
    <>
      <PageHeader title="New supplier" />
      <Card>
        <AddSupplierForm
          onAdded={(supplier) => {
            say(`${supplier.name} is added.`);
            void navigate(`/stockroom/suppliers/${supplier.id}`);
          }}
        />
      </Card>
    </>
  );
}

export const ErrorBoundary = RouteError;
