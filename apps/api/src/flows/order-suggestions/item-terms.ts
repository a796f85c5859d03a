import type { SupplierOfferReply } from '@hidewright/contract';
import { Exact, type OfferTerms, usualOffer } from '@hidewright/domain';
import type { Supplier } from '../../modules/suppliers/supplier.entity.ts';
import { unscaled } from '../../db/columns/scaled-decimal.ts';
import type { ItemRow } from './ordered-items.ts';

/** What the terms of a thing follow from, where nobody made an offer. */
export type BoughtRow = Pick<
  ItemRow,
  'of' | 'id' | 'price' | 'pack_size' | 'supplier_id' | 'whole_area'
>;

/** Who a thing is ordered from, and as they sell it. */
export interface ItemTerms {
  supplier: Supplier | null;
  leadDays: number;
  terms: OfferTerms;
}

/**
 * By its usual offer; without one, the thing's own price and pack, and whole sides where that is how a leather is bought.
 */
export function itemTerms(
  row: BoughtRow,
  offers: readonly SupplierOfferReply[],
  suppliers: ReadonlyMap<number, Supplier>,
): ItemTerms {
  const offer = usualOffer(offers, row.supplier_id);
  const supplier = suppliers.get(offer?.supplierId ?? row.supplier_id ?? 0) ?? null;
  const leadDays = offer?.usualLeadDays ?? supplier?.leadDays ?? 0;
  return { supplier, leadDays, terms: offer === undefined ? ownTerms(row) : offered(row, offer) };
}

function ownTerms(row: BoughtRow): OfferTerms {
  const price = unscaled(row.price, 4).toFixed();
  return { minimum: null, multiple: packOf(row), breaks: [{ from: '0', price }] };
}

function offered(
  row: BoughtRow,
  { minimum, multiple, breaks = [] }: SupplierOfferReply,
): OfferTerms {
  const pack = multiple ?? (row.of === 'leather' ? packOf(row) : '1');
  return { minimum: minimum === null ? null : inPacks(minimum, pack), multiple: pack, breaks };
}

/** Leather that is not bought whole comes in any area, to a mm². */
function packOf(row: BoughtRow): string {
  if (row.of === 'hardware') return String(row.pack_size);
  return row.whole_area === null ? '1' : unscaled(row.whole_area, 3).toFixed();
}

const inPacks = (minimum: string, pack: string): string =>
  new Exact(minimum).div(pack).ceil().times(pack).toFixed();
