import { Entity, PrimaryKey, Property } from '@mikro-orm/core';
import type { Decimal } from 'decimal.js';
import { MoneyType, UnitPriceType } from '../../db/columns/columns.ts';

/** One rung of a quote. */
@Entity({ tableName: 'quote_break' })
export class QuoteBreak {
  @PrimaryKey({ type: 'integer', columnType: 'integer' })
  id!: number;

  @Property({ type: 'integer', columnType: 'integer' })
  quoteId!: number;

  @Property({ type: 'integer', columnType: 'integer' })
  quantity!: number;

  @Property({ type: UnitPriceType, nullable: true })
  typedPrice: Decimal | null = null;

  @Property({ type: UnitPriceType })
  priceEach!: Decimal;

  /** Pieces and tooling. */
  @Property({ type: MoneyType })
  total!: Decimal;
}
