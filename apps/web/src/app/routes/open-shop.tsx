import { redirect, useNavigate } from 'react-router-dom';
import { RouteError } from '../../components/route-error.tsx';
import { FrontDoor } from '../../features/session/components/front-door.tsx';
import { OpenShopForm } from '../../features/session/components/open-shop-form.tsx';
import { sessionQuery } from '../../features/session/session.queries.ts';
import { queryClient } from '../../lib/query-client.ts';

export async function loader() {
  const session = await queryClient.ensureQueryData(sessionQuery());
  return session.firstRun ? null : redirect('/today');
}

export function Component() {
  const navigate = useNavigate();
  return (
    <FrontDoor
      title="Open your shop"
      subtitle="Four things to begin with. Units, currency and the rest can be set later."
    >
      <OpenShopForm onOpened={() => void navigate('/today', { replace: true })} />
    </FrontDoor>
  );
}

export const ErrorBoundary = RouteError;
