import type { addSupplierOffer, BodyOf, changeSupplierOffer } from '@hidewright/contract';
import { checkOffer, isPriceKnown } from '@hidewright/domain';
import { Decimal } from 'decimal.js';
import { assignDefined } from '../../db/assign-defined.ts';
import { scaled, unscaled } from '../../db/columns/scaled-decimal.ts';
import { invalid, notFound } from '../../http/problem.ts';
import type { Work } from '../../work.ts';
import { logDeed } from '../activity/activity-log.ts';
import { Hardware } from '../hardware/hardware.entity.ts';
import { KitPart } from '../hardware/kit-part.entity.ts';
import { Leather } from '../leathers/leather.entity.ts';
import { Supplier } from '../suppliers/supplier.entity.ts';
import { keepPresentOffer, presentOf } from './present-offer.ts';
import { SupplierOffer } from './supplier-offer.entity.ts';

/** @throws {Problem} 404 */
export async function findOffer({ em }: Work, id: number): Promise<SupplierOffer> {
  const offer = await em.findOne(SupplierOffer, id);
  if (offer === null) throw notFound('offer');
  return offer;
}

/**
 * The first offer for a thing is the preferred one, whether or not it was asked for, unless the thing is bought from
 * somebody else: then what is paid today is kept as their offer, and stays preferred until another is.
 */
export async function addOffer(
  work: Work,
  typed: BodyOf<typeof addSupplierOffer>,
): Promise<SupplierOffer> {
  const { leatherId, hardwareId, supplierId } = typed;
  const { minimum, multiple, preferred, ...plain } = typed;
  await requireThing(work, typed);
  const thing = { leatherId, hardwareId };
  await requireSupplier(work, supplierId, thing);
  const first = (await work.em.count(SupplierOffer, thing)) === 0;
  const present = await presentOf(work, thing);
  const elsewhere = present !== null && present.supplierId !== supplierId;
  if (first && elsewhere) {
    const theirs = await keepPresentOffer(work, thing, present);
    const known = isPriceKnown(present.price.toFixed());
    const what = known ? 'what is paid today as the offer' : 'an offer without a price';
    await logOffer(work, theirs, `kept ${what} for`);
  }
  const offer = work.em.create(SupplierOffer, {
    ...plain,
    minimum: kept(typed, 'minimum', minimum),
    multiple: kept(typed, 'multiple', multiple),
    preferred: false,
  });
  requireSound(offer);
  await work.em.flush();
  if (preferred || (first && !elsewhere)) await preferOffer(work, offer);
  await logOffer(work, offer, 'entered an offer for');
  return offer;
}

export async function changeOffer(
  work: Work,
  offer: SupplierOffer,
  typed: BodyOf<typeof changeSupplierOffer>,
): Promise<void> {
  const { minimum, multiple, preferred, supplierId, ...plain } = typed;
  if (supplierId !== undefined && supplierId !== offer.supplierId)
    await requireSupplier(work, supplierId, offer);
  assignDefined(offer, {
    ...plain,
    supplierId,
    ...(minimum !== undefined && { minimum: kept(offer, 'minimum', minimum) }),
    ...(multiple !== undefined && { multiple: kept(offer, 'multiple', multiple) }),
    ...(preferred === false && { preferred }),
  });
  requireSound(offer);
  await work.em.flush();
  if (preferred === true) await preferOffer(work, offer);
  if (preferred === false) await preferAnother(work, offer);
  await logOffer(work, offer, 'changed the offer for', { changed: Object.keys(typed) });
}

/** Only one offer for a thing is the preferred one. */
export async function preferOffer({ em }: Work, offer: SupplierOffer): Promise<void> {
  const { leatherId, hardwareId } = offer;
  const before = await em.find(SupplierOffer, { leatherId, hardwareId, preferred: true });
  for (const each of before) if (each !== offer) each.preferred = false;
  // Two at a time would break the index that allows one.
  await em.flush();
  offer.preferred = true;
  await em.flush();
}

/** Takes an offer off the list; where it was the preferred one, another takes its place. */
export async function removeOffer(work: Work, offer: SupplierOffer): Promise<void> {
  await logOffer(work, offer, 'took off the list the offer for');
  await work.em.remove(offer).flush();
  await preferAnother(work, offer);
}

/**
 * Where none for the same thing is preferred, the least dear of the others is, one without a price last: somebody sells
 * it still.
 */
