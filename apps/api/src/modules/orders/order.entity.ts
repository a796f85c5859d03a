import { Entity, OptionalProps, PrimaryKey, Property } from '@mikro-orm/core';
import { Decimal } from 'decimal.js';
import { MoneyType, UnitPriceType } from '../../db/columns/columns.ts';
import { JsonText } from '../../db/columns/json-text.ts';

/** A run that the shop has taken on. */
@Entity({ tableName: 'customer_order' })
export class Order {
  [OptionalProps]?: 'charges' | 'chargesTotal' | 'version';

  @PrimaryKey({ type: 'integer', columnType: 'integer' })
  id!: number;

  @Property({ type: 'text', columnType: 'text' })
  number!: string;

  @Property({ type: 'integer', columnType: 'integer' })
  quoteId!: number;

  @Property({ type: 'integer', columnType: 'integer' })
  customerId!: number;

  @Property({ type: 'text', columnType: 'text' })
  title!: string;

  @Property({ type: 'integer', columnType: 'integer' })
  quantity!: number;

  @Property({ type: UnitPriceType })
  priceEach!: Decimal;

  @Property({ type: MoneyType })
  goodsTotal!: Decimal;

  @Property({ type: MoneyType })
  toolingCharge!: Decimal;

  /** The option that was agreed; null for the piece as it is. */
  @Property({ type: 'text', columnType: 'text', nullable: true })
  optionName: string | null = null;

  /** Charged once beside pieces and tooling. */
  @Property({ type: JsonText })
  charges: { name: string; amount: string }[] = [];

  @Property({ type: MoneyType })
  chargesTotal: Decimal = new Decimal(0);

  @Property({ type: MoneyType })
  total!: Decimal;

  @Property({ type: 'text', columnType: 'text' })
  state!:
    | 'awaiting proof'
    | 'awaiting deposit'
    | 'awaiting tooling'
    | 'taken on'
    | 'in work'
    | 'packed'
    | 'part shipped'
    | 'shipped'
    | 'closed'
    | 'cancelled';

  @Property({ type: JsonText })
  awaits!: ('proof' | 'deposit' | 'tooling')[];

  @Property({ type: 'text', columnType: 'text', nullable: true })
  inHandsOn: string | null = null;

  @Property({ type: 'text', columnType: 'text' })
  promisedOn!: string;

  @Property({ type: 'text', columnType: 'text' })
  takenOnAt!: string;

  @Property({ type: 'text', columnType: 'text', nullable: true })
  shippedOn: string | null = null;

  @Property({ type: 'integer', columnType: 'integer', version: true })
  version!: number;
}
