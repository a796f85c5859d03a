import { Entity, PrimaryKey, Property } from '@mikro-orm/core';

/** A signed link by which a customer reads one quote. */
@Entity({ tableName: 'customer_link' })
export class CustomerLink {
  @PrimaryKey({ type: 'integer', columnType: 'integer' })
  id!: number;

  @Property({ type: 'text', columnType: 'text' })
  tokenHash!: string;

  @Property({ type: 'integer', columnType: 'integer' })
  quoteId!: number;

  @Property({ type: 'text', columnType: 'text' })
  expiresAt!: string;

  @Property({ type: 'text', columnType: 'text', nullable: true })
  revokedAt: string | null = null;

  @Property({ type: 'text', columnType: 'text' })
  createdAt!: string;
}
