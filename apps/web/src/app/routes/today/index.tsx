import { useSuspenseQuery } from '@tanstack/react-query';
import { PageHeader } from '../../../components/page-header.tsx';
import { RouteError } from '../../../components/route-error.tsx';
import { Stitch } from '../../../components/stitch.tsx';
import { EarnedHours } from '../../../features/today/components/earned-hours.tsx';
import { FourWeeks } from '../../../features/today/components/four-weeks.tsx';
import { Owed } from '../../../features/today/components/owed.tsx';
import { RunsShort } from '../../../features/today/components/runs-short.tsx';
import { ToDoList } from '../../../features/today/components/to-do-list.tsx';
import { todayQuery } from '../../../features/today/today.queries.ts';
import { longDayText } from '../../../lib/formatting.ts';
import { queryClient } from '../../../lib/query-client.ts';

export async function loader() {
  await queryClient.ensureQueryData(todayQuery());
  return null;
}

export function Component() {
  const { data: today } = useSuspenseQuery(todayQuery());
  return (
    <>
      <PageHeader title={longDayText(today.day)} />
      <div className="grid items-start gap-5 lg:grid-cols-[minmax(20rem,2fr)_3fr]">
        <section aria-labelledby="now">
          <h2 id="now" className="mb-3">
            Now
          </h2>
          <ToDoList toDos={today.now} today={today.day} />
        </section>
        <div className="space-y-5">
          {today.fourWeeks && <FourWeeks weeks={today.fourWeeks} />}
          {today.fourWeeks && today.owed && <Stitch />}
          <div className="grid items-start gap-5 xl:grid-cols-2">
            {today.owed && <Owed owed={today.owed} />}
            {today.earned && <EarnedHours earned={today.earned} today={today.day} />}
            {today.short && <RunsShort short={today.short} />}
          </div>
        </div>
      </div>
    </>
  );
}

export const ErrorBoundary = RouteError;
