import type { Context } from '../context.ts';
import type { KeptFile } from '../modules/files/stored-files.ts';
import { findPurchaseOrder } from '../modules/purchase-orders/draft-purchase-order.ts';
import { paperOf } from '../modules/purchase-orders/purchase-order-paper.ts';
import { reading, type Actor } from '../work.ts';

/** An order's paper, drawn and kept, with the version of the order and the day that it shows. */
export interface PurchaseOrderOnPaper {
  version: number;
  expectedOn: string | null;
  file: KeptFile;
}

/**
 * Draws an order to a supplier as it is now and keeps the file: before the transaction that sends it.
 * @throws {Problem} 404
 */
export async function putPurchaseOrderOnPaper(
  context: Context,
  actor: Actor,
  id: number,
): Promise<PurchaseOrderOnPaper> {
  const { version, paper } = await reading(context, actor, async (work) => {
    const order = await findPurchaseOrder(work, id);
    return { version: order.version, paper: await paperOf(work, order) };
  });
  const bytes = await context.papers.purchaseOrder(paper);
  const hash = await context.files.keep(bytes);
  const name = `${paper.number}.pdf`;
  const file = { hash, name, type: 'application/pdf' as const, size: bytes.byteLength };
  return { version, expectedOn: paper.expectedOn, file };
}
