import { compareArea } from '@hidewright/domain';
import { useWatch } from 'react-hook-form';
import { Notice } from '../../../components/notice.tsx';
import { rackAreaText, percentText } from '../../../lib/formatting.ts';
import { isFigure } from '../../../lib/units.ts';
import { useWorkshop } from '../../../lib/workshop.tsx';

const isArea = (value: unknown): value is string =>
  typeof value === 'string' && isFigure(value) && Number(value) > 0;

interface MarkCheckProps {
  lot: string;
  tolerancePercent: string;
  /** Whether it came for an order, so that there is a supplier to claim it from. */
  hasOrder: boolean;
}

/** How the measured area of a lot stands to the one marked on it, while both are typed. */
export function MarkCheck({ lot, tolerancePercent, hasOrder }: MarkCheckProps) {
  const workshop = useWorkshop();
  const names = [`${lot}.markedAreaMm2`, `${lot}.measuredAreaMm2`];
  const [marked, measured] = useWatch({ name: names }) as unknown[];
  if (!isArea(marked) || !isArea(measured)) return null;
  const { differenceMm2, percent, short } = compareArea(marked, measured, tolerancePercent);
  const missing = differenceMm2.startsWith('-');
  const by = `${rackAreaText(differenceMm2.replace('-', ''), workshop)} (${percentText(percent.replace('-', ''))})`;
  if (short) {
    return (
      <Notice tone="attention" live className="sm:col-span-2" title="Short of its mark.">
        {`It misses ${by}, and the shop lets ${percentText(tolerancePercent)} pass.`}
        {hasOrder && ' The owner can claim what is missing.'}
      </Notice>
    );
  }
  return (
    <p role="status" className="text-sm text-ink-soft sm:col-span-2">
      {differenceMm2 === '0'
        ? 'Exactly as marked.'
        : `${by} ${missing ? 'less' : 'more'} than marked.`}
    </p>
  );
}
