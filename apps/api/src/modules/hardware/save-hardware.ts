import type { addHardware, BodyOf, changeHardware } from '@hidewright/contract';
import { Decimal } from 'decimal.js';
import { assignDefined } from '../../db/assign-defined.ts';
import { decimals } from '../../db/decimals.ts';
import { requireFreeName } from '../../http/free-name.ts';
import { invalid } from '../../http/problem.ts';
import type { Work } from '../../work.ts';
import { Supplier } from '../suppliers/supplier.entity.ts';
import { Hardware } from './hardware.entity.ts';
import { KitPart } from './kit-part.entity.ts';
import { saveParts } from './save-kit.ts';
import { saveStandIns } from './save-stand-ins.ts';

export async function createHardware(
  work: Work,
  body: BodyOf<typeof addHardware>,
): Promise<Hardware> {
  const { unitPrice, postLengthMm, stackMinMm, stackMaxMm, parts, standIns, ...plain } = body;
  await requireFreeName(work.em, Hardware, body.name);
  await requireSupplier(work, body.supplierId);
  const hardware = work.em.create(Hardware, {
    ...plain,
    ...decimals({ postLengthMm, stackMinMm, stackMaxMm }),
    unitPrice: new Decimal(body.fromCustomer ? 0 : unitPrice),
  });
  requireStack(hardware);
  await work.em.flush();
  await saveParts(work, hardware, parts);
  await saveStandIns(work, hardware, standIns);
  await requireKitForItsPrice(work, hardware);
  return hardware;
}

export async function updateHardware(
  work: Work,
  hardware: Hardware,
  body: BodyOf<typeof changeHardware>,
): Promise<void> {
  const { unitPrice, postLengthMm, stackMinMm, stackMaxMm, parts, standIns, ...plain } = body;
  const read = hardware.version;
  if (body.name !== undefined) await requireFreeName(work.em, Hardware, body.name, hardware.id);
  await requireSupplier(work, body.supplierId);
  assignDefined(hardware, {
    ...plain,
    ...decimals({ unitPrice, postLengthMm, stackMinMm, stackMaxMm }),
  });
  if (hardware.fromCustomer) hardware.unitPrice = new Decimal(0);
  requireStack(hardware);
  await work.em.flush();
  if (parts !== undefined) await saveParts(work, hardware, parts);
  if (standIns !== undefined) await saveStandIns(work, hardware, standIns);
  await requireKitForItsPrice(work, hardware);
  if (hardware.version === read) await raiseVersion(work, hardware);
}

/** What is only in other tables changes the hardware as well: who read it before must read it again. */
async function raiseVersion({ em }: Work, hardware: Hardware): Promise<void> {
  await em.nativeUpdate(Hardware, { id: hardware.id }, { active: hardware.active });
  await em.refresh(hardware);
}

function requireStack({ stackMinMm, stackMaxMm, postLengthMm }: Hardware): void {
  if (stackMinMm !== null && stackMaxMm === null) {
    const message = 'Enter the thickest stack that it holds as well.';
    throw invalid([{ field: 'stackMaxMm', message }]);
  }
  if (stackMaxMm === null) return;
  if (stackMinMm !== null && stackMaxMm.lessThan(stackMinMm)) {
    const message = 'The thickest stack must not be below the thinnest.';
    throw invalid([{ field: 'stackMaxMm', message }]);
  }
  if (postLengthMm !== null && stackMaxMm.greaterThan(postLengthMm)) {
    const message = `No more than its own length of ${postLengthMm.toString()} mm goes on a post. Enter less.`;
    throw invalid([{ field: 'stackMaxMm', message }]);
  }
}

async function requireKitForItsPrice({ em }: Work, hardware: Hardware): Promise<void> {
  if (!hardware.priceFromParts) return;
  if ((await em.count(KitPart, { kitId: hardware.id })) > 0) return;
  const message = 'It has no parts to take the price from: enter a price, or name its parts.';
  throw invalid([{ field: 'priceFromParts', message }]);
}

async function requireSupplier({ em }: Work, id: number | null | undefined): Promise<void> {
  if (id === null || id === undefined || (await em.findOne(Supplier, id)) !== null) return;
  throw invalid([{ field: 'supplierId', message: 'Choose a supplier from the list.' }]);
}
