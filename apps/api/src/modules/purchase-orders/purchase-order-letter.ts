import { countedWords, figureWords, unitWord } from '@hidewright/domain';
import { Decimal } from 'decimal.js';
import type { PurchasedService, PurchaseLine, PurchaseOrder } from '@hidewright/contract';
import { sayDay } from '../../say-day.ts';
import { sayArea } from '../stock/say-area.ts';
import { areaPriceOf } from './area-price.ts';

import { sayOrderedArea } from './ordered-area.ts';
import { isUnpriced } from './unpriced.ts';

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
    asking(order),
    order.lines.map((line) => sayLine(line, from)).join('\n'),
    sayTotal(order, from.currency),
    order.expectedOn === null
      ? ''
      : `We count on it by ${sayDay(order.expectedOn)}. Please tell us if it will be later.`,
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

/** Leather that goes out comes with the letter or after it; goods are only asked for. */
function asking({ number, lines }: PurchaseOrder): string {
  const works = lines.filter(({ of }) => of === 'service').length;
  if (works === 0) return `Please send us, on our order ${number}:`;
  if (works === lines.length) return `Please do this work for us, on our order ${number}:`;
  return `Please send us, and do for us, on our order ${number}:`;
}

/** Where no price is known there is nothing to add up. */
function sayTotal({ lines, total = '' }: PurchaseOrder, currency: string): string {
  if (lines.every(isUnpriced)) return '';
  const without = lines.some(isUnpriced) ? ', without what you are to tell us the price of' : '';
  return `Together ${currency} ${figureWords(total)}, before carriage and tax${without}.`;
}

function sayLine(line: PurchaseLine, { areaUnit, currency }: Sender): string {
  if (line.service !== null) return sayWork(line, line.service, { areaUnit, currency });
  const [much, price] =
    line.areaMm2 === null
      ? [sayCount(line), sayPriceOfOne(line, currency)]
      : [
          `${sayOrderedArea(line, areaUnit)} of`,
          `at ${sayAreaPrice(line, { areaUnit, currency })}`,
        ];
  return `- ${much} ${nameAndArticle(line)}, ${isUnpriced(line) ? 'please tell us its price' : price}`;
}

/** USD 9.50 per ft² */
function sayAreaPrice(
  { unitPrice = '0.00' }: PurchaseLine,
  { areaUnit, currency }: Pick<Sender, 'areaUnit' | 'currency'>,
): string {
  const price = areaPriceOf(unitPrice, areaUnit);
  return `${currency} ${price.unitPrice} ${price.per}`;
}

/** - 1,500 × Rivets 7 mm, at USD 0.11 each; - 250 ml of Edge dye, at USD 0.04 per ml */
function sayCount({ quantity, unit }: PurchaseLine): string {
  const counted = countedWords(quantity ?? 0, unit ?? 'piece');
  return (unit ?? 'piece') === 'piece' ? `${counted} ×` : `${counted} of`;
}

function sayPriceOfOne({ unitPrice, unit }: PurchaseLine, currency: string): string {
  const one = (unit ?? 'piece') === 'piece' ? 'each' : `per ${unitWord(unit ?? 'piece')}`;
  return `at ${currency} ${unitPrice ?? ''} ${one}`;
}

const nameAndArticle = ({ name, articleNumber }: PurchaseLine): string =>
  articleNumber === '' ? name : `${name}, your article ${articleNumber}`;

/** - Dyeing of T-0012, Oak tan natural 7–8 oz, 24.8 ft², to become Oak tan black 7–8 oz, at USD 1.50 per ft² */
function sayWork(
  line: PurchaseLine,
  { changes, becomesName }: PurchasedService,
  { areaUnit, currency }: Pick<Sender, 'areaUnit' | 'currency'>,
): string {
  const price = line.fixedPrice ?? null;
  const parts = [
    line.name,
    sayArea(new Decimal(line.areaMm2 ?? 0), areaUnit),
    ...(changes ? [`to become ${becomesName}`] : []),
    price === null
      ? `at ${sayAreaPrice(line, { areaUnit, currency })}`
      : `at ${currency} ${price} for the lot`,
  ];
  return `- ${parts.join(', ')}`;
}
