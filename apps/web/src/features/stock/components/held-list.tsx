import type { StockReservation } from '@hidewright/contract';
import { useQuery } from '@tanstack/react-query';
import { TextLink } from '../../../components/text-link.tsx';
import { useWorkshop } from '../../../lib/workshop.tsx';
import { quantityText } from '../movement-words.ts';
import { heldQuery, type Item } from '../stock.queries.ts';

interface HeldListProps {
  item: Item;
  /** Whether the person may enter the bench. */
  mayOpenJobs: boolean;
}

/** The jobs that it is held for. */
export function HeldList({ item, mayOpenJobs }: HeldListProps) {
  const { data } = useQuery(heldQuery(item));
  if (!data) return null;
  if (data.items.length === 0) return <p className="text-ink-soft">It is held for no job.</p>;
  return <HeldLines held={data.items} mayOpenJobs={mayOpenJobs} />;
}

interface HeldLinesProps {
  held: readonly StockReservation[];
  mayOpenJobs: boolean;
  /** Where several things are listed together, each line says which. */
  namesThings?: boolean;
}

export function HeldLines({ held, mayOpenJobs, namesThings = false }: HeldLinesProps) {
  const workshop = useWorkshop();
  return (
    <ul className="space-y-1">
      {held.map((row) => (
        <li key={row.id} className="flex justify-between gap-4">
          {mayOpenJobs ? (
            <TextLink to={`/bench/jobs/${row.jobId}`}>{row.jobNumber}</TextLink>
          ) : (
            <span>{row.jobNumber}</span>
          )}
          <span className="text-right">
            {quantityText(row, workshop)}
            {namesThings && ` of ${row.lotTag ?? row.hardwareName ?? ''}`}
          </span>
        </li>
      ))}
    </ul>
  );
}
