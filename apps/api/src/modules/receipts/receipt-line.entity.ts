import { Entity, OptionalProps, PrimaryKey, Property } from '@mikro-orm/core';
import { Decimal } from 'decimal.js';
import { AreaType, MoneyType } from '../../db/columns/columns.ts';

/** One lot, or so many of one hardware, that came with a delivery. */
@Entity({ tableName: 'receipt_line' })
export class ReceiptLine {
  [OptionalProps]?: 'material';

  @PrimaryKey({ type: 'integer', columnType: 'integer' })
  id!: number;

  @Property({ type: 'integer', columnType: 'integer' })
  receiptId!: number;

  @Property({ type: 'integer', columnType: 'integer' })
  position!: number;

  /** The line of the order that it fills. */
  @Property({ type: 'integer', columnType: 'integer', nullable: true })
  purchaseLineId: number | null = null;

  @Property({ type: 'integer', columnType: 'integer', nullable: true })
  lotId: number | null = null;

  @Property({ type: 'integer', columnType: 'integer', nullable: true })
  hardwareId: number | null = null;

  /** Thousandths of mm² as measured, or pieces. */
  @Property({ type: 'integer', columnType: 'integer' })
  quantity!: number;

  /** As the tannery stamped it on. */
  @Property({ type: AreaType, nullable: true })
  markedAreaMm2: Decimal | null = null;

  /** The maker's own batch of hardware. */
  @Property({ type: 'text', columnType: 'text' })
  batch!: string;

  /** What the goods cost. */
  @Property({ type: MoneyType })
  goods!: Decimal;

  /** Its share of freight and duty. */
  @Property({ type: MoneyType })
  carriage!: Decimal;

  /** Of leather that was out for a service: its share of what that had cost when it went. */
  @Property({ type: MoneyType })
  material: Decimal = new Decimal(0);

  /** The row of the ledger that put it on the rack. */
  @Property({ type: 'integer', columnType: 'integer' })
  movementId!: number;
}
