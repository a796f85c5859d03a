import type { PurchaseOrder, Receipt } from '@hidewright/contract';
import { useState } from 'react';
import { Button } from '../../../components/button.tsx';
import { Card } from '../../../components/card.tsx';
import { dayText, instantText, moneyText } from '../../../lib/formatting.ts';
import { useWorkshop } from '../../../lib/workshop.tsx';
import { PriceNotice } from './price-notice.tsx';
import { ReceiptCostsDialog } from './receipt-costs-dialog.tsx';
import { ReceiptLinesTable } from './receipt-lines-table.tsx';
import { ShortNotice } from './short-notice.tsx';

const sharedWords = { value: 'by value', area: 'by area', count: 'by count' };

interface ReceiptCardProps {
  receipt: Receipt;
  /** The order that it was for, and which delivery of it this is, from 1; none where nobody can be claimed from. */
  of?: { order: PurchaseOrder; count: number } | undefined;
  isOwner: boolean;
}

/** One delivery: what came, what it cost, and what of it is other than was marked or ordered. */
export function ReceiptCard({ receipt, of, isOwner }: ReceiptCardProps) {
  const { today, timeZone } = useWorkshop();
  const [correcting, setCorrecting] = useState(false);
  const { freight, duty } = receipt;
  const day = dayText(receipt.receivedOn, today);
  const written = instantText(receipt.at, timeZone, today);
  const title = of ? `Delivery ${of.count}, ${day}` : `${written}: ${whatCame(receipt)}`;
  return (
    <Card
      title={title}
      subtitle={of ? `received by ${receipt.byName}` : `came ${day}, received by ${receipt.byName}`}
      aside={
        isOwner &&
        receipt.staysBecause === null && (
          <Button onClick={() => setCorrecting(true)}>Put right what it cost</Button>
        )
      }
    >
      <ShortNotice receipt={receipt} order={of?.order} isOwner={isOwner} />
      <PriceNotice receipt={receipt} isOwner={isOwner} />
      <ReceiptLinesTable receipt={receipt} label={`What came: ${title}`} />
      {freight !== undefined && duty !== undefined && (
        <Carriage freight={freight} duty={duty} sharedBy={sharedWords[receipt.sharedBy]} />
      )}
      {isOwner && receipt.staysBecause !== null && (
        <p className="mt-1 max-w-prose text-sm text-ink-soft">{receipt.staysBecause}</p>
      )}
      {correcting && <ReceiptCostsDialog receipt={receipt} onClose={() => setCorrecting(false)} />}
    </Card>
  );
}

/** MKT-1 and 2 more: with the time, several deliveries of one day are told apart by it. */
function whatCame({ lines }: Receipt): string {
  const [first, ...others] = lines.map(({ lotTag, name }) => lotTag ?? name);
  return [first, ...(others.length > 0 ? [`${others.length} more`] : [])].join(' and ');
}

function Carriage(props: { freight: string; duty: string; sharedBy: string }) {
  const { currency } = useWorkshop();
  const { freight, duty, sharedBy } = props;
  const parts = [
    ...(Number(freight) > 0 ? [`freight ${moneyText(freight)}`] : []),
    ...(Number(duty) > 0 ? [`duty ${moneyText(duty)}`] : []),
  ];
  if (parts.length === 0)
    return <p className="mt-3 text-sm text-ink-soft">No freight or duty is noted.</p>;
  return (
    <p className="mt-3 text-sm text-ink-soft">
      {`In the cost, ${currency}: ${parts.join(' and ')}, shared out ${sharedBy}.`}
    </p>
  );
}
