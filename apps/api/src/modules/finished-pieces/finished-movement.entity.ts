import { Entity, PrimaryKey, Property } from '@mikro-orm/core';
import type { Decimal } from 'decimal.js';
import { MoneyType } from '../../db/columns/columns.ts';

/** Finished pieces that came to the shelf or left it; never changed. */
@Entity({ tableName: 'finished_movement' })
export class FinishedMovement {
  @PrimaryKey({ type: 'integer', columnType: 'integer' })
  id!: number;

  @Property({ type: 'integer', columnType: 'integer' })
  finishedPieceId!: number;

  @Property({ type: 'text', columnType: 'text' })
  at!: string;

  /** The shop's calendar day. */
  @Property({ type: 'text', columnType: 'text' })
  day!: string;

  @Property({ type: 'text', columnType: 'text' })
  kind!: 'made' | 'sold' | 'given' | 'spoiled' | 'count' | 'put back';

  /** Signed: in is positive. */
  @Property({ type: 'integer', columnType: 'integer' })
  quantity!: number;

  /** Signed, at what they cost to make. */
  @Property({ type: MoneyType })
  value!: Decimal;

  @Property({ type: 'integer', columnType: 'integer', nullable: true })
  jobId: number | null = null;

  /** The sale that took them, or that was undone. */
  @Property({ type: 'integer', columnType: 'integer', nullable: true })
  shelfSaleId: number | null = null;

  @Property({ type: 'text', columnType: 'text' })
  reason!: string;

  @Property({ type: 'integer', columnType: 'integer', nullable: true })
  actorId: number | null = null;

  @Property({ type: 'text', columnType: 'text' })
  actorName!: string;
}
