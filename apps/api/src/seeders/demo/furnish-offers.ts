import { addHardware } from '@hidewright/contract';
import { logDeed } from '../../modules/activity/activity-log.ts';
import { createHardware } from '../../modules/hardware/save-hardware.ts';
import { addOffer } from '../../modules/supplier-offers/save-supplier-offer.ts';
import type { Work } from '../../work.ts';
import type { Named } from './demo-shop.ts';
import { kit, offers } from './scenario/offers.ts';

interface Names {
  suppliers: Named;
  leathers: Named;
  hardware: Named;
}

export async function furnishOffers(work: Work, names: Names): Promise<void> {
  for (const { supplier, breaks, ...each } of offers) {
    const { articleNumber, leadDays, minimum, multiple } = each;
    await addOffer(work, {
      ...{ articleNumber, leadDays, minimum, multiple },
      breaks: [...breaks],
      supplierId: names.suppliers.id(supplier),
      leatherId: 'leather' in each ? names.leathers.id(each.leather) : null,
      hardwareId: 'hardware' in each ? names.hardware.id(each.hardware) : null,
      preferred: false,
    });
  }
}

export async function furnishKit(work: Work, { hardware }: Names): Promise<void> {
  const { parts, standsInFor, ...said } = kit;
  const body = addHardware.body?.parse({
    ...said,
    unitPrice: '0',
    priceFromParts: true,
    parts: parts.map((name) => ({ hardwareId: hardware.id(name), quantity: 1 })),
    standIns: [{ hardwareId: hardware.id(standsInFor), bothWays: true }],
  });
  if (body === undefined) throw new TypeError('Hardware is added with a body');
  const made = await createHardware(work, body);
  hardware.set(made.name, made.id);
  const action = `added hardware ${made.name}`;
  await logDeed(work, { action, subjectKind: 'hardware', subjectId: made.id });
}
