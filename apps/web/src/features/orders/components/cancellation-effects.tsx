import type { CancellationOutlook, Order } from '@hidewright/contract';
import type { ReactNode } from 'react';
import { TextLink } from '../../../components/text-link.tsx';
import { countText, hoursText } from '../../../lib/formatting.ts';

interface CancellationEffectsProps {
  outlook: CancellationOutlook;
  job: Order['job'];
}

/** What happens, one line each; what stays to be done by hand comes last. */
export function CancellationEffects({ outlook, job }: CancellationEffectsProps) {
  const lines = [...freed(outlook), ...made(outlook, job), ...byHand(outlook)];
  return (
    <ul className="list-disc space-y-1.5 pl-5">
      {lines.map(({ about, says }) => (
        <li key={about}>{says}</li>
      ))}
    </ul>
  );
}

interface Line {
  about: string;
  says: ReactNode;
}

function freed({ held, benchMinutes }: CancellationOutlook): Line[] {
  const says =
    held.length > 0 ? `Free again at once: ${listed(held)}.` : 'Nothing is held for it any more.';
  return [
    { about: 'held', says },
    ...(Number(benchMinutes) > 0
      ? [{ about: 'hours', says: `${hoursText(benchMinutes)} at the bench are free again.` }]
      : []),
  ];
}

function made({ taken, packed }: CancellationOutlook, job: Order['job']): Line[] {
  if (job.state === 'finished') {
    if (packed === 0) return [];
    const pieces = packed === 1 ? 'good piece goes' : 'good pieces go';
    return [
      {
        about: 'packed',
        says: `${countText(packed)} ${pieces} on the shelf of finished pieces, at what they cost to make.`,
      },
    ];
  }
  if (taken.length === 0) return [];
  return [
    {
      about: 'taken',
      says: (
        <>
          Taken already: {listed(taken)}. What can be used is brought back on{' '}
          <TextLink to={`/bench/jobs/${job.id}`}>{job.number}</TextLink>; the rest stays spent.
        </>
      ),
    },
  ];
}

function byHand({ purchaseOrders, tools, depositReceived }: CancellationOutlook): Line[] {
  return [
    ...purchaseOrders.map(({ id, number, supplierName, state }) => ({
      about: number,
      says: (
        <>
          <TextLink to={`/stockroom/purchase-orders/${id}`}>{number}</TextLink> to {supplierName} (
          {state}) names it and stays as it is: look whether it is still wanted.
        </>
      ),
    })),
    ...tools.map((tool) => ({
      about: tool,
      says: `The ${tool} is still on order: ask whether it can be stopped.`,
    })),
    ...(depositReceived
      ? [
          {
            about: 'deposit',
            says: 'A deposit was noted as received. It is not touched: settle it with the customer yourself.',
          },
        ]
      : []),
  ];
}

function listed(words: readonly string[]): string {
  const last = words.at(-1) ?? '';
  return words.length < 2 ? last : `${words.slice(0, -1).join(', ')} and ${last}`;
}
