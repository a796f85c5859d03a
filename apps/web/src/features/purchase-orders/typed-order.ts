import { typedPurchaseLine, type addPurchaseOrder } from '@hidewright/contract';
import type { Lot, PurchaseLine, PurchaseOrder } from '@hidewright/contract';
import { mm2ToFootage, round, type HardwareUnit } from '@hidewright/domain';
import { Decimal } from 'decimal.js';
import type { z } from 'zod';
import { isFigure } from '../../lib/units.ts';

export type TypedOrder = z.input<NonNullable<typeof addPurchaseOrder.body>>;
export type TypedLine = TypedOrder['lines'][number];
export type TypedService = Extract<TypedLine, { of: 'service' }>;

/** Something that can be ordered, with the price it had last. */
export interface Goods {
  id: number;
  name: string;
  price: string | undefined;
  /** Of hardware: how many come in a pack. */
  packSize?: number;
  /** Of hardware: what one of it is. */
  unit?: HardwareUnit;
}

/** A lot of which something can go out to be worked on. */
export type FreeLot = Pick<Lot, 'id' | 'tag' | 'leatherId' | 'leatherName' | 'freeAreaMm2'>;

export const blankOrder: Partial<TypedOrder> = { expectedOn: null, note: '', lines: [] };

const empty = '' as unknown as number;

/** A line with its fields still to be filled in, or with something chosen already; its price follows from both. */
export function blankLine(of: 'leather' | 'hardware', goods?: Goods): TypedLine {
  const unitPrice = '';
  return of === 'leather'
    ? { of, leatherId: goods?.id ?? empty, areaMm2: '', unitPrice }
    : { of, hardwareId: goods?.id ?? empty, quantity: goods?.packSize ?? empty, unitPrice };
}

/** Work on a lot, with the work still to be said. */
export function blankService(lotId: number = empty): TypedService {
  return {
    of: 'service',
    service: '',
    lotId,
    areaMm2: null,
    becomesLeatherId: empty,
    unitPrice: null,
    fixedPrice: null,
  };
}

/** A draft as it would be typed. */
export function typedOf(order: PurchaseOrder): TypedOrder {
  const { supplierId, expectedOn, note, lines } = order;
  return { supplierId, expectedOn, note, lines: lines.map(typedLineOf) };
}

function typedLineOf(line: PurchaseLine): TypedLine {
  const { leatherId, hardwareId, areaMm2, quantity, service, unitPrice = '' } = line;
  if (service !== null) return typedServiceOf(line, service);
  return leatherId === null
    ? { of: 'hardware', hardwareId: hardwareId ?? 0, quantity: quantity ?? 0, unitPrice }
    : { of: 'leather', leatherId, areaMm2: areaMm2 ?? '0', unitPrice };
}

function typedServiceOf(
  { areaMm2, unitPrice, fixedPrice = null }: PurchaseLine,
  { word, lotId, becomesLeatherId }: NonNullable<PurchaseLine['service']>,
): TypedService {
  return {
    of: 'service',
    service: word,
    ...{ lotId, areaMm2, becomesLeatherId, fixedPrice },
    unitPrice: fixedPrice === null ? (unitPrice ?? null) : null,
  };
}

/**
 * What the lines that are filled in come to; of a lot without an area, all that is free goes out. Undefined while a
 * figure on one of them is wrong.
 */
export function amountOf(
  lines: readonly Partial<TypedLine>[],
  lots: readonly FreeLot[] = [],
): string | undefined {
  if (lines.some(hasWrongFigure)) return undefined;
  return Decimal.sum(0, ...lines.map((line) => lineAmount(line, lots))).toFixed(2);
}

const figures: readonly unknown[] = ['areaMm2', 'quantity', 'unitPrice', 'fixedPrice'];

/** Whether a figure is typed that cannot be sent like that; what is still open is not wrong. */
function hasWrongFigure(line: Partial<TypedLine>): boolean {
  const issues = typedPurchaseLine.safeParse(line).error?.issues ?? [];
  return issues.some(({ path: [field] }) => figures.includes(field) && isTyped(line, field));
}

const isTyped = (line: object, field: unknown): boolean =>
  String((line as Record<string, unknown>)[String(field)] ?? '').trim() !== '';

function lineAmount(line: Partial<TypedLine>, lots: readonly FreeLot[]): Decimal {
  const fixed = 'fixedPrice' in line ? (line.fixedPrice ?? '') : '';
  if (isFigure(fixed)) return new Decimal(fixed);
  const price = line.unitPrice ?? '';
  const count = countOf(line, lots);
  if (!isFigure(price) || !isFigure(count)) return new Decimal(0);
  const units = line.of === 'hardware' ? new Decimal(count) : mm2ToFootage(count);
  return round(units.times(price), 2);
}

function countOf(line: Partial<TypedLine>, lots: readonly FreeLot[]): string {
  if ('quantity' in line) return String(line.quantity);
  if ('areaMm2' in line && line.areaMm2) return line.areaMm2;
  if (!('lotId' in line)) return '';
  return lots.find(({ id }) => String(id) === String(line.lotId))?.freeAreaMm2 ?? '';
}
