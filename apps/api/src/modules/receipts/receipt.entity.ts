import { Entity, OptionalProps, PrimaryKey, Property } from '@mikro-orm/core';
import type { Decimal } from 'decimal.js';
import { AreaType, MoneyType, PercentType } from '../../db/columns/columns.ts';

/** One delivery that was taken in. */
@Entity({ tableName: 'receipt' })
export class Receipt {
  [OptionalProps]?: 'version';

  @PrimaryKey({ type: 'integer', columnType: 'integer' })
  id!: number;

  @Property({ type: 'integer', columnType: 'integer', nullable: true })
  purchaseOrderId: number | null = null;

  @Property({ type: 'text', columnType: 'text' })
  receivedOn!: string;

  @Property({ type: 'text', columnType: 'text' })
  at!: string;

  @Property({ type: MoneyType })
  freight!: Decimal;

  @Property({ type: MoneyType })
  duty!: Decimal;

  /** What freight and duty are shared by. */
  @Property({ type: 'text', columnType: 'text' })
  sharedBy!: 'value' | 'area' | 'count';

  /** How far a side might miss its mark when it came. */
  @Property({ type: PercentType })
  tolerancePercent!: Decimal;

  /** How much more its goods cost than at their order's prices. */
  @Property({ type: MoneyType })
  priceDifference!: Decimal;

  /** What its lots miss of their marks, of those that miss more than the tolerance. */
  @Property({ type: AreaType })
  missingAreaMm2!: Decimal;

  @Property({ type: 'integer', columnType: 'integer', nullable: true })
  actorId: number | null = null;

  @Property({ type: 'text', columnType: 'text' })
  actorName!: string;

  @Property({ type: 'integer', columnType: 'integer', version: true })
  version!: number;
}
