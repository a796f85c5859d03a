import type { LoggedReading, TimeReading } from '@hidewright/contract';
import { Card } from '../../../components/card.tsx';
import { countText, instantText, numberText } from '../../../lib/formatting.ts';
import { useWorkshop } from '../../../lib/workshop.tsx';

interface KeptReadingsProps {
  readings: readonly TimeReading[];
  /** Ids of those that do not count in what is shown. */
  left: readonly number[];
  onSet: (id: number, counts: boolean) => void;
}

/** Who read what and when; each can be left out of the figures. */
export function KeptReadings({ readings, left, onSet }: KeptReadingsProps) {
  const { timeZone } = useWorkshop();
  if (readings.length === 0) return null;
  return (
    <Card title="Kept readings" subtitle="Readings stay; untick one that should not count here.">
      <ul className="max-h-80 overflow-y-auto">
        {readings.map(({ id, seconds, personName, at }) => (
          <li key={id}>
            <label className="flex min-h-8 items-center gap-3">
              <input
                type="checkbox"
                checked={!left.includes(id)}
                onChange={(event) => onSet(id, event.target.checked)}
                className="size-4.5 shrink-0 accent-verdigris"
              />
              <span className="font-semibold">{`${numberText(seconds, 2)} s`}</span>
              <span className="text-sm text-ink-soft">{`${personName}, ${instantText(at, timeZone)}`}</span>
            </label>
          </li>
        ))}
      </ul>
    </Card>
  );
}

/** What the tickets say: an average for each row of their logs. */
export function TicketReadings({ logged }: { logged: readonly LoggedReading[] }) {
  return (
    <Card
      title="From the tickets"
      subtitle="Each is the average of what was logged at once, so they lie closer together than single pieces."
    >
      {logged.length === 0 ? (
        <p className="text-ink-soft">
          Nothing yet: log minutes and pieces together on this step at the bench.
        </p>
      ) : (
        <ul className="space-y-1">
          {logged.map((row, at) => (
            <li key={at}>
              <span className="font-semibold">{`${numberText(row.seconds, 2)} s`}</span>
              <span className="text-sm text-ink-soft">
                {` over ${countText(row.units)}, ${row.jobNumber}, ${row.personName}`}
              </span>
            </li>
          ))}
        </ul>
      )}
    </Card>
  );
}
