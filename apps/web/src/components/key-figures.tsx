import type { ReactNode } from 'react';
import { classNames } from '../lib/class-names.ts';

export interface KeyFigure {
  word: string;
  figure: ReactNode;
  /** What is in it, in words. */
  note?: ReactNode | undefined;
}

/** A few figures with their words; `large` for those that a page is about. */
export function KeyFigures({
  figures,
  large,
}: {
  figures: readonly KeyFigure[];
  large?: boolean | undefined;
}) {
  return (
    <dl className="grid grid-cols-[repeat(auto-fit,minmax(9rem,1fr))] gap-x-6 gap-y-4">
      {figures.map((item) => (
        <div key={item.word}>
          <dt className="text-sm text-ink-soft">{item.word}</dt>
          <dd className={classNames('font-semibold', large && 'text-xl font-bold')}>
            {item.figure}
          </dd>
          {item.note && <dd className="text-sm text-ink-soft">{item.note}</dd>}
        </div>
      ))}
    </dl>
  );
}
