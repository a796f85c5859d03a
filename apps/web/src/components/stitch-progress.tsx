import { classNames } from '../lib/class-names.ts';

interface StitchProgressProps {
  /** What is being counted, for the ear: "Stamp". */
  label: string;
  done: number;
  of: number;
  /** How many stitches to draw. */
  stitches?: number | undefined;
  className?: string | undefined;
}

/** Progress as a seam: stitched through, half stitched, still to stitch. */
export function StitchProgress({ label, done, of, stitches = 6, className }: StitchProgressProps) {
  const share = of > 0 ? Math.min(done / of, 1) : 0;
  return (
    <div
      role="progressbar"
      aria-label={label}
      aria-valuemin={0}
      aria-valuemax={Math.max(of, 1)}
      aria-valuenow={Math.min(done, Math.max(of, 1))}
      aria-valuetext={`${done} of ${of}`}
      className={classNames('flex gap-1.5', className)}
    >
      {Array.from({ length: stitches }, (_, index) => (
        <Thread key={index} share={Math.min(Math.max(share * stitches - index, 0), 1)} />
      ))}
    </div>
  );
}

function Thread({ share }: { share: number }) {
  return (
    <span className="h-1 flex-1 overflow-hidden rounded-full bg-stitch/60">
      <span className="block h-full bg-verdigris" style={{ width: `${share * 100}%` }} />
    </span>
  );
}
