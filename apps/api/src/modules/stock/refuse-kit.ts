import type { EntityManager } from '@mikro-orm/sqlite';
import { invalid } from '../../http/problem.ts';
import { Hardware } from '../hardware/hardware.entity.ts';
import { KitPart } from '../hardware/kit-part.entity.ts';
import type { StockItem } from './stock-item.ts';

/**
 * A kit has no stock of its own: what moves are its parts.
 * @throws {Problem} 422 naming the parts
 */
export async function refuseKit(
  em: EntityManager,
  item: StockItem,
  field = 'hardwareId',
): Promise<void> {
  if (typeof item.hardwareId !== 'number') return;
  const parts = await em.find(KitPart, { kitId: item.hardwareId }, { orderBy: { id: 'asc' } });
  if (parts.length === 0) return;
  const ids = parts.map(({ hardwareId }) => hardwareId);
  const named = await em.find(Hardware, { id: { $in: [item.hardwareId, ...ids] } });
  const nameOf = (id: number) => named.find((each) => each.id === id)?.name ?? '';
  const message = `${nameOf(item.hardwareId)} is a kit and is counted by its parts: enter ${ids.map(nameOf).join(' and ')} instead.`;
  throw invalid([{ field, message }]);
}
