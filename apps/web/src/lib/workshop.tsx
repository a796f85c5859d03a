import type { Session } from '@hidewright/contract';
import { createContext, use, type ReactNode } from 'react';

export type Workshop = NonNullable<Session['workshop']>;

const WorkshopContext = createContext<Workshop | undefined>(undefined);

/** Gives every screen below it the workshop's currency, units and day. */
export function WorkshopProvider({
  workshop,
  children,
}: {
  workshop: Workshop;
  children: ReactNode;
}) {
  return <WorkshopContext value={workshop}>{children}</WorkshopContext>;
}

export function useWorkshop(): Workshop {
  const workshop = use(WorkshopContext);
  if (!workshop) throw new Error('This screen needs a WorkshopProvider above it');
  return workshop;
}

/** For what may stand outside a workshop as well, such as the page's title. */
export function useWorkshopName(): string | undefined {
  return use(WorkshopContext)?.name;
}
