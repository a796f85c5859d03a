import type { Offer } from '@hidewright/contract';
import { Stitch } from '../../../components/stitch.tsx';
import { rungsOf } from './rungs-of.ts';
import { countText, longDayText, moneyText, unitPriceText } from '../../../lib/formatting.ts';

/** What was agreed, to look up again whenever the link is opened. */
export function OfferAgreed({ offer }: { offer: Offer }) {
  const rung = rungsOf(offer, offer.agreedOption).find(
    (each) => each.quantity === offer.agreedQuantity,
  );
  if (!rung) return null;
  return (
    <section
      aria-labelledby="agreed"
      className="rounded border-2 border-verdigris bg-verdigris-pale p-4"
    >
      <div role="status">
        <h2 id="agreed">{`You agreed to ${countText(rung.quantity)}`}</h2>
        {offer.agreedOption !== null && <p>{offer.agreedOption}</p>}
        {offer.agreedOn && <p className="text-ink-soft">{`on ${longDayText(offer.agreedOn)}`}</p>}
      </div>
      <dl className="mt-3 space-y-1">
        <Line
          word={`${countText(rung.quantity)} at ${unitPriceText(rung.priceEach)} each`}
          amount={rung.goodsTotal}
        />
        {rung.charges.map(({ name, amount }) => (
          <Line key={name} word={name} amount={amount} />
        ))}
        {offer.tooling.map((tool) => (
          <Line key={tool.name} word={`${tool.name}, charged once`} amount={tool.charge} />
        ))}
      </dl>
      <Stitch className="my-2" />
      <dl>
        <Line word={`together, in ${offer.currency}`} amount={rung.total} strong />
      </dl>
      <WhatBecameOfIt offer={offer} />
    </section>
  );
}

/** The day that is promised now, or how it ended. */
function WhatBecameOfIt({ offer: { order, shopName } }: { offer: Offer }) {
  if (order === null)
    return <p className="mt-3">{`${shopName} has your answer and will confirm the day to you.`}</p>;
  if (order.shippedOn !== null)
    return (
      <p className="mt-3">{`Order ${order.number} left ${shopName} on ${longDayText(order.shippedOn)}.`}</p>
    );
  return (
    <p className="mt-3">
      {`Order ${order.number}: packed by `}
      <strong className="font-semibold">{longDayText(order.promisedOn)}</strong>.
    </p>
  );
}

function Line({
  word,
  amount,
  strong = false,
}: {
  word: string;
  amount: string;
  strong?: boolean;
}) {
  return (
    <div className={`flex justify-between gap-4 ${strong ? 'font-bold' : ''}`}>
      <dt>{word}</dt>
      <dd className="font-semibold">{moneyText(amount)}</dd>
    </div>
  );
}
