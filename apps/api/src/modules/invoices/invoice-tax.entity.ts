import { Entity, PrimaryKey, Property } from '@mikro-orm/core';
import type { Decimal } from 'decimal.js';
import { MoneyType, PercentType } from '../../db/columns/columns.ts';

/** The tax of an invoice at one rate. */
@Entity({ tableName: 'invoice_tax' })
export class InvoiceTax {
  @PrimaryKey({ type: 'integer', columnType: 'integer' })
  id!: number;

  @Property({ type: 'integer', columnType: 'integer' })
  invoiceId!: number;

  @Property({ type: PercentType })
  percent!: Decimal;

  @Property({ type: MoneyType })
  net!: Decimal;

  @Property({ type: MoneyType })
  tax!: Decimal;
}
