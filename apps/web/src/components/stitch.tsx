import { classNames } from '../lib/class-names.ts';

/** The running stitch: the one separator. */
export function Stitch({ className }: { className?: string | undefined }) {
  return (
    <div
      role="presentation"
      className={classNames('stitched h-0.5 w-full print:border-t', className)}
    />
  );
}
