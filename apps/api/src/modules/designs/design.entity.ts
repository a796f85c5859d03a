import { Entity, PrimaryKey, Property } from '@mikro-orm/core';
import type { RunEstimate } from '@hidewright/contract';

/** One customer's version of a pattern, as far as its numbers go by the customer's own runs. */
@Entity({ tableName: 'design' })
export class Design {
  @PrimaryKey({ type: 'integer', columnType: 'integer' })
  id!: number;

  @Property({ type: 'integer', columnType: 'integer' })
  customerId!: number;

  @Property({ type: 'integer', columnType: 'integer' })
  patternId!: number;

  @Property({ type: 'json', columnType: 'text', nullable: false })
  estimate!: RunEstimate;

  @Property({ type: 'text', columnType: 'text' })
  learnedOn!: string;

  @Property({ type: 'integer', columnType: 'integer' })
  runs!: number;
}
