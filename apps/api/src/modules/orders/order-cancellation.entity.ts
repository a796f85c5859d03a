import { Entity, PrimaryKey, Property } from '@mikro-orm/core';

/** Who cancelled an order, and why; never changed. */
@Entity({ tableName: 'order_cancellation' })
export class OrderCancellation {
  @PrimaryKey({ type: 'integer', columnType: 'integer' })
  id!: number;

  @Property({ type: 'integer', columnType: 'integer' })
  orderId!: number;

  @Property({ type: 'text', columnType: 'text' })
  at!: string;

  @Property({ type: 'text', columnType: 'text' })
  why!: string;

  @Property({ type: 'integer', columnType: 'integer', nullable: true })
  actorId: number | null = null;

  @Property({ type: 'text', columnType: 'text' })
  actorName!: string;
}
