import type { ReactNode } from 'react';

/** Short fields beside each other; two abreast on a phone. */
export function FieldRow({ children }: { children: ReactNode }) {
  return (
    <div className="grid grid-cols-2 gap-x-4 gap-y-4 sm:flex sm:flex-wrap sm:gap-x-5">
      {children}
    </div>
  );
}
