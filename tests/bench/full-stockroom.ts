import type { RawDatabase } from './raw-database.ts';
import type { Caller } from './caller.ts';

const full = { items: 5_000, lots: 20_000, movements: 500_000 };

/** A shop with five patterns that can be made: each of a leather and three kinds of hardware, all on hand. */
export async function furnish(call: Caller): Promise<number[]> {
  await call('POST', '/first-run', {
    workshopName: 'A full stockroom',
    ownerName: 'The owner',
    email: 'owner@example.com',
    password: 'a-long-password-for-benches',
  });
  const leather = await call<{ id: number }>('POST', '/leathers', {
    name: 'Oak tan',
    pricePerFt2: '9.50',
  });
  const hardwareIds: number[] = [];
  for (const name of ['Rivet', 'Ring', 'Snap'])
    hardwareIds.push(
      (await call<{ id: number }>('POST', '/hardware', { name, unitPrice: '0.20' })).id,
    );
  await call('POST', '/receipts', {
    lots: [{ leatherId: leather.id, form: 'side', measuredAreaMm2: '2043866.88', cost: '209.00' }],
    hardware: hardwareIds.map((hardwareId) => ({ hardwareId, quantity: 100_000 })),
  });
  const patternIds: number[] = [];
  for (let at = 1; at <= 5; at += 1) {
    const definition = tag(leather.id, hardwareIds);
    const pattern = { name: `Tag ${at}`, definition };
    patternIds.push((await call<{ id: number }>('POST', '/patterns', pattern)).id);
  }
  return patternIds;
}

const tag = (leatherId: number, hardwareIds: number[]) => ({
  layoutBy: 'hand count',
  outline: null,
  handCount: { pieces: 20, widthMm: '304.8', heightMm: '304.8' },
  container: null,
  turns: 'quarter turns',
  spacingMm: '2',
  trimMm: '3',
  leatherId,
  hardware: hardwareIds.map((hardwareId) => ({ hardwareId, perPiece: 1 })),
  work: { kind: 'minutesPer100', minutes: '60', rejectPercent: '5' },
  needsDie: false,
  needsPlate: false,
});

/** Fills the stockroom behind the program's back, so that its books still agree. */
export async function fill(database: RawDatabase): Promise<void> {
  const [lot] = await database.all('SELECT MAX(id) AS id FROM lot');
  const [item] = await database.all('SELECT MAX(id) AS id FROM hardware');
  const [leather] = await database.all('SELECT MAX(id) AS id FROM leather');
  const [lotId, itemId] = [Number(lot?.['id']), Number(item?.['id'])];
  const leathers = 40;
  await database.all('BEGIN');
  await database.multiply('leather', Number(leather?.['id']), leathers, {
    name: `'Leather ' || n`,
  });
  await database.multiply('lot', lotId, full.lots, {
    tag: `'F-' || n`,
    leather_id: `${leather?.['id']} + n % ${leathers + 1}`,
    place: `'rack ' || (n % 60)`,
  });
  await database.multiply('hardware', itemId, full.items, { name: `'Item ' || n` });
  await balance(database, 'lot', { id: lotId, count: full.lots, moves: 5 });
  await balance(database, 'hardware', { id: itemId, count: full.items, moves: 80 });
  await database.all('COMMIT');
  await database.all('ANALYZE');
}

/** What came, and what went of it in even parts: a tenth of it is left. */
async function balance(
  database: RawDatabase,
  kind: 'lot' | 'hardware',
  { id, count, moves }: { id: number; count: number; moves: number },
): Promise<void> {
  const column = `${kind}_id`;
  const like = async (table: string) =>
    (
      await database.all(`SELECT id, ${table === 'stock_balance' ? 'on_hand' : 'quantity'} AS much
      FROM ${table} WHERE ${column} = ${id} LIMIT 1`)
    )[0];
  const came = await like('stock_movement');
  const kept = await like('stock_balance');
  const goes = moves - 1;
  const part = Math.floor((Number(came?.['much']) * 0.9) / goes);
  const items = { [column]: `${id} + n` };
  await database.multiply('stock_movement', Number(came?.['id']), count, items);
  await database.multiply('stock_movement', Number(came?.['id']), count * goes, {
    [column]: `${id} + 1 + (n - 1) % ${count}`,
    kind: `'take'`,
    quantity: String(-part),
    value: 'CAST(-t.value * 0.9 / ' + goes + ' AS INTEGER)',
  });
  await database.multiply('stock_balance', Number(kept?.['id']), count, {
    ...items,
    on_hand: `t.on_hand - ${part * goes}`,
  });
}
