import type { PurchaseLineTyped } from '@hidewright/contract';
import { leatherToBuy, packsToBuy, type Sourcing, type Standing } from '@hidewright/domain';
import { priceText } from '../http/decimal-text.ts';
import { Hardware } from '../modules/hardware/hardware.entity.ts';
import { Leather } from '../modules/leathers/leather.entity.ts';
import { draftPurchaseOrder } from '../modules/purchase-orders/draft-purchase-order.ts';
import type { PurchaseOrder } from '../modules/purchase-orders/purchase-order.entity.ts';
import { sayDay } from '../modules/quotes/say-day.ts';
import type { Work } from '../work.ts';
import type { CheckedRun, CheckedRuns } from './check/checked-runs.ts';

export interface Drafted {
  orders: PurchaseOrder[];
  notes: string[];
}

/** One thing to buy, for one or several of the runs. */
interface ToBuy {
  line: PurchaseLineTyped;
  supplierId: number;
  arrivesOn: string | null;
  runs: CheckedRun[];
}

/** What is lacking of one thing over all runs. */
interface Lacking {
  name: string;
  buying: Sourcing;
  /** Beyond what is drafted already. */
  missing: number;
  drafted: number;
  runs: CheckedRun[];
}

/**
 * Drafts an order to each supplier with what is short and on no draft yet, in full packs and whole sides, with the
 * runs that it is for in its note. Pressed again, it drafts nothing more, and says where it is.
 */
export async function draftWhatIsShort(work: Work, { shop, runs }: CheckedRuns): Promise<Drafted> {
  const leathers = shop.leathers.map((leather) => ({
    leather,
    ...lackingOf(
      leather.name,
      leather.buying,
      standings(runs, ({ facts }) =>
        facts.leather.leather.leatherId === leather.leatherId ? [facts.leather.standing] : [],
      ),
    ),
  }));
  const items = shop.items.map((item) => ({
    item,
    ...lackingOf(
      item.name,
      item.buying,
      standings(runs, ({ facts }) =>
        facts.items.filter((each) => each.item.hardwareId === item.hardwareId),
      ),
    ),
  }));
  const lines: ToBuy[] = [];
  for (const { leather, ...lacking } of leathers.filter(isToBuy)) {
    const { areaMm2 } = leatherToBuy(leather, lacking.missing);
    lines.push(await leatherLine(work, leather.leatherId, areaMm2, lacking));
  }
  for (const { item, ...lacking } of items.filter(isToBuy)) {
    const { pieces } = packsToBuy(item.packSize, lacking.missing);
    lines.push(await hardwareLine(work, item.hardwareId, pieces, lacking));
  }
  return {
    orders: await draftEach(work, lines),
    notes: [...[...leathers, ...items].flatMap(notesOn), ...customersBring(runs)],
  };
}

type Standings = { run: CheckedRun; standing: Standing }[];

const standings = (
  runs: readonly CheckedRun[],
  of: (run: CheckedRun) => readonly Standing[],
): Standings => runs.flatMap((run) => of(run).map((standing) => ({ run, standing })));

function lackingOf(name: string, buying: Sourcing, all: Standings): Lacking {
  const short = all.filter(({ standing }) => standing.buy > 0);
  const sum = (part: 'buy' | 'drafted') =>
    short.reduce((total, { standing }) => total + standing[part], 0);
  return {
    name,
    buying,
    missing: sum('buy') - sum('drafted'),
    drafted: sum('drafted'),
    runs: [...new Set(short.map(({ run }) => run))],
  };
}

const isToBuy = ({ missing, buying }: Lacking): boolean => missing > 0 && buying.supplier !== null;

/** What is the customer's is on no draft: they are asked for it. */
function customersBring(runs: readonly CheckedRun[]): string[] {
  const theirs = runs.flatMap(({ facts }) =>
    facts.items.flatMap(({ item, short }) => (item.fromCustomer && short > 0 ? [item.name] : [])),
  );
  return [...new Set(theirs)].map((name) => `${name} comes from the customer: ask for it.`);
}

function notesOn({ name, buying, missing, drafted }: Lacking): string[] {
  const drafts = buying.drafts.join(' and ');
  return [
    ...(drafted > 0
      ? [`${missing > 0 ? `A part of the ${name}` : name} is on draft ${drafts} already: send it.`]
      : []),
    ...(missing > 0 && buying.supplier === null
      ? [`${name} has no supplier. Say who sells it, then draft again.`]
      : []),
  ];
}

async function leatherLine(
  { em }: Work,
  leatherId: number,
  areaMm2: string,
  { runs, buying }: Lacking,
): Promise<ToBuy> {
  const { pricePerFt2, supplierId } = await em.findOneOrFail(Leather, leatherId);
  const unitPrice = priceText(pricePerFt2);
  return {
    line: { of: 'leather', leatherId, areaMm2, unitPrice },
    supplierId: supplierId as number,
    arrivesOn: buying.arrivesOn,
    runs,
  };
}

async function hardwareLine(
  { em }: Work,
  hardwareId: number,
  quantity: number,
  { runs, buying }: Lacking,
): Promise<ToBuy> {
  const { unitPrice, supplierId } = await em.findOneOrFail(Hardware, hardwareId);
  return {
    line: { of: 'hardware', hardwareId, quantity, unitPrice: priceText(unitPrice) },
    supplierId: supplierId as number,
    arrivesOn: buying.arrivesOn,
    runs,
  };
}

async function draftEach(work: Work, all: readonly ToBuy[]): Promise<PurchaseOrder[]> {
  const orders: PurchaseOrder[] = [];
  for (const supplierId of new Set(all.map((each) => each.supplierId))) {
    const own = all.filter((each) => each.supplierId === supplierId);
    orders.push(
      await draftPurchaseOrder(work, {
        supplierId,
        expectedOn: own[0]?.arrivesOn ?? null,
        note: noteFor([...new Set(own.flatMap(({ runs }) => runs))]),
        lines: own.map(({ line }) => line),
      }),
    );
  }
  return orders;
}

/** The supplier reads it too: no customer and no design in it. */
function noteFor(runs: readonly CheckedRun[]): string {
  const said = runs.map(({ planned }) => `${planned.paper}, packed by ${sayDay(planned.by)}`);
  return `For ${said.join('; ')}.`.slice(0, 2000);
}
