import { allocate } from '../money/allocate.ts';
import { type DecimalText, Exact, readDecimal, toPlaces } from '../numbers/decimal-text.ts';

/** A lot that came back from a service. */
export interface ServedLot {
  /** as measured anew, above 0 */
  areaMm2: DecimalText;
  /** what was asked for the work on it, where somebody typed it; otherwise it is shared out */
  asked: DecimalText | null;
}

export interface ServiceShare {
  /** its share of what the leather had cost that went out */
  material: DecimalText;
  /** its share of what the service cost */
  goods: DecimalText;
}

/**
 * What each lot that came back from a service (a side that was split gives two) bears of what went out had cost and
 * of what the work cost, both in whole currency units, to the cent, by area; the material sums to what went out
 * exactly. Lots with an amount of their own bear that, and the others what is left of the work, never less than 0:
 * with none of their own the work sums to its price exactly as well.
 * @param lots at least one
 * @throws InvalidInput
 */
export function shareService(
  cost: { material: DecimalText; goods: DecimalText },
  lots: readonly ServedLot[],
): ServiceShare[] {
  const areas = lots.map(({ areaMm2 }) => areaMm2);
  const material = allocate(cost.material, areas);
  const rest = restOf(cost.goods, lots);
  const open = areas.map((area, at) => (lots[at]?.asked === null ? area : '0'));
  const shared = open.every((area) => area === '0') ? open : allocate(rest, open);
  return lots.map(({ asked }, at) => ({
    material: material[at] ?? '0.00',
    goods: asked ?? shared[at] ?? '0.00',
  }));
}

function restOf(goods: DecimalText, lots: readonly ServedLot[]): DecimalText {
  const typed = lots.map(({ asked }, at) =>
    readDecimal(asked ?? '0', `lots.${at}.asked`, { min: 0, places: 2 }),
  );
  const whole = readDecimal(goods, 'goods', { min: 0, places: 2 });
  return toPlaces(Exact.max(0, whole.minus(Exact.sum(0, ...typed))), 2);
}
