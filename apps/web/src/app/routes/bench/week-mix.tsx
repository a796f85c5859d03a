import type { WeekMixReply } from '@hidewright/contract';
import { useQuery, useSuspenseQuery } from '@tanstack/react-query';
import { useState } from 'react';
import { Card } from '../../../components/card.tsx';
import { LinkButton } from '../../../components/link-button.tsx';
import { PageHeader } from '../../../components/page-header.tsx';
import { RouteError } from '../../../components/route-error.tsx';
import { sessionQuery } from '../../../features/session/session.queries.ts';
import { MixAnswer } from '../../../features/week-mixes/components/mix-answer.tsx';
import { WeekForm } from '../../../features/week-mixes/components/week-form.tsx';
import { forgetWeek, keptWeek } from '../../../features/week-mixes/typed-week.ts';
import { firstMixQuery, weekStartQuery } from '../../../features/week-mixes/week-mixes.queries.ts';
import { countText } from '../../../lib/formatting.ts';
import { queryClient } from '../../../lib/query-client.ts';

export async function loader() {
  await queryClient.ensureQueryData(weekStartQuery());
  return null;
}

export function Component() {
  const { data: start } = useSuspenseQuery(weekStartQuery());
  const { data: session } = useSuspenseQuery(sessionQuery());
  const person = session.person?.email ?? '';
  const { data: first } = useQuery(firstMixQuery(start, person));
  const [typed, setMix] = useState<WeekMixReply>();
  const mix = typed ?? first;
  const [begun, setBegun] = useState(0);
  function startAfresh() {
    forgetWeek(person);
    setMix(undefined);
    setBegun(begun + 1);
  }
  return (
    <>
      <PageHeader
        title="A week’s mix"
        subtitle="Do the runs carry the large pieces?"
        action={<LinkButton to="/bench">Back to the bench</LinkButton>}
      />
      <div className="grid items-start gap-5 xl:grid-cols-[minmax(0,36rem)_minmax(0,1fr)]">
        <Card title="The week" subtitle={keptWeek(person) ? keptWords : fromWords(start.from)}>
          <WeekForm
            key={begun}
            start={start}
            person={person}
            onMix={setMix}
            onStartAfresh={startAfresh}
          />
        </Card>
        {mix ? (
          <MixAnswer mix={mix} wagePerHour={start.wagePerHour} />
        ) : (
          <p className="p-4 text-ink-soft">
            Say how many hours there are, what the shop needs, and which work the week could hold:
            the mix that leaves most stands here, what one more hour is worth, and how many hours
            stay for large pieces.
          </p>
        )}
      </div>
    </>
  );
}

const keptWords = 'as you worked it out last; kept for you on this device, and nowhere else';

function fromWords({ runs, weeks }: { runs: number; weeks: number }): string {
  if (runs === 0) return 'no run is finished yet: type what a run takes and leaves';
  return `begins with ${countText(runs)} finished ${runs === 1 ? 'run' : 'runs'} of ${countText(weeks)} weeks`;
}

export const ErrorBoundary = RouteError;
