import { Entity, PrimaryKey, Property } from '@mikro-orm/core';

/** A signed-in browser, by the hash of its session id. */
@Entity({ tableName: 'web_session' })
export class WebSession {
  /** A leaked database gives nobody a session. */
  @PrimaryKey({ type: 'text', columnType: 'text' })
  idHash!: string;

  @Property({ type: 'integer', columnType: 'integer', nullable: true })
  personId: number | null = null;

  @Property({ type: 'text', columnType: 'text' })
  data!: string;

  @Property({ type: 'text', columnType: 'text' })
  expiresAt!: string;

  @Property({ type: 'text', columnType: 'text' })
  createdAt!: string;
}
