import type { receiveDelivery, ReplyOf } from '@hidewright/contract';
import type { AreaHabit } from '@hidewright/domain';
import { Card } from '../../../components/card.tsx';
import { Notice } from '../../../components/notice.tsx';
import { Stitch } from '../../../components/stitch.tsx';
import { TextLink } from '../../../components/text-link.tsx';
import { rackAreaText, countText } from '../../../lib/formatting.ts';
import { useWorkshop } from '../../../lib/workshop.tsx';

function overOf(received: ReplyOf<typeof receiveDelivery>, habit: AreaHabit): string[] {
  const lines = received.purchaseOrder?.lines ?? [];
  return lines.flatMap(({ name, over: { areaMm2, quantity } }) => {
    if (quantity !== null && quantity > 0) return [`${name}: ${countText(quantity)} over`];
    if (areaMm2 !== null && Number(areaMm2) > 0)
      return [`${name}: ${rackAreaText(areaMm2, habit)} over`];
    return [];
  });
}

/** What is on the rack now, with the tags to hang on it, and what the owner should know of it. */
export function ReceivedSummary({ received }: { received: ReplyOf<typeof receiveDelivery> }) {
  const workshop = useWorkshop();
  const { lots, hardware, receipt } = received;
  const short = receipt?.lines.filter((line) => line.marked?.short) ?? [];
  const over = overOf(received, workshop);
  return (
    <Card
      title={lots.length + hardware.length > 0 ? 'On the rack' : 'Nothing more is awaited'}
      subtitle={lots.length > 0 ? 'Hang these tags on the leather:' : undefined}
    >
      {short.length > 0 && (
        <Notice tone="attention" title="Short of the mark:" className="mb-4">
          {short.map((line) => line.lotTag).join(', ')}. The owner sees it{' '}
          {receipt?.purchaseOrderId === null ? 'with the delivery' : 'on Today and with the order'}.
        </Notice>
      )}
      {over.length > 0 && (
        <Notice title="More than was ordered." className="mb-4">
          {over.join('; ')}.
        </Notice>
      )}
      <ul className="space-y-3">
        {lots.map((lot) => (
          <li key={lot.id}>
            <TextLink to={`/stockroom/lots/${lot.id}`} className="text-xl">
              {lot.tag}
            </TextLink>
            <span className="block text-ink-soft">
              {lot.leatherName}, {lot.form}, {rackAreaText(lot.measuredAreaMm2, workshop)}
              {lot.place !== '' && `, ${lot.place}`}
            </span>
          </li>
        ))}
      </ul>
      {lots.length > 0 && hardware.length > 0 && <Stitch className="my-4" />}
      <ul className="space-y-1">
        {hardware.map((item) => (
          <li key={item.id} className="flex justify-between gap-4">
            <TextLink to={`/stockroom/hardware/${item.id}`}>{item.name}</TextLink>
            <span>{countText(item.onHand)} on hand</span>
          </li>
        ))}
      </ul>
    </Card>
  );
}
