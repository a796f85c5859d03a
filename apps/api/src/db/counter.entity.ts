import { Entity, PrimaryKey, Property } from '@mikro-orm/core';

/** The next number of a kind of paper. */
@Entity({ tableName: 'counter' })
export class Counter {
  @PrimaryKey({ type: 'text', columnType: 'text' })
  name!: string;

  @Property({ type: 'integer', columnType: 'integer' })
  next!: number;
}
