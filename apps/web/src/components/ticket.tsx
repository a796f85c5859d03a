import type { ReactNode } from 'react';
import { classNames } from '../lib/class-names.ts';

interface TicketProps {
  /** Q-0241, J-0198; without one the eyelet stands alone. */
  number?: ReactNode | undefined;
  title: ReactNode;
  /** The title's level; a page's own ticket carries the h1. */
  level?: 1 | 2 | 3 | undefined;
  detail?: ReactNode | undefined;
  /** Figures with their words, such as in hands and state: see TicketFact. */
  facts?: ReactNode | undefined;
  actions?: ReactNode | undefined;
  children?: ReactNode | undefined;
  className?: string | undefined;
}

/** A card of manila stock with a punched eyelet: quotes, orders, jobs, and what waits to be done. */
export function Ticket({
  number,
  title,
  level = 2,
  detail,
  facts,
  actions,
  children,
  className,
}: TicketProps) {
  const Heading = `h${level}` as const;
  return (
    <article
      className={classNames(
        'ticket relative rounded bg-manila py-3.5 pr-4 pl-13 shadow-card',
        className,
      )}
    >
      <Eyelet />
      <div className="flex flex-wrap items-center gap-x-6 gap-y-3">
        <div className="min-w-0 grow basis-56">
          <div className="flex flex-wrap items-baseline gap-x-4">
            {number && <span className="font-bold whitespace-nowrap">{number}</span>}
            <Heading
              tabIndex={level === 1 ? -1 : undefined}
              className={level === 1 ? undefined : 'text-base font-semibold'}
            >
              {title}
            </Heading>
          </div>
          {detail && <div className="text-sm text-ink-soft">{detail}</div>}
        </div>
        {facts && <dl className="flex flex-wrap gap-x-6 gap-y-2">{facts}</dl>}
        {actions && <div className="flex flex-wrap gap-2">{actions}</div>}
      </div>
      {children}
    </article>
  );
}

/** One figure on a ticket with its word above it. */
export function TicketFact({ word, children }: { word: string; children: ReactNode }) {
  return (
    <div>
      <dt className="text-sm text-ink-soft">{word}</dt>
      <dd className="font-semibold">{children}</dd>
    </div>
  );
}

function Eyelet() {
  return (
    <span
      aria-hidden="true"
      className="absolute top-4 left-4.5 size-5 rounded-full border-3 border-brass bg-card"
    />
  );
}
