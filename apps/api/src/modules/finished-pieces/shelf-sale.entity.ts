import { Entity, PrimaryKey, Property } from '@mikro-orm/core';

/** Pieces of one kind that a line of an invoice sells; it stays, without its line, when the draft is discarded. */
@Entity({ tableName: 'shelf_sale' })
export class ShelfSale {
  @PrimaryKey({ type: 'integer', columnType: 'integer' })
  id!: number;

  @Property({ type: 'integer', columnType: 'integer' })
  finishedPieceId!: number;

  /** Null once it is undone. */
  @Property({ type: 'integer', columnType: 'integer', nullable: true })
  invoiceLineId: number | null = null;

  @Property({ type: 'text', columnType: 'text', nullable: true })
  undoneAt: string | null = null;
}
