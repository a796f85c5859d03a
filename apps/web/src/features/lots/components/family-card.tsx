import type { FamilyMember, WentInto } from '@hidewright/contract';
import { useQuery } from '@tanstack/react-query';
import { Card } from '../../../components/card.tsx';
import { TextLink } from '../../../components/text-link.tsx';
import { countText, rackAreaText } from '../../../lib/formatting.ts';
import { useWorkshop } from '../../../lib/workshop.tsx';
import { depthOf } from '../lot-words.ts';
import { lotFamilyQuery } from '../lot-family.queries.ts';
import { CameIn } from './came-in.tsx';
import { LotLink } from './lot-link.tsx';

interface FamilyCardProps {
  lotId: number;
  /** Whether the person may open tickets and purchase orders. */
  handlesStock: boolean;
}

/** Where a lot came from, what was cut from it, and whose pieces it became. */
export function FamilyCard({ lotId, handlesStock }: FamilyCardProps) {
  const { data: family } = useQuery(lotFamilyQuery(lotId));
  if (!family) return null;
  const { lots, origin, wentInto } = family;
  return (
    <Card title="From the side to the customer">
      <ul aria-label="Cut from one another" className="space-y-1">
        {lots.map((lot) => (
          <li key={lot.lotId} style={{ paddingLeft: `${depthOf(lots, lot.lotId) * 1.25}rem` }}>
            <Member
              lot={lot}
              isThis={lot.lotId === lotId}
              wasWorkedOn={lots.some(
                (each) => each.parentId === lot.lotId && each.service !== null,
              )}
            />
            {lot.parentId === null && (
              <p className="text-sm text-ink-soft">
                <CameIn origin={origin} mayOpenOrders={handlesStock} />
              </p>
            )}
          </li>
        ))}
      </ul>
      <h3 className="mt-4 mb-1">Went into</h3>
      {wentInto.length === 0 && <p className="text-ink-soft">Nothing yet.</p>}
      <ul aria-label="Went into" className="divide-y divide-stitch/60">
        {wentInto.map((use) => (
          <Use
            key={`${use.jobId} ${use.lotId}`}
            use={use}
            fromOther={use.lotId !== lotId}
            mayOpenJobs={handlesStock}
          />
        ))}
      </ul>
    </Card>
  );
}

interface MemberProps {
  lot: FamilyMember;
  isThis: boolean;
  /** Some of it came back from a service as a lot of its own. */
  wasWorkedOn: boolean;
}

function Member({ lot, isThis, wasWorkedOn }: MemberProps) {
  const workshop = useWorkshop();
  const area = (areaMm2: string) => rackAreaText(areaMm2, workshop);
  const after = lot.service === null ? '' : `after ${lot.service}`;
  const words = [after, lot.form, lot.shade, lot.place].filter((word) => word !== '').join(', ');
  return (
    <div className="flex flex-wrap items-center justify-between gap-x-4">
      <span aria-current={isThis ? 'true' : undefined}>
        {isThis ? (
          <strong className="inline-flex min-h-11 items-center">{lot.tag}</strong>
        ) : (
          <LotLink lotId={lot.lotId} tag={lot.tag} />
        )}{' '}
        <span className="text-ink-soft">{isThis ? `this lot, ${words}` : words}</span>
      </span>
      <span className="text-sm">{wasWorkedOn ? afterWork(lot, area) : leftOf(lot, area)}</span>
    </div>
  );
}

function leftOf(
  { onHandAreaMm2, measuredAreaMm2, outAreaMm2 }: FamilyMember,
  area: (areaMm2: string) => string,
): string {
  if (outAreaMm2 === measuredAreaMm2) return `${area(measuredAreaMm2)}, out`;
  if (outAreaMm2 !== '0')
    return `${area(measuredAreaMm2)}, ${area(outAreaMm2)} out, ${area(onHandAreaMm2)} left`;
  if (onHandAreaMm2 === '0') return `${area(measuredAreaMm2)}, used up`;
  if (onHandAreaMm2 === measuredAreaMm2) return `${area(measuredAreaMm2)}, all there`;
  return `${area(measuredAreaMm2)}, ${area(onHandAreaMm2)} left`;
}

/** Nothing of it was used up: it hangs below as what it has become. */
const afterWork = (lot: FamilyMember, area: (areaMm2: string) => string): string =>
  lot.onHandAreaMm2 === '0' && lot.outAreaMm2 === '0'
    ? `${area(lot.measuredAreaMm2)}, nothing left`
    : leftOf(lot, area);

interface UseProps {
  use: WentInto;
  /** Cut from an offcut of this lot. */
  fromOther: boolean;
  mayOpenJobs: boolean;
}

function Use({ use, fromOther, mayOpenJobs }: UseProps) {
  const workshop = useWorkshop();
  const { jobId, jobNumber, orderId, orderNumber, title, customerName, areaMm2, good } = use;
  return (
    <li className="flex flex-wrap items-center justify-between gap-x-4 py-1.5">
      <div>
        <div>
          {mayOpenJobs ? <TextLink to={`/bench/jobs/${jobId}`}>{jobNumber}</TextLink> : jobNumber}{' '}
          {title}
        </div>
        <div className="text-sm text-ink-soft">
          <TextLink to={`/counter/orders/${orderId}`}>{orderNumber}</TextLink> for {customerName}
          {good !== null && `, ${countText(good)} good pieces`}
        </div>
      </div>
      <span>
        {rackAreaText(areaMm2, workshop)}
        {fromOther && ` of ${use.tag}`}
      </span>
    </li>
  );
}
