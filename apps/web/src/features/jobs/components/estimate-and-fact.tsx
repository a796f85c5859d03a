import type { Compared, JobComparison } from '@hidewright/contract';
import { Decimal } from 'decimal.js';
import type { ReactNode } from 'react';
import { Card } from '../../../components/card.tsx';
import {
  areaText,
  minutesText,
  moneyText,
  numberText,
  percentText,
} from '../../../lib/formatting.ts';
import type { AreaUnit } from '../../../lib/units.ts';
import { useWorkshop } from '../../../lib/workshop.tsx';

/** What was thought beforehand and what it was, side by side. */
export function EstimateAndFact({
  comparison,
  children,
}: {
  comparison: JobComparison;
  children?: ReactNode | undefined;
}) {
  const { currency } = useWorkshop();
  return (
    <Card title="Estimate and fact">
      <ComparedTable label="The work" rows={comparison.work} />
      {comparison.money && (
        <>
          <h3 className="mt-5 mb-1">Money, in {currency}</h3>
          <ComparedTable label="Money" rows={comparison.money} />
        </>
      )}
      {children}
    </Card>
  );
}

function ComparedTable({ label, rows }: { label: string; rows: readonly Compared[] }) {
  const { areaUnit } = useWorkshop();
  return (
    <table className="w-full" aria-label={label}>
      <thead>
        <tr className="border-b-2 border-edge text-sm text-ink-soft">
          <th scope="col" className="py-1.5 text-left font-normal">
            What
          </th>
          {['Estimate', 'Fact', 'Difference'].map((word) => (
            <th key={word} scope="col" className="py-1.5 pl-3 text-right font-normal">
              {word}
            </th>
          ))}
        </tr>
      </thead>
      <tbody>
        {rows.map((row) => (
          <tr key={row.what} className="border-b border-stitch/60">
            <th scope="row" className="py-2 text-left font-normal">
              {row.what}
            </th>
            <td className="py-2 pl-3 text-right">{shown(row.estimate, row.unit, areaUnit)}</td>
            <td className="py-2 pl-3 text-right font-semibold">
              {row.fact === null ? 'not logged' : shown(row.fact, row.unit, areaUnit)}
            </td>
            <td className="py-2 pl-3 text-right text-ink-soft">{difference(row, areaUnit)}</td>
          </tr>
        ))}
      </tbody>
    </table>
  );
}

function shown(value: string, unit: Compared['unit'], areaUnit: AreaUnit): string {
  if (unit === 'mm2') return areaText(value, areaUnit);
  if (unit === 'minutes') return minutesText(value);
  if (unit === 'percent') return percentText(value);
  if (unit === 'money') return moneyText(value);
  return numberText(value, 0);
}

function difference(row: Compared, areaUnit: AreaUnit): string {
  if (row.fact === null) return '';
  const exact = new Decimal(row.fact).minus(row.estimate);
  if (exact.isZero()) return 'as estimated';
  return `${exact.isPositive() ? '+' : ''}${shown(exact.toFixed(), row.unit, areaUnit)}`;
}
