import { Entity, OptionalProps, PrimaryKey, Property } from '@mikro-orm/core';
import type { Decimal } from 'decimal.js';
import { AreaType, LengthType } from '../../db/columns/columns.ts';

/** A press: what its bed takes, and what one strike manages by the owner's own figures. */
@Entity({ tableName: 'press' })
export class Press {
  [OptionalProps]?: 'active' | 'version';

  @PrimaryKey({ type: 'integer', columnType: 'integer' })
  id!: number;

  @Property({ type: 'text', columnType: 'text' })
  name!: string;

  @Property({ type: LengthType })
  bedWidthMm!: Decimal;

  @Property({ type: LengthType })
  bedDepthMm!: Decimal;

  @Property({ type: LengthType, nullable: true })
  throatMm: Decimal | null = null;

  @Property({ type: LengthType, nullable: true })
  shutHeightMm: Decimal | null = null;

  @Property({ type: LengthType, nullable: true })
  ruleMm: Decimal | null = null;

  @Property({ type: AreaType, nullable: true })
  reliefAreaMm2: Decimal | null = null;

  @Property({ type: 'boolean', columnType: 'integer', runtimeType: 'boolean' })
  active = true;

  @Property({ type: 'integer', columnType: 'integer', version: true })
  version!: number;
}
