import type { SupplierOfferReply } from '@hidewright/contract';
import { isPriceKnown } from '@hidewright/domain';
import { useQuery } from '@tanstack/react-query';
import { Card } from '../../../components/card.tsx';
import { TextLink } from '../../../components/text-link.tsx';
import { askedPriceText } from '../../../lib/formatting.ts';
import { areaUnits } from '../../../lib/units.ts';
import { useWorkshop } from '../../../lib/workshop.tsx';
import { supplierOffersQuery } from '../../../lib/supplier-offers.queries.ts';

/** What one supplier sells, as far as it was entered. */
export function SoldList({ supplierId }: { supplierId: number }) {
  const { data } = useQuery(supplierOffersQuery({ supplierId }));
  const offers = data?.items ?? [];
  if (offers.length === 0) return null;
  return (
    <Card
      title="What they sell"
      subtitle="as far as their prices are entered with the leather or the hardware"
    >
      <ul className="space-y-2">
        {offers.map((offer) => (
          <SoldItem key={offer.id} offer={offer} />
        ))}
      </ul>
    </Card>
  );
}

function SoldItem({ offer }: { offer: SupplierOfferReply }) {
  const { areaUnit, currency } = useWorkshop();
  const { of, leatherId, hardwareId, name, breaks = [], articleNumber } = offer;
  const prices = breaks
    .filter(({ price }) => isPriceKnown(price))
    .map(({ price }) => askedPriceText(price, of === 'leather' ? areaUnit : undefined));
  const detail = [
    articleNumber && `article ${articleNumber}`,
    breaks.length > 0 && prices.length === 0 && 'price not known',
    prices.length > 0 &&
      `${prices.join(', ')} ${currency} per ${of === 'leather' ? areaUnits[areaUnit].sign : 'piece'}`,
    offer.preferred && 'usually bought here',
  ].filter(Boolean);
  return (
    <li>
      <TextLink to={`/stockroom/${of}/${leatherId ?? hardwareId}`}>{name}</TextLink>
      <p className="text-sm text-ink-soft">{detail.join(' · ')}</p>
    </li>
  );
}
