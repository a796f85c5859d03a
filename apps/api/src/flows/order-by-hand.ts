import type { BodyOf, orderByHand as endpoint } from '@hidewright/contract';
import { Decimal } from 'decimal.js';
import { requireVersion } from '../http/conditions.ts';
import { invalid, notFound } from '../http/problem.ts';
import { logDeed } from '../modules/activity/activity-log.ts';
import { Hardware } from '../modules/hardware/hardware.entity.ts';
import { Leather } from '../modules/leathers/leather.entity.ts';
import type { Work } from '../work.ts';

type Typed = BodyOf<typeof endpoint>;

interface Asked {
  of: 'leather' | 'hardware';
  id: number;
  typed: Typed;
  ifMatch: number;
}

/**
 * Sets when and how much of a thing is ordered, in place of what is worked out; null lets it go.
 * @throws {Problem} 404, 412, 422 for parts of a piece
 */
export async function setOrderByHand(work: Work, { of, id, typed, ifMatch }: Asked): Promise<void> {
  const thing =
    of === 'leather' ? await work.em.findOne(Leather, id) : await work.em.findOne(Hardware, id);
  if (thing === null) throw notFound(of);
  await requireVersion(work.em, { kind: of, id, version: thing.version }, ifMatch);
  if (thing instanceof Leather) setLeather(thing, typed);
  else setHardware(thing, typed);
  await work.em.flush();
  await logDeed(work, {
    action: `set by hand when and how much of ${thing.name} is ordered`,
    subjectKind: of,
    subjectId: id,
    detail: { ...typed },
  });
}

function setLeather(leather: Leather, { point, quantity }: Typed): void {
  if (point !== undefined) leather.orderPointMm2 = decimalOrNull(point);
  if (quantity !== undefined) leather.orderQuantityMm2 = decimalOrNull(quantity);
}

function setHardware(hardware: Hardware, { point, quantity }: Typed): void {
  if (point !== undefined) hardware.orderPoint = wholeOrNull(point, 'point');
  if (quantity !== undefined) hardware.orderQuantity = wholeOrNull(quantity, 'quantity');
}

const decimalOrNull = (text: string | null) => (text === null ? null : new Decimal(text));

function wholeOrNull(text: string | null, field: string): number | null {
  if (text === null) return null;
  const count = Number(text);
  if (Number.isInteger(count) && count <= 10_000_000) return count;
  throw invalid([{ field, message: 'Enter whole pieces, at most 10,000,000.' }]);
}
