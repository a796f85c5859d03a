import { Entity, PrimaryKey, Property } from '@mikro-orm/core';
import { JsonText } from '../../db/columns/json-text.ts';

/** A locked period, with the totals it was locked at. */
@Entity({ tableName: 'period' })
export class Period {
  @PrimaryKey({ type: 'integer', columnType: 'integer' })
  id!: number;

  @Property({ type: 'text', columnType: 'text' })
  fromDay!: string;

  @Property({ type: 'text', columnType: 'text' })
  toDay!: string;

  @Property({ type: JsonText })
  totals!: unknown;

  @Property({ type: 'text', columnType: 'text' })
  lockedAt!: string;

  @Property({ type: 'text', columnType: 'text' })
  lockedBy!: string;
}
