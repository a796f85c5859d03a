import { Decimal } from 'decimal.js';
import { Problem } from '../http/problem.ts';
import { logDeed } from '../modules/activity/activity-log.ts';
import { Person } from '../modules/people/person.entity.ts';
import { Workshop } from '../modules/workshop/workshop.entity.ts';
import type { Work } from '../work.ts';

interface NewShop {
  workshopName: string;
  ownerName: string;
  email: string;
  passwordHash: string;
  mode?: 'demo' | 'shop';
}

/**
 * Makes the shop's row, with starting values that can all be changed, and its owner.
 * @throws {Problem} 409 when there is a shop already
 */
export async function openNewShop(work: Work, asked: NewShop): Promise<Person> {
  if ((await work.em.count(Person)) > 0) {
    throw new Problem(409, 'Already open', 'This shop has an owner already. Sign in instead.');
  }
  const createdAt = work.now.toISOString();
  work.em.create(Workshop, {
    id: 1,
    mode: asked.mode ?? 'shop',
    name: asked.workshopName,
    targetPerHour: new Decimal(60),
    wagePerHour: new Decimal(22),
    packingPerOrder: new Decimal(6),
    rejectPercent: new Decimal(10),
    confidencePercent: new Decimal(95),
    priceStep: new Decimal('0.05'),
    benchHoursPerDay: new Decimal(6),
    spacingMm: new Decimal(2),
    trimMm: new Decimal(3),
    depositPercent: new Decimal(0),
    createdAt,
  });
  const owner = work.em.create(Person, {
    email: asked.email.toLowerCase(),
    name: asked.ownerName,
    role: 'owner',
    passwordHash: asked.passwordHash,
    createdAt,
  });
  await work.em.flush();
  await logDeed(work, {
    action: `opened ${asked.workshopName}`,
    subjectKind: 'workshop',
    subjectId: 1,
  });
  return owner;
}
