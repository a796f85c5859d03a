import { useSuspenseQuery } from '@tanstack/react-query';
import { Navigate, Outlet, ScrollRestoration, useLocation } from 'react-router-dom';
import { sessionQuery } from '../features/session/session.queries.ts';
import { WorkshopProvider } from '../lib/workshop.tsx';
import { BottomBar } from './bottom-bar.tsx';
import { DemoBanner } from './demo-banner.tsx';
import { Header } from './header.tsx';
import { MovingStitch } from './moving-stitch.tsx';
import { Rail } from './rail.tsx';
import { useFocusAfterMove } from './use-focus-after-move.ts';

/** What stays while the rooms change: the rail, the header, the way to search, and who is signed in. */
export function Shell() {
  const { data: session } = useSuspenseQuery(sessionQuery());
  const { pathname, search } = useLocation();
  useFocusAfterMove();
  const { person, workshop } = session;
  if (session.firstRun) return <Navigate to="/open-shop" replace />;
  if (!person || !workshop) {
    return <Navigate to={`/sign-in?to=${encodeURIComponent(pathname + search)}`} replace />;
  }
  return (
    <WorkshopProvider workshop={workshop}>
      <a
        href="#main"
        className="sr-only z-70 rounded bg-verdigris px-4 py-2 font-semibold text-card focus:not-sr-only focus:fixed focus:top-2 focus:left-2"
      >
        Skip to the content
      </a>
      <MovingStitch />
      <div className="flex min-h-dvh">
        <Rail role={person.role} />
        <div className="flex min-w-0 grow flex-col">
          {session.mode === 'demo' && <DemoBanner mailboxUrl={session.mailboxUrl} />}
          <div className="mx-auto flex w-full max-w-[90rem] grow flex-col px-4 pb-24 md:px-7 md:pb-10">
            <Header person={person} />
            <main id="main" tabIndex={-1} className="grow outline-none">
              <Outlet />
            </main>
          </div>
        </div>
      </div>
      <BottomBar role={person.role} />
      <ScrollRestoration />
    </WorkshopProvider>
  );
}
