import type { HardwareLevel } from '@hidewright/contract';
import { unscaled } from '../../db/columns/scaled-decimal.ts';

type Standing = HardwareLevel['standing'];

/** What is held, free, on its way and promised of it. */
export interface Standings {
  /** In units. */
  ofHardware(id: number): Standing;
  /** In mm². */
  ofLeather(id: number): Standing;
}

/** As the ledger counts: units, or thousandths of mm². */
export interface StandingRow {
  id: number;
  reserved: number;
  free: number;
  on_order: number;
}

/** What open jobs need of it and do not have, as the ledger counts. */
export interface Promised {
  hardware: (id: number) => readonly { quantity: number }[];
  leather: (id: number) => readonly { quantity: number }[];
}

export function standingsOf(
  hardwareRows: readonly StandingRow[],
  leatherRows: readonly StandingRow[],
  promised: Promised,
): Standings {
  const [hardware, leathers] = [byId(hardwareRows), byId(leatherRows)];
  return {
    ofHardware: (id) => standingOf(hardware.get(id), promised.hardware(id), String),
    ofLeather: (id) =>
      standingOf(leathers.get(id), promised.leather(id), (kept) => unscaled(kept, 3).toFixed()),
  };
}

const byId = (rows: readonly StandingRow[]): Map<number, StandingRow> =>
  new Map(rows.map((row) => [row.id, row]));

function standingOf(
  row: StandingRow | undefined,
  promised: readonly { quantity: number }[],
  text: (kept: number) => string,
): Standing {
  return {
    reserved: text(row?.reserved ?? 0),
    free: text(row?.free ?? 0),
    onOrder: text(row?.on_order ?? 0),
    promised: text(promised.reduce((sum, { quantity }) => sum + quantity, 0)),
  };
}
