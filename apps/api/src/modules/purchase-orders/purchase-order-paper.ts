import { countedWords, minorDigits, unitWord } from '@hidewright/domain';
import type { PurchasedService, PurchaseLine } from '@hidewright/contract';
import { dayIn } from '../../day-in.ts';
import type { PurchaseOrderPaper } from '../../papers/purchase-order-pdf.ts';
import type { Work } from '../../work.ts';

import { Workshop } from '../workshop/workshop.entity.ts';
import { areaPriceOf } from './area-price.ts';
import { sayOrderedArea } from './ordered-area.ts';
import type { PurchaseOrder } from './purchase-order.entity.ts';
import { readOnePurchaseOrder } from './read-purchase-orders.ts';
import { isUnpriced } from './unpriced.ts';

/** What goes on paper for an order as it is now; a draft as it would be if it were sent today. */
export async function paperOf(work: Work, order: PurchaseOrder): Promise<PurchaseOrderPaper> {
  const workshop = await work.em.findOneOrFail(Workshop, 1);
  const told = await readOnePurchaseOrder(work, order.id);
  return {
    number: order.number,
    shopName: workshop.name,
    shopAddress: workshop.address,
    supplierName: told.supplierName,
    day: order.sentAt === null ? work.today : dayIn(workshop.timeZone, new Date(order.sentAt)),
    expectedOn: told.arrivesOn ?? told.expectedOn,
    currency: workshop.currency,
    digits: minorDigits(workshop.currency),
    lines: told.lines.map((line) => printedLine(line, workshop.areaUnit)),
    onlyWork: told.lines.every(({ of }) => of === 'service'),
    total: told.total ?? '0.00',
    note: order.note,
  };
}

function printedLine(
  line: PurchaseLine,
  areaUnit: Workshop['areaUnit'],
): PurchaseOrderPaper['lines'][number] {
  const {
    name,
    articleNumber,
    areaMm2,
    quantity,
    unit,
    unitPrice = '0.00',
    amount = '0.00',
  } = line;
  return {
    name,
    articleNumber,
    quantity:
      areaMm2 === null
        ? countedWords(quantity ?? 0, unit ?? 'piece')
        : sayOrderedArea(line, areaUnit),
    ...(areaMm2 === null ? { unitPrice, per: perWord(unit) } : areaPriceOf(unitPrice, areaUnit)),
    amount,
    ...(isUnpriced(line) && { unitPrice: null }),
    ...(line.service !== null && workOf(line, line.service, areaUnit)),
  };
}

const perWord = (unit: PurchaseLine['unit']): string =>
  unit === null || unit === 'piece' ? 'each' : `per ${unitWord(unit)}`;

/** Work on a lot of the shop's own: what it becomes stands under its name. */
function workOf(
  { name, fixedPrice, unitPrice = '0.00' }: PurchaseLine,
  { changes, becomesName }: PurchasedService,
  areaUnit: Workshop['areaUnit'],
) {
  const fixed = fixedPrice ?? null;
  return {
    name: changes ? `${name}, to become ${becomesName}` : name,
    ...(fixed === null
      ? areaPriceOf(unitPrice, areaUnit)
      : { unitPrice: fixed, per: 'for the lot' }),
  };
}
