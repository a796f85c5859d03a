import type { ReactNode } from 'react';

interface ItemLayoutProps {
  facts: ReactNode;
  /** Beside everything else; on a phone between the facts and the rest, where a thumb is soon there. */
  aside: ReactNode;
  children: ReactNode;
}

/** One lot or one hardware: what there is, what can be done with it, and how it came to be so. */
export function ItemLayout({ facts, aside, children }: ItemLayoutProps) {
  return (
    <div className="grid items-start gap-5 xl:grid-cols-[minmax(0,1fr)_minmax(0,24rem)] xl:grid-rows-[auto_1fr]">
      <div>{facts}</div>
      <div className="grid gap-5 xl:col-start-2 xl:row-span-2 xl:row-start-1">{aside}</div>
      <div className="grid gap-5">{children}</div>
    </div>
  );
}
