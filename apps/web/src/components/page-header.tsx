import type { ReactNode } from 'react';
import { PageTitle } from './page-title.tsx';

interface PageHeaderProps {
  title: string;
  subtitle?: ReactNode | undefined;
  /** The place's one main action, and little else. */
  action?: ReactNode | undefined;
}

/** What this place is and the one thing to do here; names the browser's tab too. */
export function PageHeader({ title, subtitle, action }: PageHeaderProps) {
  return (
    <header className="mb-5 flex flex-wrap items-end justify-between gap-x-6 gap-y-3">
      <PageTitle>{title}</PageTitle>
      <div className="min-w-0">
        <h1 tabIndex={-1}>{title}</h1>
        {subtitle && <p className="text-ink-soft">{subtitle}</p>}
      </div>
      {action && <div className="flex flex-wrap gap-2">{action}</div>}
    </header>
  );
}
