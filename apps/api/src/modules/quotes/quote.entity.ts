import { Entity, OptionalProps, PrimaryKey, Property } from '@mikro-orm/core';
import { JsonText } from '../../db/columns/json-text.ts';

/** An offer of a run at several quantities, with the snapshot it was priced from. */
@Entity({ tableName: 'quote' })
export class Quote {
  [OptionalProps]?: 'revision' | 'overrides' | 'message' | 'terms' | 'version';

  @PrimaryKey({ type: 'integer', columnType: 'integer' })
  id!: number;

  @Property({ type: 'text', columnType: 'text' })
  number!: string;

  @Property({ type: 'integer', columnType: 'integer' })
  revision = 1;

  @Property({ type: 'integer', columnType: 'integer' })
  customerId!: number;

  @Property({ type: 'integer', columnType: 'integer' })
  patternVersionId!: number;

  @Property({ type: 'integer', columnType: 'integer' })
  layoutId!: number;

  @Property({ type: 'text', columnType: 'text' })
  title!: string;

  @Property({ type: 'text', columnType: 'text', nullable: true })
  inHandsOn: string | null = null;

  @Property({ type: 'text', columnType: 'text', nullable: true })
  validUntil: string | null = null;

  @Property({ type: 'text', columnType: 'text' })
  state!: 'draft' | 'sent' | 'agreed' | 'declined' | 'superseded' | 'lapsed';

  /** RunInput of the domain, whole: the numbers can be worked out again from it alone. */
  @Property({ type: JsonText })
  input!: unknown;

  /** RunNumbers of the domain. */
  @Property({ type: JsonText })
  numbers!: unknown;

  /** What the owner set by hand in place of the shop's own values. */
  @Property({ type: JsonText })
  overrides: { rejectPercent?: string; leatherPricePerFt2?: string } = {};

  @Property({ type: 'text', columnType: 'text' })
  message = '';

  /** QuoteTerms of the contract; empty in quotes of before there were any. */
  @Property({ type: JsonText })
  terms: unknown = {};

  @Property({ type: 'text', columnType: 'text' })
  createdAt!: string;

  @Property({ type: 'text', columnType: 'text', nullable: true })
  sentAt: string | null = null;

  @Property({ type: 'text', columnType: 'text', nullable: true })
  agreedAt: string | null = null;

  @Property({ type: 'integer', columnType: 'integer', nullable: true })
  agreedQuantity: number | null = null;

  @Property({ type: 'text', columnType: 'text', nullable: true })
  agreedHow: string | null = null;

  /** The option that was agreed; null for the piece as it is. */
  @Property({ type: 'text', columnType: 'text', nullable: true })
  agreedOption: string | null = null;

  @Property({ type: 'integer', columnType: 'integer', version: true })
  version!: number;
}
