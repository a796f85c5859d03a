import { Entity, OptionalProps, PrimaryKey, Property } from '@mikro-orm/core';
import type { Decimal } from 'decimal.js';
import { MoneyType } from '../../db/columns/columns.ts';

/** One movement in the stock ledger, in the unit of its balance; never changed. */
@Entity({ tableName: 'stock_movement' })
export class StockMovement {
  [OptionalProps]?: 'reason';

  @PrimaryKey({ type: 'integer', columnType: 'integer' })
  id!: number;

  @Property({ type: 'text', columnType: 'text' })
  at!: string;

  /** The shop's calendar day. */
  @Property({ type: 'text', columnType: 'text' })
  day!: string;

  @Property({ type: 'text', columnType: 'text' })
  kind!: 'receive' | 'take' | 'return' | 'reject' | 'adjust' | 'count';

  @Property({ type: 'integer', columnType: 'integer', nullable: true })
  lotId: number | null = null;

  @Property({ type: 'integer', columnType: 'integer', nullable: true })
  hardwareId: number | null = null;

  /** Of an offcut's first row: the lot whose leather it is, which the job had taken. */
  @Property({ type: 'integer', columnType: 'integer', nullable: true })
  fromLotId: number | null = null;

  /** Signed: in is positive. */
  @Property({ type: 'integer', columnType: 'integer' })
  quantity!: number;

  /** Signed, at cost. */
  @Property({ type: MoneyType })
  value!: Decimal;

  @Property({ type: 'integer', columnType: 'integer', nullable: true })
  jobId: number | null = null;

  @Property({ type: 'integer', columnType: 'integer', nullable: true })
  purchaseOrderId: number | null = null;

  /** Of leather that went out for a service, or is back on its lot without it: the line that sent it. */
  @Property({ type: 'integer', columnType: 'integer', nullable: true })
  purchaseLineId: number | null = null;

  @Property({ type: 'text', columnType: 'text' })
  reason = '';

  @Property({ type: 'integer', columnType: 'integer', nullable: true })
  actorId: number | null = null;

  @Property({ type: 'text', columnType: 'text' })
  actorName!: string;
}
