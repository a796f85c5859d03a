import type { SupplierOfferReply } from '@hidewright/contract';
import { Check } from 'lucide-react';
import { useState } from 'react';
import { Button } from '../../../components/button.tsx';
import { ConfirmDialog } from '../../../components/confirm-dialog.tsx';
import type { Choice } from '../../../components/select-field.tsx';
import { TextLink } from '../../../components/text-link.tsx';
import { say } from '../../../components/toast.ts';
import { countText } from '../../../lib/formatting.ts';
import { useWorkshop } from '../../../lib/workshop.tsx';
import { hasPrice, soldText } from '../offer-words.ts';
import { useAdoptSupplierOffer, useRemoveSupplierOffer } from '../supplier-offers.mutations.ts';
import { ChangeOfferDialog } from './change-offer-dialog.tsx';
import { OfferLadder } from './offer-ladder.tsx';

interface OfferItemProps {
  offer: SupplierOfferReply;
  suppliers: readonly Choice[];
  /** What quotes reckon with now. */
  ownPrice: string | undefined;
  isOwner: boolean;
}

/** One supplier with its days, its pack and its prices. */
export function OfferItem({ offer, suppliers, ownPrice, isOwner }: OfferItemProps) {
  const workshop = useWorkshop();
  const days = `${countText(offer.usualLeadDays)} ${offer.usualLeadDays === 1 ? 'day' : 'days'}`;
  const detail = [
    offer.articleNumber && `article ${offer.articleNumber}`,
    days,
    soldText(offer, workshop),
  ];
  return (
    <li className="border-t border-stitch pt-4 first:border-t-0 first:pt-0">
      <div className="flex flex-wrap items-baseline gap-x-3">
        <h3 className="text-base font-semibold">
          <TextLink to={`/stockroom/suppliers/${offer.supplierId}`}>{offer.supplierName}</TextLink>
        </h3>
        {offer.preferred && (
          <span className="inline-flex items-center gap-1 text-sm font-semibold text-verdigris">
            <Check size={16} aria-hidden="true" /> usually bought here
          </span>
        )}
      </div>
      <p className="mb-2 text-sm text-ink-soft">{detail.filter(Boolean).join(' · ')}</p>
      <OfferLadder offer={offer} />
      {isOwner && <OfferActs offer={offer} suppliers={suppliers} ownPrice={ownPrice} />}
    </li>
  );
}

function OfferActs({ offer, suppliers, ownPrice }: Omit<OfferItemProps, 'isOwner'>) {
  const [open, setOpen] = useState<'change' | 'remove'>();
  const adopt = useAdoptSupplierOffer();
  const remove = useRemoveSupplierOffer();
  const first = offer.breaks?.[0]?.price;
  const inUse = offer.preferred && Number(first) === Number(ownPrice);
  const name = <span className="sr-only">{` of ${offer.supplierName}`}</span>;
  return (
    <div className="mt-3 flex flex-wrap gap-2">
      {hasPrice(offer) && !inUse && (
        <Button
          busy={adopt.isPending}
          onClick={() =>
            adopt.mutate(
              { params: { id: offer.id } },
              { onSuccess: () => say(`Quotes reckon with ${offer.supplierName}’s price now.`) },
            )
          }
        >
          Use this price{name}
        </Button>
      )}
      <Button tone="quiet" onClick={() => setOpen('change')}>
        Change{name}
      </Button>
      <Button tone="quiet" onClick={() => setOpen('remove')}>
        Remove{name}
      </Button>
      {open === 'change' && (
        <ChangeOfferDialog offer={offer} suppliers={suppliers} onClose={() => setOpen(undefined)} />
      )}
      <ConfirmDialog
        open={open === 'remove'}
        onOpenChange={() => setOpen(undefined)}
        title={`Take ${offer.supplierName}’s offer off the list?`}
        confirmWord="Take it off"
        tone="danger"
        onConfirm={() => remove.mutateAsync({ params: { id: offer.id } })}
      >
        Its prices are forgotten. What was ordered from {offer.supplierName} stays as it is, and so
        does the price that quotes reckon with.
      </ConfirmDialog>
    </div>
  );
}
