import { Entity, OptionalProps, PrimaryKey, Property } from '@mikro-orm/core';
import { JsonText } from '../../db/columns/json-text.ts';

/** A mail that waits to leave, or has left. */
@Entity({ tableName: 'outgoing_mail' })
export class OutgoingMail {
  [OptionalProps]?: 'attempts';

  @PrimaryKey({ type: 'integer', columnType: 'integer' })
  id!: number;

  @Property({ type: 'text', columnType: 'text' })
  recipient!: string;

  @Property({ type: 'text', columnType: 'text' })
  subject!: string;

  @Property({ type: 'text', columnType: 'text' })
  body!: string;

  /** Files by their hash. */
  @Property({ type: JsonText })
  attachments!: { name: string; hash: string; type: string }[];

  @Property({ type: 'text', columnType: 'text' })
  state!: 'waiting' | 'sent' | 'failed';

  @Property({ type: 'integer', columnType: 'integer' })
  attempts = 0;

  @Property({ type: 'text', columnType: 'text' })
  nextTryAt!: string;

  @Property({ type: 'text', columnType: 'text', nullable: true })
  leaseUntil: string | null = null;

  @Property({ type: 'text', columnType: 'text', nullable: true })
  sentAt: string | null = null;

  @Property({ type: 'text', columnType: 'text', nullable: true })
  lastError: string | null = null;

  @Property({ type: 'text', columnType: 'text' })
  subjectKind!: string;

  @Property({ type: 'integer', columnType: 'integer' })
  subjectId!: number;

  @Property({ type: 'text', columnType: 'text' })
  createdAt!: string;
}
