import { useSuspenseQuery } from '@tanstack/react-query';
import { redirect, useNavigate, useSearchParams, type LoaderFunctionArgs } from 'react-router-dom';
import { RouteError } from '../../components/route-error.tsx';
import { Stitch } from '../../components/stitch.tsx';
import { DemoSignIns } from '../../features/session/components/demo-sign-ins.tsx';
import { FrontDoor } from '../../features/session/components/front-door.tsx';
import { SignInForm } from '../../features/session/components/sign-in-form.tsx';
import { sessionQuery } from '../../features/session/session.queries.ts';
import { queryClient } from '../../lib/query-client.ts';
import { DemoBanner } from '../demo-banner.tsx';
import { placeAfterSignIn } from '../guard.ts';

export async function loader({ request }: LoaderFunctionArgs) {
  const session = await queryClient.ensureQueryData(sessionQuery());
  if (session.firstRun) return redirect('/open-shop');
  if (session.person) return redirect(placeAfterSignIn(new URL(request.url).searchParams));
  return null;
}

export function Component() {
  const { data: session } = useSuspenseQuery(sessionQuery());
  const navigate = useNavigate();
  const [search] = useSearchParams();
  const enter = () => void navigate(placeAfterSignIn(search), { replace: true });
  const demo = session.mode === 'demo';
  return (
    <>
      {demo && <DemoBanner mailboxUrl={session.mailboxUrl} />}
      <FrontDoor title={session.workshop?.name ?? 'Sign in'} subtitle="Sign in to the workshop">
        {demo && (
          <>
            <h2 className="mb-3 text-base">Step in as one of the three</h2>
            <DemoSignIns onSignedIn={enter} />
            <Stitch className="my-6" />
            <h2 className="mb-3 text-base">Or with an e-mail address</h2>
          </>
        )}
        <SignInForm onSignedIn={enter} />
      </FrontDoor>
    </>
  );
}

export const ErrorBoundary = RouteError;
