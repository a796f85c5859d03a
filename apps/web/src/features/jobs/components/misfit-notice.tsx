import type { JobLot } from '@hidewright/contract';
import { Notice } from '../../../components/notice.tsx';

/** Said of a lot through which the job's hardware cannot be set well; it can be taken all the same. */
export function MisfitNotice({ lot }: { lot: JobLot | undefined }) {
  if (lot === undefined || lot.misfits.length === 0) return null;
  return (
    <Notice tone="attention" live className="w-full print:hidden">
      {lot.misfits.map((misfit) => (
        <p key={misfit}>{misfit}</p>
      ))}
    </Notice>
  );
}
