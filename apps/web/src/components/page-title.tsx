import { useWorkshopName } from '../lib/workshop.tsx';

/** The browser tab's title, for a page whose h1 is on a ticket. */
export function PageTitle({ children }: { children: string }) {
  const workshop = useWorkshopName();
  return <title>{`${children} · ${workshop ?? 'Hidewright'}`}</title>;
}
