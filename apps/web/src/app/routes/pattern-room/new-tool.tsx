import { useNavigate, useSearchParams } from 'react-router-dom';
import { Card } from '../../../components/card.tsx';
import { PageHeader } from '../../../components/page-header.tsx';
import { RouteError } from '../../../components/route-error.tsx';
import { say } from '../../../components/toast.ts';
import { AddToolForm } from '../../../features/tools/components/add-tool-form.tsx';
import { toolTitle } from '../../../features/tools/tool-words.ts';
import {
  customerChoicesQuery,
  patternChoicesQuery,
} from '../../../features/tools/tools.queries.ts';
import { draftKeyAt } from '../../../lib/draft.ts';
import { queryClient } from '../../../lib/query-client.ts';

export async function loader() {
  await Promise.all([
    queryClient.ensureQueryData(patternChoicesQuery()),
    queryClient.ensureQueryData(customerChoicesQuery()),
  ]);
  return null;
}

export function Component() {
  const navigate = useNavigate();
  const [search] = useSearchParams();
  const pattern = search.get('pattern');
  return (
    <>
      <PageHeader title="New tool" />
      <Card>
        <AddToolForm
          draftKey={draftKeyAt('tool-new', search)}
          patternId={pattern === null ? null : Number(pattern)}
          onAdded={(tool) => {
            say(`${toolTitle(tool)} is ${tool.state}.`);
            void navigate(
              pattern === null ? '/pattern-room/tooling' : `/pattern-room/patterns/${pattern}`,
            );
          }}
        />
      </Card>
    </>
  );
}

export const ErrorBoundary = RouteError;
