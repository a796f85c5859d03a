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

  @Property({ type: PercentType, columnType: 'integer' })
  percent!: Decimal;

  @Property({ type: MoneyType, columnType: 'integer' })
  net!: Decimal;

  @Property({ type: MoneyType, columnType: 'integer' })
  tax!: Decimal;
}
