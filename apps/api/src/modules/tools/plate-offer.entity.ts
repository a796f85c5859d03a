import { Entity, OptionalProps, PrimaryKey, Property } from '@mikro-orm/core';
import type { Decimal } from 'decimal.js';
import { MoneyType } from '../../db/columns/columns.ts';

/** What a new plate of a metal costs and how many impressions it lasts, by the shop's own figures. */
@Entity({ tableName: 'plate_offer' })
export class PlateOffer {
  [OptionalProps]?: 'version';

  @PrimaryKey({ type: 'integer', columnType: 'integer' })
  id!: number;

  @Property({ type: 'text', columnType: 'text' })
  metal!: 'steel' | 'magnesium' | 'copper' | 'brass';

  @Property({ type: MoneyType })
  price!: Decimal;

  @Property({ type: 'integer', columnType: 'integer' })
  lifeUses!: number;

  @Property({ type: 'integer', columnType: 'integer', version: true })
  version!: number;
}
