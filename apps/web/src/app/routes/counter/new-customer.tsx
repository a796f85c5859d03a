import { useNavigate } from 'react-router-dom';
import { Card } from '../../../components/card.tsx';
import { PageHeader } from '../../../components/page-header.tsx';
import { RouteError } from '../../../components/route-error.tsx';
import { say } from '../../../components/toast.ts';
import { AddCustomerForm } from '../../../features/customers/components/add-customer-form.tsx';

export function Component() {
  const navigate = useNavigate();
  return (
    <>
      <PageHeader title="New customer" />
      <Card>
        <AddCustomerForm
          onAdded={(customer) => {
            say(`${customer.name} is added.`);
            void navigate(`/counter/customers/${customer.id}`);
          }}
        />
      </Card>
    </>
  );
}

export const ErrorBoundary = RouteError;
