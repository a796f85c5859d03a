import type { JobLot } from '@hidewright/contract';
import { Notice } from '../../../components/notice.tsx';

/** Said before a press would mix shades or sides in one order; it can be pressed all the same. */
export function MixNotice({ lot }: { lot: JobLot | undefined }) {
  if (!lot?.mix) return null;
  return (
    <Notice tone="attention" live className="w-full print:hidden">
      {lot.mix.sentence}
    </Notice>
  );
}
