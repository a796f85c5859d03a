import { useSuspenseQuery } from '@tanstack/react-query';
import { LinkButton } from '../../../components/link-button.tsx';
import { PageHeader } from '../../../components/page-header.tsx';
import { RouteError } from '../../../components/route-error.tsx';
import { workshopQuery } from '../../../features/office/office.queries.ts';
import { MachinePaysAnswer } from '../../../features/presses/components/machine-pays-answer.tsx';
import { MachinePaysForm } from '../../../features/presses/components/machine-pays-form.tsx';
import { queryClient } from '../../../lib/query-client.ts';
import { PatternRoomNav } from './pattern-room-nav.tsx';

export async function loader() {
  await queryClient.ensureQueryData(workshopQuery());
  return null;
}

export function Component() {
  const { data: workshop } = useSuspenseQuery(workshopQuery());
  return (
    <>
      <PageHeader
        title="Does the machine pay?"
        subtitle="A press or a die at its price, against the time that it saves"
        action={<LinkButton to="/pattern-room/presses">Back to the presses</LinkButton>}
      />
      <PatternRoomNav />
      <MachinePaysForm workshop={workshop}>
        <MachinePaysAnswer />
      </MachinePaysForm>
    </>
  );
}

export const ErrorBoundary = RouteError;
