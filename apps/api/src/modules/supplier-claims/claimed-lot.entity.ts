import { Entity, PrimaryKey, Property } from '@mikro-orm/core';

/** A lot of a claim: none is claimed twice. */
@Entity({ tableName: 'claimed_lot' })
export class ClaimedLot {
  @PrimaryKey({ type: 'integer', columnType: 'integer' })
  id!: number;

  @Property({ type: 'integer', columnType: 'integer' })
  supplierClaimId!: number;

  @Property({ type: 'integer', columnType: 'integer' })
  receiptLineId!: number;
}
