import { Decimal } from 'decimal.js';
import { scaled } from '../db/columns/scaled-decimal.ts';
import type { StockItem } from '../modules/stock/stock-item.ts';

/** So much leather of a lot, or so many of a kind of hardware, as a request names it. */
export type AskedAmount =
  { lotId: number; areaMm2: string } | { hardwareId: number; quantity: number };

/** The same as the ledger counts it. */
export const ledgerAmount = (asked: AskedAmount): StockItem & { quantity: number } =>
  'lotId' in asked
    ? { lotId: asked.lotId, quantity: scaled(new Decimal(asked.areaMm2), 3) }
    : { hardwareId: asked.hardwareId, quantity: asked.quantity };
