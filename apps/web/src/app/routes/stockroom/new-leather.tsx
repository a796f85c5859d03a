import { useSuspenseQuery } from '@tanstack/react-query';
import { useNavigate } from 'react-router-dom';
import { Card } from '../../../components/card.tsx';
import { PageHeader } from '../../../components/page-header.tsx';
import { RouteError } from '../../../components/route-error.tsx';
import { say } from '../../../components/toast.ts';
import { AddLeatherForm } from '../../../features/leathers/components/add-leather-form.tsx';
import { suppliersQuery } from '../../../features/suppliers/suppliers.queries.ts';
import { queryClient } from '../../../lib/query-client.ts';
import { choicesOf } from './choices.ts';

export async function loader() {
  await queryClient.ensureQueryData(suppliersQuery());
  return null;
}

export function Component() {
  const navigate = useNavigate();
  const { data: suppliers } = useSuspenseQuery(suppliersQuery());
  return (
    <>
      <PageHeader title="New leather" />
      <Card>
        <AddLeatherForm
          suppliers={choicesOf(suppliers.items)}
          onAdded={(leather) => {
            say(`${leather.name} is added.`);
            void navigate(`/stockroom/leather/${leather.id}`);
          }}
        />
      </Card>
    </>
  );
}

export const ErrorBoundary = RouteError;
