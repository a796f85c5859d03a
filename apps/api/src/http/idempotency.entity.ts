import { Entity, PrimaryKey, Property } from '@mikro-orm/core';
import { JsonText } from '../db/columns/json-text.ts';

/** The reply to a creating request, kept so that the same key has one effect. */
@Entity({ tableName: 'idempotent_reply' })
export class IdempotentReply {
  @PrimaryKey({ type: 'text', columnType: 'text' })
  key!: string;

  /** Who asked, and for what. */
  @PrimaryKey({ type: 'text', columnType: 'text' })
  scope!: string;

  @Property({ type: 'text', columnType: 'text' })
  requestHash!: string;

  @Property({ type: 'integer', columnType: 'integer' })
  status!: number;

  @Property({ type: JsonText })
  reply!: unknown;

  @Property({ type: 'text', columnType: 'text' })
  createdAt!: string;
}
