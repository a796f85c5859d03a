import { Entity, OptionalProps, PrimaryKey, Property } from '@mikro-orm/core';
import type { Leather as LeatherReply } from '@hidewright/contract';
import { Decimal } from 'decimal.js';
import { AreaType, OunceType, PercentType, UnitPriceType } from '../../db/columns/columns.ts';

/** What a supplier sells: tannage, colour, finish, weight. */
@Entity({ tableName: 'leather' })
export class Leather {
  [OptionalProps]?: 'tannage' | 'colour' | 'finish' | 'wholeUsablePercent' | 'active' | 'version';

  @PrimaryKey({ type: 'integer', columnType: 'integer' })
  id!: number;

  @Property({ type: 'text', columnType: 'text' })
  name!: string;

  @Property({ type: 'text', columnType: 'text' })
  tannage = '';

  @Property({ type: 'text', columnType: 'text' })
  colour = '';

  @Property({ type: 'text', columnType: 'text' })
  finish = '';

  @Property({ type: OunceType, nullable: true })
  weightLowOz: Decimal | null = null;

  @Property({ type: OunceType, nullable: true })
  weightHighOz: Decimal | null = null;

  @Property({ type: UnitPriceType })
  pricePerFt2!: Decimal;

  @Property({ type: 'integer', columnType: 'integer', nullable: true })
  supplierId: number | null = null;

  /** What it is bought as, whole: null where nobody said. */
  @Property({ type: 'text', columnType: 'text', nullable: true })
  wholeForm: LeatherReply['wholeForm'] = null;

  @Property({ type: AreaType, nullable: true })
  wholeAreaMm2: Decimal | null = null;

  /** Free stock below this is worth an order; null where nobody minds. */
  @Property({ type: AreaType, nullable: true })
  reorderAtMm2: Decimal | null = null;

  /** Set by the owner: order when less than this is left … */
  @Property({ type: AreaType, nullable: true })
  orderPointMm2: Decimal | null = null;

  /** … and so much at a time. */
  @Property({ type: AreaType, nullable: true })
  orderQuantityMm2: Decimal | null = null;

  @Property({ type: PercentType })
  wholeUsablePercent: Decimal = new Decimal(85);

  @Property({ type: 'boolean', columnType: 'integer', runtimeType: 'boolean' })
  active = true;

  @Property({ type: 'integer', columnType: 'integer', version: true })
  version!: number;
}
