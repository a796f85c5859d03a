import { Entity, OptionalProps, PrimaryKey, Property } from '@mikro-orm/core';
import type { Decimal } from 'decimal.js';
import { MoneyType } from '../../db/columns/columns.ts';

/** Money received for an invoice; never changed. */
@Entity({ tableName: 'payment' })
export class Payment {
  [OptionalProps]?: 'note';

  @PrimaryKey({ type: 'integer', columnType: 'integer' })
  id!: number;

  @Property({ type: 'integer', columnType: 'integer' })
  invoiceId!: number;

  @Property({ type: MoneyType })
  amount!: Decimal;

  @Property({ type: 'text', columnType: 'text' })
  receivedOn!: string;

  @Property({ type: 'text', columnType: 'text' })
  method!: 'bank' | 'card' | 'cash' | 'cheque';

  @Property({ type: 'text', columnType: 'text' })
  note = '';

  @Property({ type: 'text', columnType: 'text' })
  at!: string;

  @Property({ type: 'integer', columnType: 'integer', nullable: true })
  actorId: number | null = null;

  @Property({ type: 'text', columnType: 'text' })
  actorName!: string;
}
