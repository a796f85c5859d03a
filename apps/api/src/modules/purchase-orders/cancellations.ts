import type { PurchaseOrder as OrderReply } from '@hidewright/contract';
import type { EntityManager } from '@mikro-orm/sqlite';
import type { PurchaseOrder } from './purchase-order.entity.ts';

type Cancellation = NonNullable<OrderReply['cancellation']>;

/** By the order's id. */
export type Cancellations = ReadonlyMap<number, Cancellation>;

/** Why, by whom and when those of the orders that are cancelled were, as the log has it. */
export async function readCancellations(
  em: EntityManager,
  orders: readonly PurchaseOrder[],
): Promise<Cancellations> {
  const ids = orders.filter(({ state }) => state === 'cancelled').map(({ id }) => id);
  const rows = await em.execute<({ id: number } & Cancellation)[]>(
    `SELECT subject_id AS id, at, actor_name AS "by", json_extract(detail, '$.reason') AS why FROM activity
     WHERE subject_kind = 'purchase order' AND subject_id IN (SELECT value FROM json_each(?))
       AND json_extract(detail, '$.to') = 'cancelled'`,
    [JSON.stringify(ids)],
  );
  return new Map(rows.map(({ id, ...cancellation }) => [id, cancellation]));
}
