import { classNames } from '../lib/class-names.ts';

/** A place that is still being fetched. */
export function PageLoading() {
  return (
    <div role="status" className="p-6">
      <span className="sr-only">Loading</span>
      <Skeleton className="mb-6 h-8 w-64" />
      <Skeleton className="mb-3 h-28 w-full" />
      <Skeleton className="h-28 w-full" />
    </div>
  );
}

/** Holds the place of something that is on its way. */
export function Skeleton({ className }: { className?: string | undefined }) {
  return (
    <div
      aria-hidden="true"
      className={classNames(
        'rounded bg-stitch/30 motion-safe:animate-pulse',
        className ?? 'h-5 w-full',
      )}
    />
  );
}
