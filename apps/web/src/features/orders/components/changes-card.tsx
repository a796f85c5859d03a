import type { Order } from '@hidewright/contract';
import { Card } from '../../../components/card.tsx';
import { dayText, instantText } from '../../../lib/formatting.ts';
import { useWorkshop } from '../../../lib/workshop.tsx';

/** The days that it was promised for before, and how it came to the one it has now. */
export function ChangesCard({ order }: { order: Order }) {
  const { today, timeZone } = useWorkshop();
  const [first] = order.moves;
  if (first === undefined) return null;
  return (
    <Card
      title="How the day was moved"
      subtitle={`Promised first for ${dayText(first.fromDay, today)}`}
    >
      <ol className="divide-y divide-stitch/60">
        {order.moves.map((move) => (
          <li key={move.at} className="py-2 first:pt-0 last:pb-0">
            <p>
              From {dayText(move.fromDay, today)} to{' '}
              <strong className="font-semibold">{dayText(move.toDay, today)}</strong>: {move.why}
            </p>
            <p className="text-sm text-ink-soft">
              {move.by}, {instantText(move.at, timeZone)}
            </p>
          </li>
        ))}
      </ol>
    </Card>
  );
}
