import type { BenchLog, Job } from '@hidewright/contract';
import { Card } from '../../../components/card.tsx';
import { instantText } from '../../../lib/formatting.ts';
import { useWorkshop } from '../../../lib/workshop.tsx';
import { draftInWords } from '../step-draft.ts';

/** What was logged, newest first; a correction stands as a row of its own. */
export function LogList({ job }: { job: Job }) {
  const { timeZone } = useWorkshop();
  if (job.logs.length === 0) return null;
  return (
    <Card title="Logged">
      <ol className="divide-y divide-stitch/60">
        {job.logs.map((log) => (
          <li key={log.id} className="flex flex-wrap justify-between gap-x-4 py-2">
            <span>
              <strong>{log.stepName}</strong> {inWords(log)}
              {log.note && <span className="block text-sm">{log.note}</span>}
            </span>
            <span className="text-sm text-ink-soft">
              {log.personName}, {instantText(log.at, timeZone)}
            </span>
          </li>
        ))}
      </ol>
    </Card>
  );
}

function inWords({ good, rejects, seconds, minutes }: BenchLog): string {
  return draftInWords({ good, rejects, seconds, minutes, clockFrom: null });
}
