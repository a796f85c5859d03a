import type { ReactNode } from 'react';
import { classNames } from '../lib/class-names.ts';

interface InputFrameProps {
  id: string;
  /** Inside the field, after what is typed: mm, in, oz, ft². */
  unit?: ReactNode | undefined;
  invalid: boolean;
  /** As wide as a figure needs, or as the column. */
  short?: boolean | undefined;
  children: ReactNode;
}

/** The border around an input and its unit. */
export function InputFrame({ id, unit, invalid, short, children }: InputFrameProps) {
  return (
    <div
      className={classNames(
        'flex min-h-10 items-center rounded border bg-card focus-within:outline-3 focus-within:outline-offset-2 focus-within:outline-verdigris',
        invalid ? 'border-2 border-oxblood' : 'border-edge',
        short ? 'w-44 max-w-full' : 'w-full',
      )}
    >
      {children}
      {unit && (
        <span id={`${id}-unit`} className="shrink-0 pr-3 text-ink-soft">
          {unit}
        </span>
      )}
    </div>
  );
}

export const inputLook = 'min-w-0 grow self-stretch bg-transparent px-3 py-1.5 outline-none';
