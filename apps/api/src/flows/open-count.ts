import type { BodyOf, openCount as endpoint } from '@hidewright/contract';
import { invalid } from '../http/problem.ts';
import { logDeed } from '../modules/activity/activity-log.ts';
import { countedHardware } from '../modules/counts/counted-hardware.ts';
import { CountLine } from '../modules/counts/count-line.entity.ts';
import { StockCount } from '../modules/counts/stock-count.entity.ts';
import { Leather } from '../modules/leathers/leather.entity.ts';
import { keysOf, type StockItem } from '../modules/stock/stock-item.ts';
import type { Work } from '../work.ts';

type Asked = BodyOf<typeof endpoint>;

interface Shelf {
  title: string;
  place: string | null;
  leatherId: number | null;
  items: StockItem[];
  empty: { field: string; message: string };
}

/**
 * Opens a sheet with everything that lies there by the books, without saying how much of it.
 * @throws {Problem} 422 when nothing lies there
 */
export async function openCount(work: Work, asked: Asked): Promise<number> {
  const { title, place, leatherId, items, empty } = await shelfOf(work, asked);
  if (items.length === 0) throw invalid([empty]);
  const sheet = work.em.create(StockCount, {
    title,
    place,
    leatherId,
    state: 'open',
    openedAt: work.now.toISOString(),
    openedByName: work.actor.name,
  });
  await work.em.flush();
  for (const item of items) {
    work.em.create(CountLine, {
      ...keysOf(item),
      countId: sheet.id,
      added: false,
      unmeasured: false,
      again: false,
    });
  }
  await work.em.flush();
  await logDeed(work, {
    action: `opened the count sheet ${title}`,
    subjectKind: 'count',
    subjectId: sheet.id,
    detail: { lines: items.length },
  });
  return sheet.id;
}

async function shelfOf(work: Work, asked: Asked): Promise<Shelf> {
  if (asked.of === 'place') return placeShelf(work, asked.place);
  if (asked.of === 'leather') return leatherShelf(work, asked.leatherId);
  const kind = asked.of;
  return {
    title: kind === 'hardware' ? 'All hardware' : 'All supplies',
    place: null,
    leatherId: null,
    items: await hardwareWhere(work, 'h.kind = ?', kind),
    empty: { field: 'of', message: `There are no ${kind} yet. Add some first.` },
  };
}

/** Lots and hardware that lie there; hardware whose place nobody said is counted with all hardware. */
async function placeShelf(work: Work, place: string): Promise<Shelf> {
  return {
    title: place === '' ? 'Lots without a place' : place,
    place,
    leatherId: null,
    items: [
      ...(await lotsWhere(work, 'lot.place = ?', place)),
      ...(place === '' ? [] : await hardwareWhere(work, 'h.bin = ?', place)),
    ],
    empty: { field: 'place', message: 'Nothing lies there by the books. Choose another place.' },
  };
}

async function leatherShelf(work: Work, leatherId: number): Promise<Shelf> {
  const leather = await work.em.findOne(Leather, leatherId);
  if (leather === null)
    throw invalid([{ field: 'leatherId', message: 'Choose a leather from the list.' }]);
  return {
    title: leather.name,
    place: null,
    leatherId,
    items: await lotsWhere(work, 'lot.leather_id = ?', leatherId),
    empty: {
      field: 'leatherId',
      message: `No lot of ${leather.name} is on the rack by the books. Choose another leather.`,
    },
  };
}

async function lotsWhere(work: Work, sql: string, value: string | number): Promise<StockItem[]> {
  const rows = await work.em.execute<{ id: number }[]>(
    `SELECT lot.id FROM lot JOIN stock_balance b ON b.lot_id = lot.id
     WHERE b.on_hand > 0 AND ${sql} ORDER BY lot.tag`,
    [value],
  );
  return rows.map(({ id }) => ({ lotId: id }));
}

async function hardwareWhere(work: Work, sql: string, value: string): Promise<StockItem[]> {
  const rows = await work.em.execute<{ id: number }[]>(
    `SELECT h.id FROM ${countedHardware} AND ${sql} ORDER BY h.bin, h.name`,
    [value],
  );
  return rows.map(({ id }) => ({ hardwareId: id }));
}
