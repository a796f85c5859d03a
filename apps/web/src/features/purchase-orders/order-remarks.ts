import type { PurchaseOrder, SupplierOfferReply } from '@hidewright/contract';
import type { Workshop } from '../../lib/workshop.tsx';
import { termsOf, termsText } from './line-terms.ts';

interface LineRemark {
  lineId: number;
  name: string;
  text: string;
}

/** What the supplier's offers say to the lines of an order, for whoever is about to send it. */
export function orderRemarks(
  { lines }: Pick<PurchaseOrder, 'lines'>,
  offers: readonly SupplierOfferReply[],
  habit: Pick<Workshop, 'areaUnit'>,
): LineRemark[] {
  return lines.flatMap(
    ({ id, name, of, leatherId, hardwareId, areaMm2, quantity, unitPrice = '' }) => {
      if (of === 'service') return [];
      const terms = termsOf(offers, of, leatherId ?? hardwareId);
      const text = terms && termsText(terms, areaMm2 ?? quantity, unitPrice, habit);
      return text ? [{ lineId: id, name, text }] : [];
    },
  );
}
