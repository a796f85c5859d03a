import { PageHeader } from '../../../components/page-header.tsx';
import { RouteError } from '../../../components/route-error.tsx';

export function Component() {
  return <PageHeader title="Counter" />;
}

export const ErrorBoundary = RouteError;
