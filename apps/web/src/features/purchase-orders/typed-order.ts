import type { addPurchaseOrder } from '@hidewright/contract';
import type { PurchaseLine, PurchaseOrder } from '@hidewright/contract';
import { mm2ToFootage, round } from '@hidewright/domain';
import { Decimal } from 'decimal.js';
import type { z } from 'zod';
import { isFigure } from '../../lib/units.ts';

export type TypedOrder = z.input<NonNullable<typeof addPurchaseOrder.body>>;
export type TypedLine = TypedOrder['lines'][number];

/** Something that can be ordered, with the price it had last. */
export interface Goods {
  id: number;
  name: string;
  price: string | undefined;
  /** Of hardware: how many come in a pack. */
  packSize?: number;
}

export const blankOrder: Partial<TypedOrder> = { expectedOn: null, note: '', lines: [] };

/** A line with its fields still to be filled in, or with something chosen already. */
export function blankLine(of: TypedLine['of'], goods?: Goods): TypedLine {
  const empty = '' as unknown as number;
  const unitPrice = goods?.price ?? '';
  return of === 'leather'
    ? { of, leatherId: goods?.id ?? empty, areaMm2: '', unitPrice }
    : { of, hardwareId: goods?.id ?? empty, quantity: goods?.packSize ?? empty, unitPrice };
}

/** A draft as it would be typed. */
export function typedOf(order: PurchaseOrder): TypedOrder {
  const { supplierId, expectedOn, note, lines } = order;
  return { supplierId, expectedOn, note, lines: lines.map(typedLineOf) };
}

function typedLineOf({
  leatherId,
  hardwareId,
  areaMm2,
  quantity,
  unitPrice = '',
}: PurchaseLine): TypedLine {
  return leatherId === null
    ? { of: 'hardware', hardwareId: hardwareId ?? 0, quantity: quantity ?? 0, unitPrice }
    : { of: 'leather', leatherId, areaMm2: areaMm2 ?? '0', unitPrice };
}

/** What the lines that are filled in come to. */
export function amountOf(lines: readonly Partial<TypedLine>[]): string {
  return Decimal.sum(0, ...lines.map(lineAmount)).toFixed(2);
}

function lineAmount(line: Partial<TypedLine>): Decimal {
  const price = line.unitPrice ?? '';
  const count = countOf(line);
  if (!isFigure(price) || !isFigure(count)) return new Decimal(0);
  const units = line.of === 'leather' ? mm2ToFootage(count) : new Decimal(count);
  return round(units.times(price), 2);
}

function countOf(line: Partial<TypedLine>): string {
  if ('areaMm2' in line) return line.areaMm2 ?? '';
  return 'quantity' in line ? String(line.quantity) : '';
}