async function preferAnother(work: Work, { id, ...offer }: SupplierOffer): Promise<void> {
  const { leatherId, hardwareId } = offer;
  const all = await work.em.find(
    SupplierOffer,
    { leatherId, hardwareId },
    { orderBy: { id: 'asc' } },
  );
  if (all.some(({ preferred }) => preferred)) return;
  const [next] = all
    .filter((each) => each.id !== id)
    .toSorted((one, other) => firstPrice(one).cmp(firstPrice(other)));
  if (next === undefined) return;
  await preferOffer(work, next);
  await logOffer(work, next, 'prefers from now on the offer for');
}

function firstPrice({ breaks: [first] }: SupplierOffer): Decimal {
  return new Decimal(first !== undefined && isPriceKnown(first.price) ? first.price : Infinity);
}

/** The prices of an offer as they are kept. @throws {InvalidInput} naming the line that is wrong */
function requireSound({ leatherId, minimum, multiple, breaks }: SupplierOffer): void {
  const places = leatherId === null ? 0 : 3;
  const text = (whole: number | null) =>
    whole === null ? null : unscaled(whole, places).toFixed();
  checkOffer({ minimum: text(minimum), multiple: text(multiple), breaks });
  if (leatherId !== null) return;
  const at = breaks.findIndex(({ from }) => !new Decimal(from).isInteger());
  if (at !== -1) throw notWhole(`breaks.${at}.from`);
}

function kept(
  { leatherId }: { leatherId: number | null },
  field: string,
  text: string | null,
): number | null {
  if (text === null) return null;
  const value = new Decimal(text);
  if (leatherId === null && !value.isInteger()) throw notWhole(field);
  return scaled(value, leatherId === null ? 0 : 3);
}

const notWhole = (field: string) =>
  invalid([{ field, message: 'Enter a whole number: hardware is counted.' }]);

type Thing = Pick<SupplierOffer, 'leatherId' | 'hardwareId'>;

async function requireThing({ em }: Work, { leatherId, hardwareId }: Thing): Promise<void> {
  if (leatherId !== null) {
    if ((await em.findOne(Leather, leatherId)) !== null) return;
    throw invalid([{ field: 'leatherId', message: 'Choose a leather from the list.' }]);
  }
  const hardware = await em.findOne(Hardware, hardwareId ?? 0);
  if (hardware === null)
    throw invalid([{ field: 'hardwareId', message: 'Choose hardware or supplies from the list.' }]);
  if (hardware.fromCustomer) {
    const message = `${hardware.name} comes from the customer: nobody is to be paid for it.`;
    throw invalid([{ field: 'hardwareId', message }]);
  }
  if ((await em.count(KitPart, { kitId: hardware.id })) > 0) {
    const message = `${hardware.name} is a kit: enter what its parts are sold at.`;
    throw invalid([{ field: 'hardwareId', message }]);
  }
}

async function requireSupplier(work: Work, supplierId: number, thing: Thing): Promise<void> {
  const { leatherId, hardwareId } = thing;
  const supplier = await work.em.findOne(Supplier, supplierId);
  if (supplier === null)
    throw invalid([{ field: 'supplierId', message: 'Choose a supplier from the list.' }]);
  const before = await work.em.findOne(SupplierOffer, { supplierId, leatherId, hardwareId });
  if (before === null) return;
  const message = `${supplier.name} is on the list already: change that offer, or choose another supplier.`;
  throw invalid([{ field: 'supplierId', message }]);
}

/** What an offer is for: its deeds are written in the log of that. */
export function thingOf({ leatherId, hardwareId }: Thing): {
  kind: 'leather' | 'hardware';
  id: number;
} {
  return leatherId === null
    ? { kind: 'hardware', id: hardwareId ?? 0 }
    : { kind: 'leather', id: leatherId };
}

export async function logOffer(
  work: Work,
  offer: SupplierOffer,
  deed: string,
  detail: Record<string, unknown> = {},
): Promise<void> {
  const { kind, id } = thingOf(offer);
  const { name } = await work.em.findOneOrFail<Leather | Hardware>(
    kind === 'leather' ? Leather : Hardware,
    id,
  );
  const supplier = await work.em.findOneOrFail(Supplier, offer.supplierId);
  await logDeed(work, {
    action: `${deed} ${name} by ${supplier.name}`,
    subjectKind: kind,
    subjectId: id,
    detail: { offer: offer.id, ...detail },
  });
}
