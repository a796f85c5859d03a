import { Entity, OptionalProps, PrimaryKey, Property } from '@mikro-orm/core';
import type { Decimal } from 'decimal.js';
import { UnitPriceType } from '../../db/columns/columns.ts';

/** Rivets, rings and snaps, and supplies such as boxes and thread: counted. */
@Entity({ tableName: 'hardware' })
export class Hardware {
  [OptionalProps]?: 'packSize' | 'reorderAt' | 'active' | 'version';

  @PrimaryKey({ type: 'integer', columnType: 'integer' })
  id!: number;

  @Property({ type: 'text', columnType: 'text' })
  name!: string;

  @Property({ type: 'text', columnType: 'text' })
  kind!: 'hardware' | 'supplies';

  @Property({ type: UnitPriceType, columnType: 'integer' })
  unitPrice!: Decimal;

  @Property({ type: 'integer', columnType: 'integer' })
  packSize = 1;

  /** Free stock below this is worth an order. */
  @Property({ type: 'integer', columnType: 'integer' })
  reorderAt = 0;

  @Property({ type: 'integer', columnType: 'integer', nullable: true })
  supplierId: number | null = null;

  @Property({ type: 'boolean', columnType: 'integer' })
  active = true;

  @Property({ type: 'integer', columnType: 'integer', version: true })
  version!: number;
}
