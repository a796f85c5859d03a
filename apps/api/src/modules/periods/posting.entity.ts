import { Entity, PrimaryKey, Property } from '@mikro-orm/core';
import type { Decimal } from 'decimal.js';
import { MoneyType } from '../../db/columns/columns.ts';

/** One side of a bookkeeping entry; the sides of an entry sum to nought. */
@Entity({ tableName: 'posting' })
export class Posting {
  @PrimaryKey({ type: 'integer', columnType: 'integer' })
  id!: number;

  @Property({ type: 'integer', columnType: 'integer' })
  entry!: number;

  @Property({ type: 'text', columnType: 'text' })
  day!: string;

  @Property({ type: 'text', columnType: 'text' })
  account!: 'receivables' | 'sales' | 'tax' | 'money';

  @Property({ type: MoneyType })
  amount!: Decimal;

  @Property({ type: 'integer', columnType: 'integer', nullable: true })
  invoiceId: number | null = null;

  @Property({ type: 'integer', columnType: 'integer', nullable: true })
  paymentId: number | null = null;

  @Property({ type: 'text', columnType: 'text' })
  at!: string;
}
