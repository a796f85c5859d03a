import type { receiveDelivery, ReplyOf } from '@hidewright/contract';
import { Card } from '../../../components/card.tsx';
import { Stitch } from '../../../components/stitch.tsx';
import { TextLink } from '../../../components/text-link.tsx';
import { areaText, countText } from '../../../lib/formatting.ts';
import { useWorkshop } from '../../../lib/workshop.tsx';

/** What is on the rack now, with the tags to hang on it. */
export function ReceivedSummary({ received }: { received: ReplyOf<typeof receiveDelivery> }) {
  const { areaUnit } = useWorkshop();
  const { lots, hardware } = received;
  return (
    <Card
      title="On the rack"
      subtitle={lots.length > 0 ? 'Hang these tags on the leather:' : undefined}
    >
      <ul className="space-y-3">
        {lots.map((lot) => (
          <li key={lot.id}>
            <TextLink to={`/stockroom/lots/${lot.id}`} className="text-xl">
              {lot.tag}
            </TextLink>
            <span className="block text-ink-soft">
              {lot.leatherName}, {lot.form}, {areaText(lot.measuredAreaMm2, areaUnit)}
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
