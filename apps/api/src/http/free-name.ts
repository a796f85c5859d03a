import type { EntityClass } from '@mikro-orm/core';
import type { EntityManager } from '@mikro-orm/sqlite';
import { invalid } from './problem.ts';

/**
 * Refuses a name that another one has, beside its field.
 * @param id the thing that is being changed, which may keep its own name
 * @throws {Problem} 422
 */
export async function requireFreeName<T extends { id: number; name: string }>(
  em: EntityManager,
  entity: EntityClass<T>,
  name: string,
  id?: number,
): Promise<void> {
  const named = (await em.find<{ id: number; name: string }>(entity, { name }))[0];
  if (named === undefined || named.id === id) return;
  throw invalid([
    { field: 'name', message: `There is one named ${name} already. Choose another name.` },
  ]);
}
