import type { RunsCheck, ShortForRuns } from '@hidewright/contract';
import {
  comingWeeks,
  usableOf,
  type Sourcing,
  type Change,
  type ComingWeeks,
  type Dated,
  type ItemStock,
  type LeatherStock,
  type Standing,
} from '@hidewright/domain';
import type { EntityManager } from '@mikro-orm/sqlite';
import { unscaled } from '../../db/columns/scaled-decimal.ts';
import type { Work } from '../../work.ts';
import type { CheckedRun, CheckedRuns } from './checked-runs.ts';
import { lackingOf } from './lacking.ts';

/** Everything that is short for one of the runs, with how it goes on in the coming weeks. */
export async function shortOf(work: Work, checked: CheckedRuns): Promise<RunsCheck['short']> {
  const { shop, owed, runs } = checked;
  const leathers = shop.leathers.flatMap((leather) => {
    const asked = runs.flatMap((run) =>
      run.facts.leather.leather.leatherId === leather.leatherId
        ? [{ run, standing: run.facts.leather.standing }]
        : [],
    );
    return isShort(asked) ? [{ leather, asked }] : [];
  });
  const items = shop.items.flatMap((item) => {
    const asked = runs.flatMap((run) =>
      run.facts.items.flatMap((facts) =>
        facts.item.hardwareId === item.hardwareId ? [{ run, standing: facts }] : [],
      ),
    );
    return isShort(asked) ? [{ item, asked }] : [];
  });
  if (leathers.length === 0 && items.length === 0) return [];
  const onHand = await readOnHand(work.em, {
    leatherIds: leathers.map(({ leather }) => leather.leatherId),
    hardwareIds: items.map(({ item }) => item.hardwareId),
  });
  const lacking = lackingOf(checked);
  const toOrder = (of: 'leather' | 'hardware', id: number) =>
    lacking.find((each) => each.of === of && each.id === id)?.toBuy?.quantity ?? '0';
  return [
    ...leathers.map(({ leather, asked }) =>
      leatherShort(leather, {
        asked,
        owed: owed.leather(leather.leatherId),
        today: shop.today,
        counted: onHand(`leather ${leather.leatherId}`),
        toOrder: toOrder('leather', leather.leatherId),
      }),
    ),
    ...items.map(({ item, asked }) =>
      itemShort(item, {
        asked,
        owed: item.pool.promised,
        today: shop.today,
        counted: onHand(`hardware ${item.hardwareId}`),
        toOrder: toOrder('hardware', item.hardwareId),
      }),
    ),
  ];
}

interface AskedOf {
  run: CheckedRun;
  standing: Standing;
}

const isShort = (asked: readonly AskedOf[]): boolean =>
  asked.some(({ standing }) => standing.short > 0);

interface Counted {
  onHand: number;
  reserved: number;
}

interface Around {
  asked: readonly AskedOf[];
  owed: readonly Dated[];
  today: string;
  counted: Counted;
  toOrder: string;
}

function leatherShort(leather: LeatherStock, around: Around): ShortForRuns {
  const usable = usableOf(leather.lots);
  const inPanels = Math.min(usable, takenOf(around.asked) + leather.owed);
  const { reserved } = around.counted;
  const text = (quantity: number) => unscaled(quantity, 3).toFixed();
  const { leatherId, name } = leather;
  return describe(
    { of: 'leather', id: leatherId, name, unit: 'mm2', ends: text(usable - inPanels) },
    { ...around, counted: { onHand: inPanels + reserved, reserved } },
    { ...leather, fromCustomer: false, text },
  );
}

/** What the runs are given from the lots; where they are short, no whole panel is left beside it. */
const takenOf = (asked: readonly AskedOf[]): number =>
  asked.flatMap(({ run }) => run.facts.leather.takes).reduce((sum, { area }) => sum + area, 0);

const itemShort = (item: ItemStock, around: Around): ShortForRuns =>
  describe(
    { of: 'hardware', id: item.hardwareId, name: item.name, unit: 'piece', ends: null },
    around,
    { ...item, fromCustomer: item.fromCustomer ?? false, text: String },
  );

function describe(
  head: Pick<ShortForRuns, 'of' | 'id' | 'name' | 'unit' | 'ends'>,
  around: Around,
  stock: {
    pool: ItemStock['pool'];
    buying: Sourcing;
    fromCustomer: boolean;
    text: (quantity: number) => string;
  },
): ShortForRuns {
  const { asked, counted } = around;
  const { pool, buying, fromCustomer, text } = stock;
  const { days, runsOutOn } = weeksOf(pool.receipts, around);
  const sum = (part: 'needed' | 'buy' | 'drafted') =>
    text(asked.reduce((total, { standing }) => total + standing[part], 0));
  return {
    ...head,
    onHand: text(counted.onHand),
    reserved: text(counted.reserved),
    onOrder: text(pool.receipts.reduce((total, { quantity }) => total + quantity, 0)),
    needed: sum('needed'),
    buy: sum('buy'),
    drafted: sum('drafted'),
    toOrder: fromCustomer ? '0' : around.toOrder,
    drafts: [...buying.drafts],
    supplierName: buying.supplier,
    fromCustomer,
    arrivesOn: buying.arrivesOn,
    days: days.map(({ day, comes, goes, left, what }) => ({
      ...{ day, what },
      ...{ comes: text(comes), goes: text(goes), left: text(left) },
    })),
    runsOutOn,
  };
}

function weeksOf(receipts: readonly Dated[], { asked, owed, today, counted }: Around): ComingWeeks {
  const changes: Change[] = [
    ...receipts.map(({ day, quantity, paper = '' }) => ({ day, quantity, what: paper })),
    ...owed.map(({ day, quantity, paper = '' }) => ({ day, quantity: -quantity, what: paper })),
    ...asked.map(({ run, standing }) => ({
      day: run.facts.startBy,
      quantity: -standing.needed,
      what: run.planned.name,
    })),
  ];
  return comingWeeks(Math.max(0, counted.onHand - counted.reserved), changes, today);
}

async function readOnHand(
  em: EntityManager,
  { leatherIds, hardwareIds }: { leatherIds: number[]; hardwareIds: number[] },
): Promise<(key: string) => Counted> {
  const rows = await em.execute<{ key: string; on_hand: number; reserved: number }[]>(
    `SELECT 'hardware ' || hardware_id AS key, on_hand, reserved FROM stock_balance
      WHERE hardware_id IN (SELECT value FROM json_each(?))
    UNION ALL SELECT 'leather ' || l.leather_id, SUM(b.on_hand), SUM(b.reserved)
      FROM lot l JOIN stock_balance b ON b.lot_id = l.id
      WHERE l.leather_id IN (SELECT value FROM json_each(?)) GROUP BY l.leather_id`,
    [JSON.stringify(hardwareIds), JSON.stringify(leatherIds)],
  );
  return (key) => {
    const row = rows.find((each) => each.key === key);
    return { onHand: row?.on_hand ?? 0, reserved: row?.reserved ?? 0 };
  };
}
