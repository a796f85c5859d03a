import { useQuery } from '@tanstack/react-query';
import { instantText } from '../../../lib/formatting.ts';
import { useWorkshop } from '../../../lib/workshop.tsx';
import { Skeleton } from '../../../components/loading.tsx';
import { patternVersionsQuery } from '../patterns.queries.ts';

/** When the pattern was changed, and by whom; quotes keep the version they were made with. */
export function VersionsList({ patternId }: { patternId: number }) {
  const { timeZone } = useWorkshop();
  const { data } = useQuery(patternVersionsQuery(patternId));
  if (!data) return <Skeleton />;
  return (
    <ol className="space-y-1.5">
      {data.items.map(({ number, createdAt, createdBy }) => (
        <li key={number} className="flex flex-wrap justify-between gap-x-4">
          <span className="font-semibold">{`Version ${number}`}</span>
          <span className="text-ink-soft">{`${createdBy}, ${instantText(createdAt, timeZone)}`}</span>
        </li>
      ))}
    </ol>
  );
}
