import type { SupplierClaim } from '@hidewright/contract';
import { useQuery } from '@tanstack/react-query';
import { useState } from 'react';
import { Button } from '../../../components/button.tsx';
import { Card } from '../../../components/card.tsx';
import { StateMark } from '../../../components/state-mark.tsx';
import { TextLink } from '../../../components/text-link.tsx';
import { areaText, dayText, instantText, moneyText } from '../../../lib/formatting.ts';
import { useWorkshop } from '../../../lib/workshop.tsx';
import { goodsText } from '../goods-text.ts';
import { claimsQuery } from '../purchase-orders.queries.ts';
import { CloseClaimDialog } from './close-claim-dialog.tsx';
import { CorrectCreditDialog } from './correct-credit-dialog.tsx';

/** What was claimed on an order or is owed for what went back, and what became of it; nothing while nothing is. */
export function ClaimsCard({ orderId, isOwner }: { orderId: number; isOwner: boolean }) {
  const { data } = useQuery(claimsQuery(orderId));
  if (!data || data.items.length === 0) return null;
  return (
    <Card title="Claims">
      <ul className="divide-y divide-stitch">
        {data.items.map((claim) => (
          <li key={claim.id} className="py-3 first:pt-0 last:pb-0">
            <Claim claim={claim} isOwner={isOwner} />
          </li>
        ))}
      </ul>
    </Card>
  );
}

function Claim({ claim, isOwner }: { claim: SupplierClaim; isOwner: boolean }) {
  const [asking, setAsking] = useState<'credited' | 'given up' | 'put right'>();
  const close = () => setAsking(undefined);
  return (
    <div className="space-y-2">
      <p className="flex flex-wrap items-center gap-x-3 gap-y-1">
        <StateMark state={claim.state} />
        <strong>
          <WhatFor claim={claim} />
        </strong>
      </p>
      {claim.short && <ShortLots lots={claim.short.lots} />}
      <p className="text-sm text-ink-soft">
        <HowItBegan claim={claim} /> <Outcome claim={claim} />
      </p>
      <CreditsPutRight claim={claim} />
      {claim.text !== '' && (
        <details>
          <summary className="rounded py-1">What was written</summary>
          <p className="mt-2 max-w-prose whitespace-pre-line">{claim.text}</p>
        </details>
      )}
      {isOwner && claim.state === 'open' && (
        <div className="flex flex-wrap gap-2">
          <Button onClick={() => setAsking('credited')}>Note the credit</Button>
          <Button onClick={() => setAsking('given up')}>Give it up</Button>
        </div>
      )}
      {isOwner && claim.state === 'credited' && (
        <Button onClick={() => setAsking('put right')}>Put the credit right</Button>
      )}
      {(asking === 'credited' || asking === 'given up') && (
        <CloseClaimDialog claim={claim} as={asking} onClose={close} />
      )}
      {asking === 'put right' && <CorrectCreditDialog claim={claim} onClose={close} />}
    </div>
  );
}

function WhatFor({ claim: { short, sentBack, worth = '0' } }: { claim: SupplierClaim }) {
  const workshop = useWorkshop();
  const worthWords = `worth ${workshop.currency} ${moneyText(worth)}`;
  if (short !== null)
    return `${areaText(short.missingAreaMm2, workshop.areaUnit)} missing, ${worthWords}`;
  if (sentBack === null) return worthWords;
  const { lotId, lotTag, hardwareId, name, unit } = sentBack;
  const place = lotId === null ? `hardware/${hardwareId}` : `lots/${lotId}`;
  return (
    <>
      {`${goodsText(sentBack, workshop, unit)} of `}
      <TextLink to={`/stockroom/${place}`}>{lotTag ?? name}</TextLink>
      {` sent back, ${worthWords}`}
    </>
  );
}

type Short = NonNullable<SupplierClaim['short']>;

function ShortLots({ lots }: Pick<Short, 'lots'>) {
  const { areaUnit } = useWorkshop();
  return (
    <p>
      {lots.map((lot, at) => (
        <span key={lot.lotId}>
          {at > 0 && ', '}
          <TextLink to={`/stockroom/lots/${lot.lotId}`}>{lot.lotTag}</TextLink>
          {` (${areaText(lot.measuredAreaMm2, areaUnit)} of ${areaText(lot.markedAreaMm2, areaUnit)})`}
        </span>
      ))}
    </p>
  );
}

function HowItBegan({ claim: { sentBack, openedAt, sentBy } }: { claim: SupplierClaim }) {
  const { timeZone, today } = useWorkshop();
  if (sentBack !== null) return `Sent back ${dayText(sentBack.on, today)}: ${sentBack.reason}.`;
  return `Claimed ${instantText(openedAt, timeZone)} ${sentBy === 'mail' ? 'by e-mail' : 'by hand'}.`;
}

function Outcome({ claim }: { claim: SupplierClaim }) {
  const { currency } = useWorkshop();
  if (claim.state === 'credited')
    return `Credited: ${currency} ${moneyText(claim.credited ?? '0')}.`;
  return claim.state === 'given up' ? `Given up: ${claim.note}.` : 'No answer yet.';
}

/** Every note of a credit that was wrong, with why and what it was put right to. */
function CreditsPutRight({ claim: { credits = [] } }: { claim: SupplierClaim }) {
  const { currency, timeZone } = useWorkshop();
  const amount = (text: string | undefined) => `${currency} ${moneyText(text ?? '0')}`;
  return credits.map(
    ({ credited, reason, at, by }, index) =>
      reason !== '' && (
        <p key={at} className="text-sm text-ink-soft">
          {`Put right from ${amount(credits[index - 1]?.credited)} to ${amount(credited)}: ${reason} (${by}, ${instantText(at, timeZone)})`}
        </p>
      ),
  );
}
