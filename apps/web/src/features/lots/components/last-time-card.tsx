import { readLotPhoto, type LastTime } from '@hidewright/contract';
import { useQuery } from '@tanstack/react-query';
import { Card } from '../../../components/card.tsx';
import { TextLink } from '../../../components/text-link.tsx';
import { addressOf } from '../../../lib/api.ts';
import { areaText, dayText } from '../../../lib/formatting.ts';
import { useWorkshop } from '../../../lib/workshop.tsx';
import { lastTimeQuery } from '../lot-family.queries.ts';
import { LotLink } from './lot-link.tsx';

/** On a reorder: the leather of the run before, as the swatch to match. */
export function LastTimeCard({ of, id }: { of: 'order' | 'quote'; id: number }) {
  const { today } = useWorkshop();
  const { data } = useQuery(lastTimeQuery({ of, id }));
  if (!data?.lastTime || data.lastTime.lots.length === 0) return null;
  const { orderId, orderNumber, title, shippedOn, cut, lots } = data.lastTime;
  return (
    <Card
      title="The shade to match"
      subtitle={
        <>
          {cut ? 'Last time' : 'Held for'}:{' '}
          <TextLink to={`/counter/orders/${orderId}`}>{orderNumber}</TextLink> {title}
          {shippedOn !== null && `, shipped ${dayText(shippedOn, today)}`}
        </>
      }
    >
      <ul aria-label={cut ? 'Cut from last time' : 'Held, and not cut yet'} className="space-y-3">
        {lots.map((lot) => (
          <Swatch key={lot.lotId} lot={lot} />
        ))}
      </ul>
    </Card>
  );
}

function Swatch({ lot }: { lot: LastTime['lots'][number] }) {
  const { areaUnit } = useWorkshop();
  const { lotId, tag, shade, onHandAreaMm2, photo } = lot;
  const left =
    onHandAreaMm2 === '0' ? 'used up' : `${areaText(onHandAreaMm2, areaUnit)} left of it`;
  return (
    <li className="flex items-center gap-4">
      {photo && (
        <img
          src={addressOf(readLotPhoto, { params: { id: photo.lotId, hash: photo.hash } })}
          alt={`Lot ${tag}`}
          className="size-24 shrink-0 rounded border border-edge object-cover"
        />
      )}
      <div>
        <LotLink lotId={lotId} tag={tag} /> <span>{shade === '' ? 'shade not noted' : shade}</span>
        <div className="text-sm text-ink-soft">
          {left}
          {!photo && '; no photo of it was kept'}
        </div>
      </div>
    </li>
  );
}
