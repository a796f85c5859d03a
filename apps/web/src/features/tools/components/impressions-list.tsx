import type { ImpressionReply, ToolReply } from '@hidewright/contract';
import { useInfiniteQuery } from '@tanstack/react-query';
import { Button } from '../../../components/button.tsx';
import { Skeleton } from '../../../components/loading.tsx';
import { countText, instantText } from '../../../lib/formatting.ts';
import { useWorkshop } from '../../../lib/workshop.tsx';
import { impressionsQuery } from '../tools.queries.ts';
import { usesWord } from '../tool-words.ts';

/** What a tool did and when, newest first. */
export function ImpressionsList({ tool }: { tool: ToolReply }) {
  const { data, hasNextPage, fetchNextPage, isFetchingNextPage } = useInfiniteQuery(
    impressionsQuery(tool.id),
  );
  if (!data) return <Skeleton />;
  const rows = data.pages.flatMap((page) => page.items);
  if (rows.length === 0)
    return <p className="text-ink-soft">{`No ${usesWord(tool.kind)} are counted on it yet.`}</p>;
  return (
    <>
      <ol className="space-y-2">
        {rows.map((row) => (
          <Row key={row.id} row={row} />
        ))}
      </ol>
      {hasNextPage && (
        <Button className="mt-4" busy={isFetchingNextPage} onClick={() => void fetchNextPage()}>
          Show earlier ones
        </Button>
      )}
    </>
  );
}

function Row({ row }: { row: ImpressionReply }) {
  const { timeZone } = useWorkshop();
  const why = [...new Set([row.jobNumber, row.reason])].filter(Boolean).join(', ');
  return (
    <li className="flex justify-between gap-4">
      <span>
        {why}
        <span className="block text-sm text-ink-soft">{`${row.actorName}, ${instantText(row.at, timeZone)}`}</span>
      </span>
      <span className="font-semibold">{countText(row.uses)}</span>
    </li>
  );
}
