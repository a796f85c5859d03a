import type { BodyOf, changeHardware } from '@hidewright/contract';
import type { EntityManager } from '@mikro-orm/sqlite';
import { invalid } from '../../http/problem.ts';
import type { Work } from '../../work.ts';
import { Hardware } from './hardware.entity.ts';
import { StandIn } from './stand-in.entity.ts';

type Typed = NonNullable<BodyOf<typeof changeHardware>['standIns']>;

/**
 * Keeps what may be taken in place of a hardware. What stood in both ways and is not named any more stands in no way.
 * @throws {Problem} 422 naming the line
 */
export async function saveStandIns({ em }: Work, of: Hardware, typed: Typed): Promise<void> {
  for (const [at, each] of typed.entries()) await requireOther(em, of, typed, each, at);
  const before = await em.find(StandIn, { hardwareId: of.id });
  const touched = [...before.map((row) => row.byHardwareId), ...typed.map((row) => row.hardwareId)];
  await em.nativeDelete(StandIn, { hardwareId: of.id });
  await em.nativeDelete(StandIn, { hardwareId: { $in: touched }, byHardwareId: of.id });
  for (const { hardwareId, bothWays } of typed) {
    em.create(StandIn, { hardwareId: of.id, byHardwareId: hardwareId });
    if (bothWays) em.create(StandIn, { hardwareId, byHardwareId: of.id });
  }
  await em.flush();
}

async function requireOther(
  em: EntityManager,
  of: Hardware,
  typed: Typed,
  { hardwareId }: Typed[number],
  at: number,
): Promise<void> {
  const wrong = (message: string) => invalid([{ field: `standIns.${at}.hardwareId`, message }]);
  if ((await em.findOne(Hardware, hardwareId)) === null) throw wrong('Choose one from the list.');
  if (hardwareId === of.id) throw wrong('It cannot stand in for itself. Choose another.');
  if (typed.findIndex((each) => each.hardwareId === hardwareId) !== at)
    throw wrong('This one is listed already.');
}
