import type { JobVariances, StepDifference } from '@hidewright/contract';
import { useQuery } from '@tanstack/react-query';
import { useState } from 'react';
import { Skeleton } from '../../../components/loading.tsx';
import { minutesText, moneyText } from '../../../lib/formatting.ts';
import { moreOrLess, reasonsFor, stepInWords } from '../difference-words.ts';
import { variancesQuery } from '../jobs.queries.ts';

/** Step by step, and by price and use of what was bought: read when it is opened. */
export function WhyItDiffers({ jobId }: { jobId: number }) {
  const [open, setOpen] = useState(false);
  const { data } = useQuery({ ...variancesQuery(jobId), enabled: open });
  return (
    <details className="mt-4" onToggle={(event) => setOpen(event.currentTarget.open)}>
      <summary className="min-h-8 py-1 font-semibold">Why it differs, step by step</summary>
      {open && (data ? <Differences found={data} /> : <Skeleton className="mt-2 h-24 w-full" />)}
    </details>
  );
}

function Differences({ found }: { found: JobVariances }) {
  const reasons = reasonsFor(found);
  return (
    <div className="mt-2 space-y-4">
      <StepsTable steps={found.steps} />
      {found.sum !== undefined && (
        <div>
          <p className="font-semibold">
            {`Leather, hardware and bench wages together cost ${moreOrLess(found.sum)}.`}
          </p>
          <ul className="mt-1 list-disc space-y-0.5 pl-5">
            {reasons.map((sentence) => (
              <li key={sentence}>{sentence}</li>
            ))}
          </ul>
          <p className="mt-2 text-sm text-ink-soft">
            An hour counts at the wage of whoever logged it, where the Office knows it, else at the
            wage of the quote; leather and hardware that nobody took from stock are left out.
          </p>
        </div>
      )}
    </div>
  );
}

function StepsTable({ steps }: { steps: readonly StepDifference[] }) {
  const hasMoney = steps.some(({ money }) => money !== undefined);
  const words = ['Said', 'Was', ...(hasMoney ? ['Cost'] : [])];
  return (
    <table className="w-full" aria-label="Minutes by step">
      <thead>
        <tr className="border-b-2 border-edge text-sm text-ink-soft">
          <th scope="col" className="py-1.5 text-left font-normal">
            Step
          </th>
          {words.map((word) => (
            <th key={word} scope="col" className="py-1.5 pl-3 text-right font-normal">
              {word}
            </th>
          ))}
        </tr>
      </thead>
      <tbody>
        {steps.map((step, at) => (
          <tr key={at} className="border-b border-stitch/60">
            <th scope="row" className="py-2 text-left font-normal">
              {step.name}
              <span className="block text-sm text-ink-soft">{stepInWords(step)}</span>
            </th>
            <td className={figure}>{minutesText(step.saidForMade)}</td>
            <td className={`${figure} font-semibold`}>
              {step.wasMinutes === null ? 'not logged' : minutesText(step.wasMinutes)}
            </td>
            {hasMoney && <td className={figure}>{signed(step.money?.time)}</td>}
          </tr>
        ))}
      </tbody>
    </table>
  );
}

const figure = 'py-2 pl-3 text-right align-top whitespace-nowrap';

function signed(amount: string | undefined): string {
  if (amount === undefined) return '';
  return `${Number(amount) > 0 ? '+' : ''}${moneyText(amount)}`;
}
