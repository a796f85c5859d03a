import type { EntityManager } from '@mikro-orm/sqlite';

/** The state of every order, job and sheet, and how far the books and the log have come. */
export interface StockStand {
  states: Map<string, string>;
  lastDeed: number;
  lastMovement: number;
  held: number;
  /** How much of each thing is held for jobs. */
  heldOf: Map<string, number>;
}

const stateful = [
  ['purchase order', 'purchase_order'],
  ['job', 'job'],
  ['order', 'customer_order'],
  ['count', 'stock_count'],
] as const;

export async function readStand(em: EntityManager): Promise<StockStand> {
  const states = new Map<string, string>();
  for (const [kind, table] of stateful) {
    const rows = await em.execute<{ id: number; state: string }[]>(
      `SELECT id, state FROM ${table}`,
    );
    for (const { id, state } of rows) states.set(`${kind} ${id}`, state);
  }
  const [row] = await em.execute<[Omit<StockStand, 'states' | 'heldOf'>]>(
    `SELECT (SELECT COALESCE(MAX(seq), 0) FROM activity) AS lastDeed,
       (SELECT COALESCE(MAX(id), 0) FROM stock_movement) AS lastMovement,
       (SELECT COALESCE(SUM(reserved), 0) FROM stock_balance) AS held`,
  );
  const balances = await em.execute<BalanceRow[]>(readBalances);
  return {
    ...row,
    states,
    heldOf: new Map(balances.map(({ item, reserved }) => [item, reserved])),
  };
}

interface BalanceRow {
  item: string;
  reserved: number;
  on_hand: number;
}

const readBalances = `SELECT COALESCE('lot ' || lot_id, 'hardware ' || hardware_id) AS item, reserved, on_hand FROM stock_balance`;

/**
 * Of what more is held than there is: a count must have said so, and nothing more of it may be held while it is so.
 * What is enough again is taken out of `broken`, so that the next shortage needs a count of its own. [I2]
 */
export async function shortFaults(
  em: EntityManager,
  broken: Set<string>,
  before: StockStand,
): Promise<string[]> {
  const faults: string[] = [];
  for (const { item, reserved, on_hand } of await em.execute<BalanceRow[]>(readBalances)) {
    if (on_hand < 0) faults.push(`I2: less than nothing of ${item} is there`);
    if (reserved <= on_hand) {
      broken.delete(item);
      continue;
    }
    if (!broken.has(item))
      faults.push(`I2: more of ${item} is held than there is, and no count said so`);
    if (reserved > (before.heldOf.get(item) ?? 0))
      faults.push(`I2: still more of ${item} is held, although there is too little`);
  }
  return faults;
}

/** What does not hold in the stockroom's tables, each as a sentence: [I1] and [I9]. */
export async function faultsOf(em: EntityManager): Promise<string[]> {
  const faults: string[] = [];
  const unequal = await em.execute<{ fault: string }[]>(
    `SELECT 'I1: item ' || COALESCE(b.lot_id, b.hardware_id) || ' has ' || b.on_hand || ', moved ' || COALESCE(m.moved, 0) AS fault
     FROM stock_balance b LEFT JOIN (SELECT lot_id, hardware_id, SUM(quantity) AS moved FROM stock_movement
       GROUP BY lot_id, hardware_id) m ON m.lot_id IS b.lot_id AND m.hardware_id IS b.hardware_id
     WHERE COALESCE(m.moved, 0) <> b.on_hand
     UNION ALL
     SELECT 'I1: item ' || COALESCE(b.lot_id, b.hardware_id) || ' has ' || b.reserved || ' held, jobs hold ' || COALESCE(r.held, 0)
     FROM stock_balance b LEFT JOIN (SELECT lot_id, hardware_id, SUM(open) AS held FROM reservation
       GROUP BY lot_id, hardware_id) r ON r.lot_id IS b.lot_id AND r.hardware_id IS b.hardware_id
     WHERE COALESCE(r.held, 0) <> b.reserved
     UNION ALL
     SELECT 'I1: line ' || l.id || ' has ' || COALESCE(-m.moved, 0) || ' out' FROM purchase_line l
     JOIN purchase_order p ON p.id = l.purchase_order_id
     LEFT JOIN (SELECT purchase_line_id, SUM(quantity) AS moved FROM stock_movement GROUP BY 1) m ON m.purchase_line_id = l.id
     WHERE l.service IS NOT NULL AND COALESCE(-m.moved, 0) <>
       CASE WHEN l.received > 0 OR p.state = 'sent' THEN l.quantity ELSE 0 END`,
  );
  faults.push(...unequal.map(({ fault }) => fault));
  const held = await em.execute<{ fault: string }[]>(
    `SELECT 'I1: reservation ' || r.id || ' holds ' || r.open || ', its rows ' || COALESCE(SUM(m.quantity), 0) AS fault
     FROM reservation r LEFT JOIN reservation_movement m ON m.reservation_id = r.id
     GROUP BY r.id HAVING COALESCE(SUM(m.quantity), 0) <> r.open`,
  );
  faults.push(...held.map(({ fault }) => fault));
  const astray = await em.execute<unknown[]>('PRAGMA foreign_key_check');
  if (astray.length > 0) faults.push(`I9: ${JSON.stringify(astray)}`);
  const [sound] = await em.execute<[{ integrity_check: string }]>('PRAGMA integrity_check');
  if (sound.integrity_check !== 'ok') faults.push(`I9: ${sound.integrity_check}`);
  return faults;
}

/** What lies on the way where one press does two things: a ticket that is finished at once was begun as well, and what is new
 * and sent was drafted. */
const onTheWay: Record<string, string> = {
  'ready finished': 'at the bench',
  'taken on packed': 'in work',
  'undefined sent': 'draft',
};

/** Changes of state without exactly one row of the log each, by whoever did it: [I8]. */
export async function unloggedChanges(
  em: EntityManager,
  before: StockStand,
  after: StockStand,
  actorName: string,
): Promise<string[]> {
  const rows = await em.execute<{ subject: string; actor: string }[]>(
    `SELECT subject_kind || ' ' || subject_id AS subject, actor_name AS actor FROM activity WHERE seq > ?`,
    [before.lastDeed],
  );
  return [...after.states].flatMap(([thing, state]) => {
    const from = before.states.get(thing);
    if (from === state) return [];
    const changes = onTheWay[`${from} ${state}`] === undefined ? 1 : 2;
    const told = rows.filter(({ subject }) => subject === thing);
    const rightly = told.length === changes && told.every(({ actor }) => actor === actorName);
    return rightly ? [] : [`I8: ${thing} became ${state}, logged ${told.length} times`];
  });
}
