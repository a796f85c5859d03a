import { decimals } from '../../db/decimals.ts';
import { addTool } from '../../flows/save-tool.ts';
import { logDeed } from '../../modules/activity/activity-log.ts';
import { PlateOffer } from '../../modules/tools/plate-offer.entity.ts';
import type { Work } from '../../work.ts';
import type { Stage } from './stage.ts';
import { plateOffers } from './scenario/stockroom.ts';

export async function furnishPlateOffers(work: Work): Promise<void> {
  for (const { price, ...each } of plateOffers) {
    const offer = work.em.create(PlateOffer, { ...each, ...decimals({ price }) });
    await work.em.flush();
    const action = `entered the price of ${offer.metal} plates`;
    await logDeed(work, { action, subjectKind: 'plate offer', subjectId: offer.id });
  }
}

/** A plate that its customer brought along a quarter ago: the term ends on the last day of the year. */
export function planBorrowedPlate({ shop, year, furnished }: Stage): void {
  year.plan(90, '11:30', async () => {
    await shop.as('owner', (work) =>
      addTool(work, {
        number: '30',
        kind: 'stamp plate',
        name: 'Crossed oars, brought by the club',
        metal: 'copper',
        cost: '0.00',
        lifeUses: 20_000,
        slot: 'D1',
        patternId: furnished.patterns.id('Drinks coaster, round'),
        customerId: furnished.customers.id('Saltmarsh Rowing Club'),
        ownedBy: 'customer',
        keptUntil: year.end,
        state: 'on the rack',
        piecesPerStrike: 1,
        ruleThicknessMm: null,
        borderMm: '2',
        reliefAreaMm2: '820',
      }),
    );
  });
}
