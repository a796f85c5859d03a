import { Entity, PrimaryKey, Property } from '@mikro-orm/core';

/** What is on hand and held of one lot (thousandths of mm²) or one hardware (pieces). */
@Entity({ tableName: 'stock_balance' })
export class StockBalance {
  @PrimaryKey({ type: 'integer', columnType: 'integer' })
  id!: number;

  @Property({ type: 'integer', columnType: 'integer', nullable: true })
  lotId: number | null = null;

  @Property({ type: 'integer', columnType: 'integer', nullable: true })
  hardwareId: number | null = null;

  @Property({ type: 'integer', columnType: 'integer' })
  onHand!: number;

  /** Held for jobs; an honest count may leave less on hand than is held. */
  @Property({ type: 'integer', columnType: 'integer' })
  reserved!: number;
}
