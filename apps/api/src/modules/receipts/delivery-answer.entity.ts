import { Entity, PrimaryKey, Property } from '@mikro-orm/core';
import type { Decimal } from 'decimal.js';
import { AreaType, MoneyType } from '../../db/columns/columns.ts';

/** That the owner let a delivery's price stand, or did not claim what was short in it; it holds for what stood then. */
@Entity({ tableName: 'delivery_answer' })
export class DeliveryAnswer {
  @PrimaryKey({ type: 'integer', columnType: 'integer' })
  id!: number;

  @Property({ type: 'integer', columnType: 'integer' })
  receiptId!: number;

  @Property({ type: 'text', columnType: 'text' })
  matter!: 'price' | 'short';

  /** The difference that was let stand. */
  @Property({ type: MoneyType, nullable: true })
  priceDifference: Decimal | null = null;

  /** What was missing and is not claimed. */
  @Property({ type: AreaType, nullable: true })
  missingAreaMm2: Decimal | null = null;

  /** Empty where none was given. */
  @Property({ type: 'text', columnType: 'text' })
  reason!: string;

  @Property({ type: 'text', columnType: 'text' })
  at!: string;

  @Property({ type: 'integer', columnType: 'integer', nullable: true })
  actorId: number | null = null;

  @Property({ type: 'text', columnType: 'text' })
  actorName!: string;
}
