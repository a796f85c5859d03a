import type { ReactNode } from 'react';
import { PageTitle } from '../../../components/page-title.tsx';
import { Stitch } from '../../../components/stitch.tsx';

interface FrontDoorProps {
  title: string;
  subtitle: ReactNode;
  children: ReactNode;
}

/** The frame of the pages before anybody is signed in: a large ticket on the bench. */
export function FrontDoor({ title, subtitle, children }: FrontDoorProps) {
  return (
    <main className="mx-auto flex min-h-dvh max-w-lg flex-col justify-center px-4 py-8">
      <PageTitle>{title}</PageTitle>
      <div className="overflow-hidden rounded bg-card shadow-card">
        <div className="relative bg-manila py-5 pr-5 pl-15">
          <span
            aria-hidden="true"
            className="absolute top-6 left-5.5 size-6 rounded-full border-3 border-brass bg-paper"
          />
          <p className="text-sm font-semibold text-brass">Hidewright</p>
          <h1 tabIndex={-1}>{title}</h1>
          <p className="text-ink-soft">{subtitle}</p>
        </div>
        <Stitch />
        <div className="p-5">{children}</div>
      </div>
    </main>
  );
}
