/** What the ledger counts: one lot, in thousandths of mm², or one hardware (or supply), in pieces. */
export type StockItem =
  | { readonly lotId: number; readonly hardwareId?: null }
  | { readonly hardwareId: number; readonly lotId?: null };

/** An item as the ledger's tables name it: one of the two columns, the other empty. */
interface ItemKeys {
  lotId: number | null;
  hardwareId: number | null;
}

export function keysOf(item: StockItem): ItemKeys {
  return { lotId: item.lotId ?? null, hardwareId: item.hardwareId ?? null };
}

/** The item that a movement, a balance or a reservation is about. */
export function itemOf(row: ItemKeys): StockItem {
  if (row.lotId !== null) return { lotId: row.lotId };
  if (row.hardwareId !== null) return { hardwareId: row.hardwareId };
  throw new TypeError('A row of the stock ledger names neither a lot nor hardware');
}
