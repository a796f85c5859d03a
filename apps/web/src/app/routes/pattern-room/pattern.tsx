import type { Pattern } from '@hidewright/contract';
import { useQuery, useSuspenseQuery } from '@tanstack/react-query';
import { useLoaderData, type LoaderFunctionArgs } from 'react-router-dom';
import { Card } from '../../../components/card.tsx';
import { LinkButton } from '../../../components/link-button.tsx';
import { OutlinePicture } from '../../../components/outline-picture.tsx';
import { PageHeader } from '../../../components/page-header.tsx';
import { RouteError } from '../../../components/route-error.tsx';
import { TextLink } from '../../../components/text-link.tsx';
import { LayoutLink } from '../../../features/patterns/components/layout-link.tsx';
import { LearnedCard } from '../../../features/patterns/components/learned-card.tsx';
import { PutAwayButton } from '../../../features/patterns/components/put-away-button.tsx';
import { TemplateLinks } from '../../../features/patterns/components/template-links.tsx';
import { VersionsList } from '../../../features/patterns/components/versions-list.tsx';
import { WaysCard } from '../../../features/patterns/components/ways-card.tsx';
import { WhatItTakes } from '../../../features/patterns/components/what-it-takes.tsx';
import { layoutSubtitle } from '../../../features/patterns/layout-words.ts';
import { patternQuery } from '../../../features/patterns/patterns.queries.ts';
import { sessionQuery } from '../../../features/session/session.queries.ts';
import { pressesQuery } from '../../../features/presses/presses.queries.ts';
import { ToolsTable } from '../../../features/tools/components/tools-table.tsx';
import { toolsQuery } from '../../../features/tools/tools.queries.ts';
import { queryClient } from '../../../lib/query-client.ts';
import { LaidForPress } from './laid-for-press.tsx';
import { PressCard } from './press-card.tsx';

export async function loader({ params }: LoaderFunctionArgs) {
  const id = Number(params['id']);
  const [pattern] = await Promise.all([
    queryClient.ensureQueryData(patternQuery(id)),
    queryClient.ensureQueryData(toolsQuery(id)),
    queryClient.ensureQueryData(pressesQuery()),
  ]);
  return pattern;
}

export function Component() {
  const { id } = useLoaderData<Pattern>();
  const { data: pattern } = useSuspenseQuery(patternQuery(id));
  const { data: session } = useSuspenseQuery(sessionQuery());
  const isOwner = session.person?.role === 'owner';
  const { layout, outlinePath, name } = pattern;
  return (
    <>
      <PageHeader
        title={name}
        subtitle={`${pattern.description}; version ${pattern.versionNumber}${pattern.active ? '' : '; put away'}`}
        action={isOwner ? <Actions pattern={pattern} /> : undefined}
      />
      <div className="grid items-start gap-5 lg:grid-cols-2">
        <Card title="Layout" subtitle={layoutSubtitle(layout)}>
          <LaidForPress pattern={pattern} />
          {layout.placements.length > 0 && <LayoutLink patternId={id} />}
        </Card>
        <div className="grid gap-5">
          <Card title="What it takes">
            {outlinePath !== null && (
              <>
                <OutlinePicture
                  outlinePath={outlinePath}
                  title={`Outline of ${name}`}
                  className="mb-3 max-w-48"
                />
                <TemplateLinks patternId={id} />
              </>
            )}
            <WhatItTakes pattern={pattern} />
            <p className="mt-3">
              <TextLink to={`/pattern-room/patterns/${id}/time`}>Time a step</TextLink>
            </p>
          </Card>
          <LearnedCard patternId={id} isOwner={isOwner} />
          <WaysCard pattern={pattern} />
          <Tooling pattern={pattern} isOwner={isOwner} />
          <PressCard pattern={pattern} />
          <Card title="Versions" subtitle="Quotes keep the version they were made with.">
            <VersionsList patternId={id} />
          </Card>
        </div>
      </div>
    </>
  );
}

function Actions({ pattern }: { pattern: Pattern }) {
  return (
    <>
      {pattern.active && pattern.layout.pieces > 0 && (
        <LinkButton to={`/counter/quotes/new?pattern=${pattern.id}`} tone="primary">
          Quote it
        </LinkButton>
      )}
      {pattern.definition.outline !== null && (
        <LinkButton to={`/pattern-room/patterns/${pattern.id}/cut-from`}>
          What to cut from
        </LinkButton>
      )}
      <LinkButton to={`/pattern-room/patterns/${pattern.id}/change`}>Change</LinkButton>
      <PutAwayButton pattern={pattern} />
    </>
  );
}

function Tooling({ pattern, isOwner }: { pattern: Pattern; isOwner: boolean }) {
  const { data: tools } = useQuery(toolsQuery(pattern.id));
  return (
    <Card
      title="Tooling for it"
      aside={
        isOwner && (
          <span className="flex flex-wrap gap-x-4">
            <TextLink to={`/pattern-room/patterns/${pattern.id}/tooling`}>Does it last?</TextLink>
            <TextLink to={`/pattern-room/tooling/new?pattern=${pattern.id}`}>Add a tool</TextLink>
          </span>
        )
      }
    >
      <ToolsTable
        brief
        rows={tools?.items ?? []}
        empty={<p className="text-ink-soft">No cutting die or stamp plate is kept for it.</p>}
      />
    </Card>
  );
}

export const ErrorBoundary = RouteError;
