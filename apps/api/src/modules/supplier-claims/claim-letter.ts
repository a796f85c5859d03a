import type { draftClaim, ReplyOf } from '@hidewright/contract';
import { Decimal } from 'decimal.js';
import { sayDay } from '../../say-day.ts';
import { sayArea } from '../stock/say-area.ts';

interface Claimed extends Omit<ReplyOf<typeof draftClaim>, 'text' | 'supplierEmail'> {
  orderNumber: string;
  receivedOn: string;
}

interface Sender {
  name: string;
  currency: string;
  areaUnit: 'ft2' | 'dm2' | 'm2';
}

/** A claim in the words of a letter, for the owner to change. */
export function claimLetter(claimed: Claimed, from: Sender): string {
  const say = (areaMm2: string) => sayArea(new Decimal(areaMm2), from.areaUnit);
  const lots = claimed.lots.map(
    ({ lotTag, leatherName, markedAreaMm2, measuredAreaMm2 }) =>
      `- ${lotTag}, ${leatherName}: marked ${say(markedAreaMm2)}, measured ${say(measuredAreaMm2)}`,
  );
  return [
    'Good day,',
    `Of our order ${claimed.orderNumber}, which came on ${sayDay(claimed.receivedOn)}, these are smaller than is marked on them:`,
    lots.join('\n'),
    `Together ${say(claimed.missingAreaMm2)} is missing, which is ${from.currency} ${claimed.worth} at the price of the order. Please credit it, or tell us how you measure.`,
    from.name,
  ].join('\n\n');
}
