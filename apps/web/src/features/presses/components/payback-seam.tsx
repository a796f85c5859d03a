import { classNames } from '../../../lib/class-names.ts';

interface PaybackSeamProps {
  years: number;
  paybackMonths: number | null;
}

/** The life of a machine as a seam: a stitch for each quarter of a year, darker until its price is back. */
export function PaybackSeam({ years, paybackMonths }: PaybackSeamProps) {
  const stitches = Math.min(years * 4, 80);
  const monthsEach = (years * 12) / stitches;
  return (
    <div aria-hidden="true" className="text-sm text-ink-soft">
      <div className="flex gap-1">
        {Array.from({ length: stitches }, (_, at) => (
          <span
            key={at}
            className={classNames(
              'flex-1 self-center rounded-full',
              isOpen(at * monthsEach, paybackMonths) ? 'h-1 bg-brass' : 'h-2.5 bg-verdigris',
            )}
          />
        ))}
      </div>
      <div className="mt-1 flex justify-between gap-4">
        <span>thin: its price is still out</span>
        <span>thick: it earns</span>
      </div>
    </div>
  );
}

const isOpen = (month: number, payback: number | null): boolean =>
  payback === null || month < payback;
