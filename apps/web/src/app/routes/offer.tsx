import { useQuery, useSuspenseQuery } from '@tanstack/react-query';
import { useParams, useRouteError, type LoaderFunctionArgs } from 'react-router-dom';
import { OfferPage } from '../../features/offer/components/offer-page.tsx';
import { offerQuery } from '../../features/offer/offer.queries.ts';
import { sessionQuery } from '../../features/session/session.queries.ts';
import { ApiProblem } from '../../lib/api-problem.ts';
import { queryClient } from '../../lib/query-client.ts';
import { DemoBanner } from '../demo-banner.tsx';

export async function loader({ params }: LoaderFunctionArgs) {
  await Promise.all([
    queryClient.ensureQueryData(sessionQuery()),
    queryClient.fetchQuery(offerQuery(params['token'] ?? '')),
  ]);
  return null;
}

export function Component() {
  const { token = '' } = useParams();
  const { data: session } = useSuspenseQuery(sessionQuery());
  const { data: offer } = useSuspenseQuery(offerQuery(token));
  return (
    <>
      <meta name="robots" content="noindex" />
      {session.mode === 'demo' && <DemoBanner mailboxUrl={session.mailboxUrl} />}
      <OfferPage offer={offer} token={token} />
    </>
  );
}

/** A link that does not work says so, and nothing more. */
export function ErrorBoundary() {
  const error = useRouteError();
  const { data: session } = useQuery(sessionQuery());
  const sentence =
    error instanceof ApiProblem
      ? error.detail
      : 'This page could not be shown. Try again in a moment.';
  return (
    <>
      {session?.mode === 'demo' && <DemoBanner mailboxUrl={session.mailboxUrl} />}
      <main className="mx-auto max-w-md px-4 py-12">
        <title>This link does not work</title>
        <h1>Nothing to see here</h1>
        <p className="mt-2">{sentence}</p>
      </main>
    </>
  );
}
