import { Entity, OptionalProps, PrimaryKey, Property } from '@mikro-orm/core';
import type { Decimal } from 'decimal.js';
import { MoneyType, UnitPriceType } from '../../db/columns/columns.ts';

/** What is ordered on one line: leather by area, hardware by the piece, or work on a lot that goes out for it. */
@Entity({ tableName: 'purchase_line' })
export class PurchaseLine {
  [OptionalProps]?: 'received' | 'closed';

  @PrimaryKey({ type: 'integer', columnType: 'integer' })
  id!: number;

  @Property({ type: 'integer', columnType: 'integer' })
  purchaseOrderId!: number;

  @Property({ type: 'integer', columnType: 'integer' })
  position!: number;

  /** Of a service, the leather that the lot becomes. */
  @Property({ type: 'integer', columnType: 'integer', nullable: true })
  leatherId: number | null = null;

  @Property({ type: 'integer', columnType: 'integer', nullable: true })
  hardwareId: number | null = null;

  /** Thousandths of mm², or pieces. */
  @Property({ type: 'integer', columnType: 'integer' })
  quantity!: number;

  /** As it is paid for: of leather the marked area, where there is one. */
  @Property({ type: 'integer', columnType: 'integer' })
  received = 0;

  /** Nothing more of it is to come, although something is missing. */
  @Property({ type: 'boolean', columnType: 'integer', runtimeType: 'boolean' })
  closed = false;

  /** The day since which nothing more of it is awaited: all is here, it is closed, or the order is; null until then. */
  @Property({ type: 'text', columnType: 'text', nullable: true })
  awaitedUntil: string | null = null;

  /** When the rest of it is awaited, where that is another day than the order's. */
  @Property({ type: 'text', columnType: 'text', nullable: true })
  expectedOn: string | null = null;

  /** Per ft², or per piece. */
  @Property({ type: UnitPriceType })
  unitPrice!: Decimal;

  /** Work bought in, as people name it: dyeing; null where goods are ordered. */
  @Property({ type: 'text', columnType: 'text', nullable: true })
  service: string | null = null;

  /** The lot that goes out for it. */
  @Property({ type: 'integer', columnType: 'integer', nullable: true })
  fromLotId: number | null = null;

  /** What a service costs for the lot, where it is not paid per ft². */
  @Property({ type: MoneyType, nullable: true })
  fixedPrice: Decimal | null = null;
}
