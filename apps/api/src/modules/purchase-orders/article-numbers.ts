import type { EntityManager } from '@mikro-orm/sqlite';
import { SupplierOffer } from '../supplier-offers/supplier-offer.entity.ts';
import type { PurchaseLine } from './purchase-line.entity.ts';
import type { PurchaseOrder } from './purchase-order.entity.ts';

/** What a supplier calls what is on a line; empty where nobody said. */
export type ArticleNumberOf = (supplierId: number, line: PurchaseLine) => string;

/** Reads what the orders' suppliers call what is on their lines. */
export async function readArticleNumbers(
  em: EntityManager,
  orders: readonly PurchaseOrder[],
  lines: readonly PurchaseLine[],
): Promise<ArticleNumberOf> {
  const offers = await em.find(SupplierOffer, {
    supplierId: orders.map(({ supplierId }) => supplierId),
    $or: [
      { leatherId: lines.flatMap(({ leatherId }) => leatherId ?? []) },
      { hardwareId: lines.flatMap(({ hardwareId }) => hardwareId ?? []) },
    ],
  });
  const numbers = new Map(
    offers.map((offer) => [keyOf(offer.supplierId, offer), offer.articleNumber]),
  );
  return (supplierId, line) => {
    // A service names the leather that it becomes, which nobody sells here.
    if (line.service !== null) return '';
    return numbers.get(keyOf(supplierId, line)) ?? '';
  };
}

const keyOf = (
  supplierId: number,
  { leatherId, hardwareId }: Pick<PurchaseLine, 'leatherId' | 'hardwareId'>,
): string => JSON.stringify([supplierId, leatherId, hardwareId]);
