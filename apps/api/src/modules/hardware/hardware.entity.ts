import { Entity, OptionalProps, PrimaryKey, Property } from '@mikro-orm/core';
import type { HardwareUnit } from '@hidewright/domain';
import type { Decimal } from 'decimal.js';
import { LengthType, UnitPriceType } from '../../db/columns/columns.ts';

/** Rivets, rings and snaps, and supplies such as boxes and thread: counted. */
@Entity({ tableName: 'hardware' })
export class Hardware {
  [OptionalProps]?:
    | 'packSize'
    | 'reorderAt'
    | 'unit'
    | 'metal'
    | 'colour'
    | 'bin'
    | 'fromCustomer'
    | 'priceFromParts'
    | 'settingDie'
    | 'settingDieHere'
    | 'active'
    | 'version';

  @PrimaryKey({ type: 'integer', columnType: 'integer' })
  id!: number;

  @Property({ type: 'text', columnType: 'text' })
  name!: string;

  @Property({ type: 'text', columnType: 'text' })
  kind!: 'hardware' | 'supplies';

  @Property({ type: UnitPriceType })
  unitPrice!: Decimal;

  @Property({ type: 'integer', columnType: 'integer' })
  packSize = 1;

  /** Free stock below this is worth an order. */
  @Property({ type: 'integer', columnType: 'integer' })
  reorderAt = 0;

  @Property({ type: 'integer', columnType: 'integer', nullable: true })
  supplierId: number | null = null;

  /** Set by the owner: order when less than this is left … */
  @Property({ type: 'integer', columnType: 'integer', nullable: true })
  orderPoint: number | null = null;

  /** … and so many at a time. */
  @Property({ type: 'integer', columnType: 'integer', nullable: true })
  orderQuantity: number | null = null;

  /** What one of it is: counted whole. */
  @Property({ type: 'text', columnType: 'text' })
  unit: HardwareUnit = 'piece';

  @Property({ type: 'text', columnType: 'text' })
  metal = '';

  @Property({ type: 'text', columnType: 'text' })
  colour = '';

  /** Where it lies. */
  @Property({ type: 'text', columnType: 'text' })
  bin = '';

  /** The customer brings it: it is counted, and never bought. */
  @Property({ type: 'boolean', columnType: 'integer', runtimeType: 'boolean' })
  fromCustomer = false;

  /** A kit that costs what its parts cost. */
  @Property({ type: 'boolean', columnType: 'integer', runtimeType: 'boolean' })
  priceFromParts = false;

  @Property({ type: LengthType, nullable: true })
  postLengthMm: Decimal | null = null;

  /** The folded stack that it holds, from the thinnest … */
  @Property({ type: LengthType, nullable: true })
  stackMinMm: Decimal | null = null;

  /** … to the thickest. */
  @Property({ type: LengthType, nullable: true })
  stackMaxMm: Decimal | null = null;

  /** The die that sets it, by the name or number that the shop gives it. */
  @Property({ type: 'text', columnType: 'text' })
  settingDie = '';

  @Property({ type: 'boolean', columnType: 'integer', runtimeType: 'boolean' })
  settingDieHere = true;

  @Property({ type: 'boolean', columnType: 'integer', runtimeType: 'boolean' })
  active = true;

  @Property({ type: 'integer', columnType: 'integer', version: true })
  version!: number;
}
