import { useWatch } from 'react-hook-form';
import { useWorkshop } from '../../../lib/workshop.tsx';
import { sizeRemark } from '../size-remark.ts';

/** Whether what comes cut to size can have the area that is typed. */
export function SizeCheck({ lot }: { lot: string }) {
  const workshop = useWorkshop();
  const names = ['measuredAreaMm2', 'pieces', 'widthMm', 'heightMm'].map(
    (name) => `${lot}.${name}`,
  );
  const [measured, pieces, width, height] = useWatch({ name: names }) as unknown[];
  return (
    <p role="status" className="text-sm text-brass empty:hidden sm:col-span-2">
      {sizeRemark({ measured, pieces, width, height }, workshop)}
    </p>
  );
}
