import type { CountLine } from '@hidewright/contract';
import type { Entry } from './entry-outbox.ts';

/** A line with what was typed of it on this device. */
export function asTyped(line: CountLine, entry: Entry): CountLine {
  const { areaMm2 = null, quantity = null, unmeasured = false } = entry;
  return { ...line, countedAreaMm2: areaMm2, countedQuantity: quantity, unmeasured };
}

/** Whether a figure stands there, or somebody saw it hang there. */
export function hasFigure({ countedAreaMm2, countedQuantity, unmeasured }: CountLine): boolean {
  return countedAreaMm2 !== null || countedQuantity !== null || unmeasured;
}
