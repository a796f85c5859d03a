import type { JobHardware } from '@hidewright/contract';
import type { StandInStock } from '@hidewright/domain';
import type { EntityManager } from '@mikro-orm/sqlite';
import { Hardware } from '../../modules/hardware/hardware.entity.ts';
import { readStandIns } from '../check/stand-ins-for-check.ts';
import { balancesByItem, nothingThere, type JobStock } from './ticket-stock.ts';

interface TicketHardware {
  hardware: JobHardware[];
  standIns: JobHardware[];
}

/** The hardware that the pattern asks for and whatever else was taken; and what may be taken in place of it. */
export async function ticketHardware(
  em: EntityManager,
  stock: JobStock,
  asked: readonly { hardwareId: number; quantity: number }[],
): Promise<TicketHardware> {
  const needed = new Map(asked.map(({ hardwareId, quantity }) => [hardwareId, quantity]));
  const standIns = await readStandIns(em, [...needed.keys()]);
  const also = stock.rows.flatMap(({ hardwareId }) => (hardwareId === null ? [] : [hardwareId]));
  const own = new Set([...needed.keys(), ...also]);
  const ids = [...new Set([...own, ...standIns.partIds])];
  const found = await em.find(Hardware, { id: { $in: ids } }, { orderBy: { name: 'asc' } });
  const balances = await balancesByItem(em, { hardwareId: { $in: ids } });
  const lines = found.filter(({ id }) => needed.has(id));
  const rows = found.map(({ id, name, unit }) => ({
    hardwareId: id,
    name,
    unit,
    needed: needed.get(id) ?? 0,
    held: stock.held({ hardwareId: id }),
    ...(balances.get(`hardware ${id}`) ?? nothingThere),
    taken: stock.taken({ hardwareId: id }),
    standsInFor: lines.flatMap((line) => inPlaceOf(line, { id, name }, standIns.of(line.id))),
  }));
  return {
    hardware: rows.filter(({ hardwareId }) => own.has(hardwareId)),
    standIns: rows.filter(({ hardwareId, free }) => !own.has(hardwareId) && free > 0),
  };
}

type Named = { id: number; name: string };

/** The line, if this is among what may be taken in its place. */
function inPlaceOf(
  line: Named,
  { id, name }: Named,
  standIns: readonly StandInStock[],
): JobHardware['standsInFor'] {
  const by = standIns.find(({ parts }) => parts.some(({ hardwareId }) => hardwareId === id));
  if (by === undefined) return [];
  return [{ name: line.name, inKit: by.name === name ? null : by.name }];
}
