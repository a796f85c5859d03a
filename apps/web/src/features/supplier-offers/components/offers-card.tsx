import { useQuery } from '@tanstack/react-query';
import { useState } from 'react';
import { Button } from '../../../components/button.tsx';
import { Card } from '../../../components/card.tsx';
import type { Choice } from '../../../components/select-field.tsx';
import { supplierOffersQuery, type OfferedThing } from '../../../lib/supplier-offers.queries.ts';
import { AddOfferDialog } from './add-offer-dialog.tsx';
import { BestBuy } from './best-buy.tsx';
import { OfferItem } from './offer-item.tsx';

interface OffersCardProps {
  thing: OfferedThing;
  ownPrice: string | undefined;
  suppliers: readonly Choice[];
  isOwner: boolean;
}

/** Who sells it for how much, and what a quantity would really cost from each. */
export function OffersCard({ thing, ownPrice, suppliers, isOwner }: OffersCardProps) {
  const [adding, setAdding] = useState(false);
  const { data } = useQuery(supplierOffersQuery(thing));
  const offers = data?.items ?? [];
  if (offers.length === 0 && !isOwner) return null;
  const free = suppliers.filter(({ value }) => !offers.some((each) => each.supplierId === value));
  return (
    <Card
      title="Who sells it"
      subtitle={offers.length > 1 ? 'with their prices for more' : undefined}
    >
      {offers.length === 0 ? (
        <p className="mb-3 text-ink-soft">
          Its one price is enough to quote. Enter what several suppliers ask, with their prices for
          more, to see where a quantity costs least.
        </p>
      ) : (
        <ul className="mb-4 space-y-4">
          {offers.map((offer) => (
            <OfferItem
              key={offer.id}
              offer={offer}
              suppliers={suppliers}
              ownPrice={ownPrice}
              isOwner={isOwner}
            />
          ))}
        </ul>
      )}
      {isOwner && <AddOffer suppliers={suppliers} free={free} onAdd={() => setAdding(true)} />}
      {isOwner && offers.length > 0 && <BestBuy offers={offers} />}
      {adding && <AddOfferDialog thing={thing} suppliers={free} onClose={() => setAdding(false)} />}
    </Card>
  );
}

interface AddOfferProps {
  suppliers: readonly Choice[];
  /** Those that are not on the list yet. */
  free: readonly Choice[];
  onAdd: () => void;
}

function AddOffer({ suppliers, free, onAdd }: AddOfferProps) {
  if (suppliers.length === 0)
    return <p className="text-sm text-ink-soft">Add a supplier to the stockroom first.</p>;
  return free.length > 0 && <Button onClick={onAdd}>Add what a supplier asks</Button>;
}
