import { Entity, PrimaryKey, Property } from '@mikro-orm/core';
import type { Decimal } from 'decimal.js';
import { MoneyType } from '../../db/columns/columns.ts';

/** What a claim was credited, as it was noted; a later row puts an earlier one right, and none is changed. */
@Entity({ tableName: 'claim_credit' })
export class ClaimCredit {
  @PrimaryKey({ type: 'integer', columnType: 'integer' })
  id!: number;

  @Property({ type: 'integer', columnType: 'integer' })
  supplierClaimId!: number;

  /** 0 where a later look showed that nothing was credited. */
  @Property({ type: MoneyType })
  credited!: Decimal;

  /** Why an earlier note was wrong; empty where none was. */
  @Property({ type: 'text', columnType: 'text' })
  reason!: string;

  @Property({ type: 'text', columnType: 'text' })
  at!: string;

  @Property({ type: 'integer', columnType: 'integer', nullable: true })
  actorId: number | null = null;

  @Property({ type: 'text', columnType: 'text' })
  actorName!: string;
}
