import { RouteError } from '../components/route-error.tsx';

/** What went wrong before the shell could be shown. */
export function OutsideError() {
  return (
    <main className="mx-auto max-w-prose px-6 py-12">
      <RouteError />
    </main>
  );
}
