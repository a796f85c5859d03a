import { Entity, OptionalProps, PrimaryKey, Property } from '@mikro-orm/core';

/** An order to a supplier. */
@Entity({ tableName: 'purchase_order' })
export class PurchaseOrder {
  [OptionalProps]?: 'note' | 'draftedFor' | 'receipts' | 'version';

  @PrimaryKey({ type: 'integer', columnType: 'integer' })
  id!: number;

  @Property({ type: 'text', columnType: 'text' })
  number!: string;

  @Property({ type: 'integer', columnType: 'integer' })
  supplierId!: number;

  @Property({ type: 'text', columnType: 'text' })
  state!: 'draft' | 'sent' | 'part received' | 'received' | 'cancelled';

  @Property({ type: 'text', columnType: 'text', nullable: true })
  sentAt: string | null = null;

  @Property({ type: 'text', columnType: 'text', nullable: true })
  expectedOn: string | null = null;

  @Property({ type: 'text', columnType: 'text' })
  note = '';

  /** The runs that it was drafted for, if the check drafted it: the shop's own business, not its supplier's. */
  @Property({ type: 'text', columnType: 'text' })
  draftedFor = '';

  /** How many deliveries came: each makes a new version of the order. */
  @Property({ type: 'integer', columnType: 'integer' })
  receipts = 0;

  /** The file that its supplier got. */
  @Property({ type: 'text', columnType: 'text', nullable: true })
  paperHash: string | null = null;

  @Property({ type: 'text', columnType: 'text' })
  createdAt!: string;

  @Property({ type: 'integer', columnType: 'integer', version: true })
  version!: number;
}
