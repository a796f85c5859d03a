import type { CutFrom } from '@hidewright/contract';
import { useQuery } from '@tanstack/react-query';
import { Card } from '../../../components/card.tsx';
import { areaText } from '../../../lib/formatting.ts';
import { useWorkshop } from '../../../lib/workshop.tsx';
import { orderLeatherQuery } from '../lot-family.queries.ts';
import { CameIn } from './came-in.tsx';
import { LotLink } from './lot-link.tsx';

interface CutFromCardProps {
  orderId: number;
  mayOpenOrders: boolean;
}

/** The lots that an order was cut from, each back to the side and its delivery. */
export function CutFromCard({ orderId, mayOpenOrders }: CutFromCardProps) {
  const { data } = useQuery(orderLeatherQuery(orderId));
  if (!data) return null;
  return (
    <Card title="Cut from">
      {data.lots.length === 0 && <p className="text-ink-soft">No leather is taken yet.</p>}
      <ul aria-label="Cut from" className="divide-y divide-stitch/60">
        {data.lots.map((lot) => (
          <Lot key={lot.lotId} lot={lot} mayOpenOrders={mayOpenOrders} />
        ))}
      </ul>
    </Card>
  );
}

function Lot({ lot, mayOpenOrders }: { lot: CutFrom; mayOpenOrders: boolean }) {
  const { areaUnit } = useWorkshop();
  const [own, ...earlier] = lot.chain.toReversed();
  if (!own) return null;
  return (
    <li className="py-1.5">
      <div className="flex flex-wrap items-center justify-between gap-x-4">
        <span>
          <LotLink lotId={own.lotId} tag={own.tag} />{' '}
          <span className="text-ink-soft">
            {[own.form, own.shade].filter((word) => word !== '').join(', ')}
          </span>
          {earlier.map(({ lotId, tag, form }) => (
            <span key={lotId}>
              {' of '}
              <LotLink lotId={lotId} tag={tag} /> <span className="text-ink-soft">{form}</span>
            </span>
          ))}
        </span>
        <span>{areaText(lot.areaMm2, areaUnit)}</span>
      </div>
      <p className="text-sm text-ink-soft">
        <CameIn origin={lot.origin} mayOpenOrders={mayOpenOrders} />
      </p>
    </li>
  );
}
