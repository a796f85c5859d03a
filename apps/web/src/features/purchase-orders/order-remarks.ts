import type { PurchaseOrder, SupplierOfferReply } from '@hidewright/contract';
import type { Workshop } from '../../lib/workshop.tsx';
import { lineText, termsOf } from './line-terms.ts';

interface LineRemark {
  lineId: number;
  name: string;
  text: string;
}

/** What is to be said of the lines of an order, for whoever is about to send it. */
export function orderRemarks(
  { lines }: Pick<PurchaseOrder, 'lines'>,
  offers: readonly SupplierOfferReply[],
  habit: Pick<Workshop, 'areaUnit'>,
): LineRemark[] {
  return lines.flatMap(
    ({ id, name, of, leatherId, hardwareId, areaMm2, quantity, unitPrice = '' }) => {
      if (of === 'service') return [];
      const terms = termsOf(offers, of, leatherId ?? hardwareId);
      const text = lineText(terms, { much: areaMm2 ?? quantity, price: unitPrice }, habit);
      return text ? [{ lineId: id, name, text }] : [];
    },
  );
}
