import type { Work } from '../../work.ts';
import { Receipt } from './receipt.entity.ts';

/** A delivery is another one also where only its lines changed, or what was said to it. */
export async function raiseVersion(
  work: Work,
  receipt: Receipt,
  readVersion: number,
): Promise<void> {
  await work.em.flush();
  if (receipt.version > readVersion) return;
  await work.em.nativeUpdate(Receipt, { id: receipt.id }, { sharedBy: receipt.sharedBy });
  await work.em.refresh(receipt);
}
