import { Entity, OptionalProps, PrimaryKey, Property } from '@mikro-orm/core';
import type { Decimal } from 'decimal.js';
import { AreaType, MoneyType } from '../../db/columns/columns.ts';

/** What is asked back of a supplier: for leather that was short of its mark, or for what went back. */
@Entity({ tableName: 'supplier_claim' })
export class SupplierClaim {
  [OptionalProps]?: 'note' | 'version';

  @PrimaryKey({ type: 'integer', columnType: 'integer' })
  id!: number;

  @Property({ type: 'integer', columnType: 'integer' })
  purchaseOrderId!: number;

  /** The delivery of which lots are short. */
  @Property({ type: 'integer', columnType: 'integer', nullable: true })
  receiptId: number | null = null;

  @Property({ type: AreaType, nullable: true })
  missingAreaMm2: Decimal | null = null;

  /** The row of the ledger that took away what went back. */
  @Property({ type: 'integer', columnType: 'integer', nullable: true })
  movementId: number | null = null;

  @Property({ type: 'text', columnType: 'text' })
  state!: 'open' | 'credited' | 'given up';

  /** What was paid for the missing area, or for what went back. */
  @Property({ type: MoneyType })
  worth!: Decimal;

  /** What was written to the supplier; empty for what went back, which the shop says in its own way. */
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
