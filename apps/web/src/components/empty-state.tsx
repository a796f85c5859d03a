import type { ReactNode } from 'react';

interface EmptyStateProps {
  title: string;
  /** What to do first, in a sentence. */
  children?: ReactNode | undefined;
  action?: ReactNode | undefined;
}

/** Nothing is here yet: says what to do first. */
export function EmptyState({ title, children, action }: EmptyStateProps) {
  return (
    <div className="rounded border-2 border-dashed border-stitch px-5 py-8 text-center">
      <p className="text-lg font-semibold">{title}</p>
      {children && <p className="mx-auto mt-1 max-w-prose text-ink-soft">{children}</p>}
      {action && <div className="mt-4 flex flex-wrap justify-center gap-2">{action}</div>}
    </div>
  );
}
