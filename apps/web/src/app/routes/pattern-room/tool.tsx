import type { ToolReply } from '@hidewright/contract';
import { useSuspenseQuery } from '@tanstack/react-query';
import { useLoaderData, type LoaderFunctionArgs } from 'react-router-dom';
import { Card } from '../../../components/card.tsx';
import { KeyFigures } from '../../../components/key-figures.tsx';
import { Notice } from '../../../components/notice.tsx';
import { PageHeader } from '../../../components/page-header.tsx';
import { RouteError } from '../../../components/route-error.tsx';
import { StateMark } from '../../../components/state-mark.tsx';
import { sessionQuery } from '../../../features/session/session.queries.ts';
import { ChangeToolForm } from '../../../features/tools/components/change-tool-form.tsx';
import { CountForm } from '../../../features/tools/components/count-form.tsx';
import { ImpressionsList } from '../../../features/tools/components/impressions-list.tsx';
import { ToolActs } from '../../../features/tools/components/tool-acts.tsx';
import { Wear } from '../../../features/tools/components/wear.tsx';
import { ownerText, toolTitle, usesWord } from '../../../features/tools/tool-words.ts';
import { toolQuery } from '../../../features/tools/tools.queries.ts';
import { countText } from '../../../lib/formatting.ts';
import { queryClient } from '../../../lib/query-client.ts';
import { useWorkshop } from '../../../lib/workshop.tsx';

export async function loader({ params }: LoaderFunctionArgs) {
  return queryClient.ensureQueryData(toolQuery(Number(params['id'])));
}

export function Component() {
  const { id } = useLoaderData<ToolReply>();
  const { data: tool } = useSuspenseQuery(toolQuery(id));
  const { data: session } = useSuspenseQuery(sessionQuery());
  const isOwner = session.person?.role === 'owner';
  return (
    <>
      <PageHeader
        title={`${toolTitle(tool)}, ${tool.name}`}
        subtitle={<StateMark state={tool.state} />}
        action={isOwner ? <ToolActs tool={tool} /> : undefined}
      />
      {tool.termOver && (
        <Notice tone="attention" className="mb-5" title="Its term is over.">
          {`It is ${tool.customerName ?? 'the customer'}’s own: give it back, scrap it, or agree on a later day below.`}
        </Notice>
      )}
      <div className="grid items-start gap-5 lg:grid-cols-[minmax(0,1fr)_minmax(0,26rem)]">
        <div className="grid gap-5">
          <Card title="Wear and place">
            <Facts tool={tool} />
          </Card>
          {isOwner && (
            <Card title="Change it">
              <ChangeToolForm key={`${tool.id} ${tool.state}`} tool={tool} />
            </Card>
          )}
        </div>
        <div className="grid gap-5">
          {tool.state === 'on the rack' && (
            <Card
              title={`Count ${usesWord(tool.kind)}`}
              subtitle="made outside a job; the bench counts its own"
            >
              <CountForm tool={tool} />
            </Card>
          )}
          <Card title="What it did">
            <ImpressionsList tool={tool} />
          </Card>
        </div>
      </div>
    </>
  );
}

function Facts({ tool }: { tool: ToolReply }) {
  const { today } = useWorkshop();
  const given = (text: string | null) => (text === null || text === '' ? '–' : text);
  return (
    <KeyFigures
      figures={[
        { word: 'used', figure: <Wear tool={tool} /> },
        { word: `${usesWord(tool.kind)} left`, figure: countText(tool.usesLeft) },
        { word: 'slot', figure: given(tool.slot) },
        { word: 'metal', figure: given(tool.metal) },
        { word: 'pattern', figure: given(tool.patternName) },
        { word: 'customer', figure: given(tool.customerName) },
        { word: 'whose', figure: ownerText(tool, today) },
      ]}
    />
  );
}

export const ErrorBoundary = RouteError;
