import { Entity, OptionalProps, PrimaryKey, Property } from '@mikro-orm/core';

/** Cuts or impressions that a tool made; never changed. */
@Entity({ tableName: 'impression' })
export class Impression {
  [OptionalProps]?: 'reason';

  @PrimaryKey({ type: 'integer', columnType: 'integer' })
  id!: number;

  @Property({ type: 'integer', columnType: 'integer' })
  toolId!: number;

  @Property({ type: 'integer', columnType: 'integer' })
  uses!: number;

  @Property({ type: 'integer', columnType: 'integer', nullable: true })
  jobId: number | null = null;

  @Property({ type: 'text', columnType: 'text' })
  at!: string;

  @Property({ type: 'text', columnType: 'text' })
  reason = '';

  @Property({ type: 'integer', columnType: 'integer', nullable: true })
  actorId: number | null = null;

  @Property({ type: 'text', columnType: 'text' })
  actorName!: string;
}
