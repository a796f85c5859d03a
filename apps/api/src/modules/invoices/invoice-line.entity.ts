import { Entity, PrimaryKey, Property } from '@mikro-orm/core';
import type { Decimal } from 'decimal.js';
import { MoneyType, PercentType, UnitPriceType } from '../../db/columns/columns.ts';

/** One line of an invoice. */
@Entity({ tableName: 'invoice_line' })
export class InvoiceLine {
  @PrimaryKey({ type: 'integer', columnType: 'integer' })
  id!: number;

  @Property({ type: 'integer', columnType: 'integer' })
  invoiceId!: number;

  @Property({ type: 'integer', columnType: 'integer' })
  position!: number;

  @Property({ type: 'text', columnType: 'text' })
  description!: string;

  @Property({ type: 'integer', columnType: 'integer' })
  quantity!: number;

  @Property({ type: UnitPriceType })
  unitPrice!: Decimal;

  @Property({ type: MoneyType })
  amount!: Decimal;

  @Property({ type: 'integer', columnType: 'integer', nullable: true })
  taxRateId: number | null = null;

  @Property({ type: PercentType })
  taxPercent!: Decimal;
}
