import type { Design as DesignReply, PatternDefinition } from '@hidewright/contract';
import { withEstimate } from '@hidewright/contract';
import type { EntityManager } from '@mikro-orm/sqlite';
import { Customer } from '../customers/customer.entity.ts';
import { Pattern } from '../patterns/pattern.entity.ts';
import { Design } from './design.entity.ts';

export async function describeDesign(em: EntityManager, design: Design): Promise<DesignReply> {
  const { id, customerId, patternId, learnedOn, runs } = design;
  const customer = await em.findOneOrFail(Customer, customerId);
  const pattern = await em.findOneOrFail(Pattern, patternId);
  return {
    ...{ id, customerId, patternId, learnedOn, runs },
    customerName: customer.name,
    patternName: pattern.name,
  };
}

interface Whose {
  patternId: number;
  customerId: number | null;
}

/** A pattern as it stands for a customer: with their design's own figures where they have some. */
export async function definitionFor(
  em: EntityManager,
  definition: PatternDefinition,
  { patternId, customerId }: Whose,
): Promise<{ definition: PatternDefinition; design: Design | null }> {
  const design = customerId === null ? null : await em.findOne(Design, { customerId, patternId });
  return {
    design,
    definition: design === null ? definition : withEstimate(definition, design.estimate),
  };
}
