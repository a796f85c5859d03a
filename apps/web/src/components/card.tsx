import { useId, type ReactNode } from 'react';
import { classNames } from '../lib/class-names.ts';

interface CardProps {
  title?: ReactNode | undefined;
  subtitle?: ReactNode | undefined;
  /** Beside the title: a link or a quiet button. */
  aside?: ReactNode | undefined;
  className?: string | undefined;
  children?: ReactNode | undefined;
}

/** A sheet of paper on the bench, with a title of its own. */
export function Card({ title, subtitle, aside, className, children }: CardProps) {
  const id = useId();
  const Element = title ? 'section' : 'div';
  return (
    <Element
      aria-labelledby={title ? id : undefined}
      className={classNames('card rounded bg-card p-4 shadow-card sm:p-5', className)}
    >
      {title && (
        <div className="mb-4 flex flex-wrap items-start justify-between gap-x-4 gap-y-1">
          <div>
            <h2 id={id}>{title}</h2>
            {subtitle && <p className="text-sm text-ink-soft">{subtitle}</p>}
          </div>
          {aside}
        </div>
      )}
      {children}
    </Element>
  );
}
