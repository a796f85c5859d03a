import type { EntityManager } from '@mikro-orm/sqlite';
import { notFound } from '../../http/problem.ts';
import { Order } from './order.entity.ts';

/** @throws {Problem} 404 */
export async function findOrder(em: EntityManager, id: number): Promise<Order> {
  const order = await em.findOne(Order, id);
  if (order === null) throw notFound('order');
  return order;
}
