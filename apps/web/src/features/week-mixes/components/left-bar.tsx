import type { WeekMixReply } from '@hidewright/contract';
import { classNames } from '../../../lib/class-names.ts';
import { moneyText } from '../../../lib/formatting.ts';
import { lookOf } from '../mix-parts.ts';

/** What is left in the week as one bar, work by work; the income needed stands upright in it. */
export function LeftBar({ mix }: { mix: WeekMixReply }) {
  const needed = Number(mix.income.needed);
  const scale = Math.max(needed, Number(mix.left), 0.01) * 1.08;
  const share = (amount: number) => `${(Math.max(0, amount) / scale) * 100}%`;
  const spoken = `${moneyText(mix.left)} left, ${moneyText(mix.income.needed)} needed`;
  return (
    <figure className="mt-4">
      <figcaption className="mb-1 flex flex-wrap justify-between gap-x-4">
        <span>what is left</span>
        <span className="text-brass">needed {moneyText(mix.income.needed)}</span>
      </figcaption>
      <div
        role="img"
        aria-label={spoken}
        className="relative flex h-11 gap-0.5 bg-stitch/20 py-1.5"
      >
        {mix.kinds.map(
          (kind, at) =>
            Number(kind.left) > 0 && (
              <span
                key={at}
                className={classNames(
                  'flex min-w-0 items-center justify-center overflow-hidden rounded-[2px] text-sm',
                  lookOf(kind.kind, at),
                )}
                style={{ width: share(Number(kind.left)) }}
              >
                {Number(kind.left) / scale > 0.045 ? at + 1 : null}
              </span>
            ),
        )}
        <span
          className="absolute inset-y-0 border-l-2 border-dashed border-brass"
          style={{ left: share(needed) }}
        />
      </div>
    </figure>
  );
}
