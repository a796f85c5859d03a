import { Entity, PrimaryKey, Property } from '@mikro-orm/core';

/** A promised day that was moved; never changed. */
@Entity({ tableName: 'promise_move' })
export class PromiseMove {
  @PrimaryKey({ type: 'integer', columnType: 'integer' })
  id!: number;

  @Property({ type: 'integer', columnType: 'integer' })
  orderId!: number;

  @Property({ type: 'text', columnType: 'text' })
  fromDay!: string;

  @Property({ type: 'text', columnType: 'text' })
  toDay!: string;

  @Property({ type: 'text', columnType: 'text' })
  at!: string;

  @Property({ type: 'text', columnType: 'text' })
  why!: string;

  @Property({ type: 'integer', columnType: 'integer', nullable: true })
  actorId: number | null = null;

  @Property({ type: 'text', columnType: 'text' })
  actorName!: string;
}
