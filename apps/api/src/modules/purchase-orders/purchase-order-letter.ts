import { Decimal } from 'decimal.js';
import type { PurchaseLine, PurchaseOrder } from '@hidewright/contract';
import { sayArea } from '../stock/say-area.ts';

interface Sender {
  name: string;
  address: string;
  currency: string;
  areaUnit: 'ft2' | 'dm2' | 'm2';
}

/** An order in the words of a letter to its supplier. */
export function purchaseOrderLetter(
  order: PurchaseOrder,
  from: Sender,
): { subject: string; body: string } {
  const paragraphs = [
    'Good day,',
    `Please send us, on our order ${order.number}:`,
    order.lines.map((line) => sayLine(line, from)).join('\n'),
    `Together ${from.currency} ${order.total ?? ''}, before carriage and tax.`,
    order.expectedOn === null
      ? ''
      : `We count on it by ${order.expectedOn}. Please tell us if it will be later.`,
    order.note,
    'The order is attached. Please put its sheet, or its number, in with the goods.',
    from.address.startsWith(from.name)
      ? from.address
      : [from.name, from.address].filter(Boolean).join('\n'),
  ];
  return {
    subject: `Order ${order.number} from ${from.name}`,
    body: `${paragraphs.filter(Boolean).join('\n\n')}\n`,
  };
}

function sayLine(line: PurchaseLine, { areaUnit, currency }: Sender): string {
  const price = `${currency} ${line.unitPrice ?? ''}`;
  if (line.areaMm2 === null) return `- ${line.quantity ?? 0} × ${line.name}, at ${price} each`;
  return `- ${sayArea(new Decimal(line.areaMm2), areaUnit)} of ${line.name}, at ${price} per ft²`;
}
