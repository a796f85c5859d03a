import { Entity, OptionalProps, PrimaryKey, Property } from '@mikro-orm/core';
import type { Decimal } from 'decimal.js';
import { AreaType, MoneyType } from '../../db/columns/columns.ts';

/** What is asked back of a supplier for leather that was short of its mark. */
@Entity({ tableName: 'supplier_claim' })
export class SupplierClaim {
  [OptionalProps]?: 'note' | 'version';

  @PrimaryKey({ type: 'integer', columnType: 'integer' })
  id!: number;

  @Property({ type: 'integer', columnType: 'integer' })
  purchaseOrderId!: number;

  @Property({ type: 'integer', columnType: 'integer' })
  receiptId!: number;

  @Property({ type: 'text', columnType: 'text' })
  state!: 'open' | 'credited' | 'given up';

  @Property({ type: AreaType })
  missingAreaMm2!: Decimal;

  /** What was paid for the missing area. */
  @Property({ type: MoneyType })
  worth!: Decimal;

  @Property({ type: 'text', columnType: 'text' })
  text!: string;

  @Property({ type: 'text', columnType: 'text' })
  sentBy!: 'mail' | 'hand';

  /** As it was noted last. */
  @Property({ type: MoneyType, nullable: true })
  credited: Decimal | null = null;

  /** Why it was given up. */
  @Property({ type: 'text', columnType: 'text' })
  note = '';

  @Property({ type: 'text', columnType: 'text' })
  openedAt!: string;

  @Property({ type: 'text', columnType: 'text', nullable: true })
  closedAt: string | null = null;

  @Property({ type: 'integer', columnType: 'integer', version: true })
  version!: number;
}
