import type { Activity } from '@hidewright/contract';
import { useWorkshop } from '../../../lib/workshop.tsx';
import { instantText } from '../../../lib/formatting.ts';

/** Newest first, each a sentence. */
export function ActivityList({ activities }: { activities: readonly Activity[] }) {
  const { timeZone } = useWorkshop();
  return (
    <ol className="divide-y divide-stitch/60 rounded bg-card px-4 shadow-card">
      {activities.map((row) => (
        <li key={row.seq} className="flex flex-wrap justify-between gap-x-6 py-2.5">
          <span>
            <span className="font-semibold">{row.actorName}</span> {row.action}
          </span>
          <span className="text-sm text-ink-soft">{instantText(row.at, timeZone)}</span>
        </li>
      ))}
    </ol>
  );
}
