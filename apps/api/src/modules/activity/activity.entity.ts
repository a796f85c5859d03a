import { Entity, PrimaryKey, Property } from '@mikro-orm/core';
import { JsonText } from '../../db/columns/json-text.ts';

/** One row of the log of who did what; each row's hash covers the row before it. */
@Entity({ tableName: 'activity' })
export class Activity {
  @PrimaryKey({ type: 'integer', columnType: 'integer' })
  seq!: number;

  @Property({ type: 'text', columnType: 'text' })
  at!: string;

  @Property({ type: 'integer', columnType: 'integer', nullable: true })
  actorId: number | null = null;

  @Property({ type: 'text', columnType: 'text' })
  actorName!: string;

  @Property({ type: 'text', columnType: 'text' })
  actorRole!: string;

  @Property({ type: 'text', columnType: 'text' })
  action!: string;

  @Property({ type: 'text', columnType: 'text' })
  subjectKind!: string;

  @Property({ type: 'integer', columnType: 'integer', nullable: true })
  subjectId: number | null = null;

  @Property({ type: JsonText })
  detail!: unknown;

  @Property({ type: 'text', columnType: 'text' })
  previousHash!: string;

  @Property({ type: 'text', columnType: 'text' })
  hash!: string;
}
