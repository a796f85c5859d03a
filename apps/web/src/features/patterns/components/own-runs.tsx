import { useWatch } from 'react-hook-form';
import { countText } from '../../../lib/formatting.ts';

/** What the shop's own runs said about rejects, and what typing over it does. */
export function OwnRuns() {
  const history = useWatch({ name: 'definition.history' }) as
    { good: number; total: number } | null | undefined;
  if (!history) return null;
  return (
    <p className="max-w-xl text-sm text-ink-soft">
      {`In your own runs ${countText(history.good)} of ${countText(history.total)} pieces came out good, and quotes count with that. Change the rejects by hand and they count with what you typed instead.`}
    </p>
  );
}
