import { Decimal } from 'decimal.js';
import type { PatternDefinition } from '@hidewright/contract';
import { decimals } from '../../db/decimals.ts';
import { openNewShop } from '../../flows/open-new-shop.ts';
import { addPattern } from '../../flows/save-pattern.ts';
import { addTool } from '../../flows/save-tool.ts';
import { logDeed } from '../../modules/activity/activity-log.ts';
import { Customer } from '../../modules/customers/customer.entity.ts';
import { Hardware } from '../../modules/hardware/hardware.entity.ts';
import { layoutFor } from '../../modules/layouts/stored-layouts.ts';
import { Leather } from '../../modules/leathers/leather.entity.ts';
import { Person } from '../../modules/people/person.entity.ts';
import { hashPassword } from '../../modules/people/passwords.ts';
import { Press } from '../../modules/presses/press.entity.ts';
import { Supplier } from '../../modules/suppliers/supplier.entity.ts';
import { TaxRate } from '../../modules/tax-rates/tax-rate.entity.ts';
import { Workshop } from '../../modules/workshop/workshop.entity.ts';
import { inTransaction, theProgram, type Work } from '../../work.ts';
import { Named, type DemoShop } from './demo-shop.ts';
import { furnishKit, furnishOffers } from './furnish-offers.ts';
import { furnishPlateOffers } from './furnish-tooling.ts';
import { customers } from './scenario/customers.ts';
import { patterns } from './scenario/patterns.ts';
import { demoPassword, people, shop as shopOf } from './scenario/people.ts';
import { hardware, leathers, presses, suppliers } from './scenario/stockroom.ts';

/** What the shop has before its year begins, by name. */
export interface Furnished {
  suppliers: Named;
  leathers: Named;
  hardware: Named;
  customers: Named;
  patterns: Named;
  taxRateId: number;
}

export async function furnish(shop: DemoShop): Promise<Furnished> {
  await openShop(shop);
  const furnished = await shop.as('owner', furnishRooms);
  for (const pattern of patterns) await furnishPattern(shop, furnished, pattern);
  return furnished;
}

async function openShop(shop: DemoShop): Promise<void> {
  const passwordHash = await hashPassword(demoPassword);
  await inTransaction(shop.context, theProgram, async (work) => {
    const [owner, ...others] = people;
    if (owner === undefined) throw new Error('The demo workshop needs an owner');
    await openNewShop(work, {
      ...shopOf,
      ownerName: owner.name,
      email: owner.email,
      passwordHash,
      mode: 'demo',
    });
    for (const each of others)
      work.em.create(Person, { ...each, passwordHash, createdAt: work.now.toISOString() });
    const workshop = await work.em.findOneOrFail(Workshop, 1);
    const { address, taxNumber, rates } = shopOf;
    work.em.assign(workshop, { address, taxNumber, ...decimals(rates) });
    await work.em.flush();
  });
  await shop.meetPeople();
}

async function furnishRooms(work: Work): Promise<Furnished> {
  const furnished: Furnished = {
    suppliers: new Named('supplier'),
    leathers: new Named('leather'),
    hardware: new Named('hardware'),
    customers: new Named('customer'),
    patterns: new Named('pattern'),
    taxRateId: 0,
  };
  for (const each of suppliers)
    await note(work, furnished.suppliers, 'supplier', work.em.create(Supplier, each));
  for (const { name, ...measures } of presses) {
    const press = work.em.create(Press, { name, ...decimals(measures) });
    await work.em.flush();
    const action = `added the press ${name}`;
    await logDeed(work, { action, subjectKind: 'press', subjectId: press.id });
  }
  await furnishPlateOffers(work);
  for (const { supplier, ...each } of leathers) {
    const leather = work.em.create(Leather, {
      ...each,
      weightLowOz: new Decimal(each.weightLowOz),
      weightHighOz: new Decimal(each.weightHighOz),
      pricePerFt2: new Decimal(each.pricePerFt2),
      wholeAreaMm2: new Decimal(each.wholeAreaMm2),
      reorderAtMm2: 'reorderAtMm2' in each ? new Decimal(each.reorderAtMm2) : null,
      supplierId: furnished.suppliers.id(supplier),
    });
    await note(work, furnished.leathers, 'leather', leather);
  }
  for (const { supplier, ...each } of hardware) {
    const supplierId = furnished.suppliers.id(supplier);
    const part = work.em.create(Hardware, {
      ...each,
      unitPrice: new Decimal(each.unitPrice),
      supplierId,
    });
    await note(work, furnished.hardware, 'hardware', part);
  }
  await furnishKit(work, furnished);
  await furnishOffers(work, furnished);
  const createdAt = work.now.toISOString();
  for (const each of customers)
    await note(
      work,
      furnished.customers,
      'customer',
      work.em.create(Customer, { ...each, createdAt }),
    );
  furnished.taxRateId = await furnishTaxRate(work);
  return furnished;
}

async function note(
  work: Work,
  names: Named,
  subjectKind: string,
  made: { id: number; name: string },
): Promise<void> {
  await work.em.flush();
  names.set(made.name, made.id);
  await logDeed(work, {
    action: `added ${subjectKind} ${made.name}`,
    subjectKind,
    subjectId: made.id,
  });
}

async function furnishTaxRate(work: Work): Promise<number> {
  const { name, percent } = shopOf.taxRate;
  const rate = work.em.create(TaxRate, { name, percent: new Decimal(percent) });
  await work.em.flush();
  await logDeed(work, {
    action: `entered the tax rate ${name} at ${percent} %`,
    subjectKind: 'tax rate',
    subjectId: rate.id,
  });
  return rate.id;
}

/** A pattern of the scenario, with the numbers that its names have got. */
function definitionFrom(
  { leathers: kinds, hardware: parts }: Furnished,
  { leather, hardware: lines, ...rest }: (typeof patterns)[number]['definition'],
): PatternDefinition {
  const idOf = (name: string | null) => (name === null ? null : parts.id(name));
  return {
    ...rest,
    work: rest.work.kind === 'steps' ? { ...rest.work, steps: [...rest.work.steps] } : rest.work,
    leatherId: kinds.id(leather),
    hardware: lines.map(({ name, ...line }) => ({ hardwareId: parts.id(name), ...line })),
    supplies: 'supplies' in rest ? [...rest.supplies] : undefined,
    options:
      'options' in rest
        ? rest.options.map(({ name, swaps }) => ({
            name,
            swaps: swaps.map(({ hardware: out, by, perPiece }) => ({
              hardwareId: idOf(out),
              byHardwareId: idOf(by),
              perPiece,
            })),
          }))
        : undefined,
    history: null,
  };
}

async function furnishPattern(
  shop: DemoShop,
  furnished: Furnished,
  pattern: (typeof patterns)[number],
): Promise<void> {
  const definition = definitionFrom(furnished, pattern.definition);
  const worked = await layoutFor(shop.context, definition);
  await shop.as('owner', async (work) => {
    const made = await addPattern(work, { name: pattern.name, definition }, worked);
    furnished.patterns.set(pattern.name, made.id);
    if (pattern.die === null) return;
    await addTool(work, {
      ...pattern.die,
      kind: 'cutting die',
      name: pattern.name,
      metal: 'steel',
      patternId: made.id,
      customerId: null,
      ownedBy: 'shop',
      keptUntil: null,
      state: 'on the rack',
      piecesPerStrike: 1,
      ruleThicknessMm: '1.05',
      borderMm: null,
      reliefAreaMm2: null,
    });
  });
}
