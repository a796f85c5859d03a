import type { Offer } from '@hidewright/contract';
import { Notice } from '../../../components/notice.tsx';
import { Stitch } from '../../../components/stitch.tsx';
import { longDayText } from '../../../lib/formatting.ts';
import { OfferAgreed } from './offer-agreed.tsx';
import { OfferChoice } from './offer-choice.tsx';
import { PiecePicture } from './piece-picture.tsx';

/** A quote as its customer reads it. */
export function OfferPage({ offer, token }: { offer: Offer; token: string }) {
  return (
    <div className="mx-auto max-w-md px-4 pt-5 pb-12">
      <title>{`${offer.title} · ${offer.shopName}`}</title>
      <header className="flex flex-wrap items-baseline justify-between gap-x-4">
        <p className="text-lg font-bold">{offer.shopName}</p>
        <p className="text-ink-soft">{`Quote ${offer.number}`}</p>
      </header>
      <Stitch className="my-4" />
      <main className="space-y-5">
        <div>
          <h1>{offer.title}</h1>
          <p>
            {`For ${offer.customerName}`}
            {offer.inHandsOn && (
              <>
                , with you by{' '}
                <strong className="font-semibold">{longDayText(offer.inHandsOn)}</strong>
              </>
            )}
            .
          </p>
        </div>
        {offer.outline && <PiecePicture outline={offer.outline} />}
        {offer.message !== '' && <p className="whitespace-pre-line">{offer.message}</p>}
        <OfferAnswer offer={offer} token={token} />
      </main>
    </div>
  );
}

function OfferAnswer({ offer, token }: { offer: Offer; token: string }) {
  if (offer.order?.cancelledOn)
    return (
      <Notice tone="attention" title={`Order ${offer.order.number} is cancelled.`}>
        {`It was called off on ${longDayText(offer.order.cancelledOn)}, and nothing more is made for it. Ask ${offer.shopName} for a new quote.`}
      </Notice>
    );
  if (offer.state === 'agreed') return <OfferAgreed offer={offer} />;
  if (offer.state === 'declined') {
    return (
      <Notice tone="info">{`This quote was declined. Ask ${offer.shopName} for a new one.`}</Notice>
    );
  }
  if (offer.state === 'lapsed') {
    return (
      <Notice tone="attention">{`This offer has run out. Ask ${offer.shopName} for a new one.`}</Notice>
    );
  }
  return (
    <>
      <OfferChoice offer={offer} token={token} />
      {offer.validUntil && (
        <p className="text-sm text-ink-soft">{`The offer is good until ${longDayText(offer.validUntil)}.`}</p>
      )}
    </>
  );
}
