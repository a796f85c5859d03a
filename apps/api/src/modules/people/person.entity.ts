import { Entity, OptionalProps, PrimaryKey, Property } from '@mikro-orm/core';

/** Somebody who signs in. */
@Entity({ tableName: 'person' })
export class Person {
  [OptionalProps]?: 'active' | 'version';

  @PrimaryKey({ type: 'integer', columnType: 'integer' })
  id!: number;

  /** Kept in lower case. */
  @Property({ type: 'text', columnType: 'text' })
  email!: string;

  @Property({ type: 'text', columnType: 'text' })
  name!: string;

  @Property({ type: 'text', columnType: 'text' })
  role!: 'owner' | 'maker' | 'bookkeeper';

  @Property({ type: 'text', columnType: 'text' })
  passwordHash!: string;

  @Property({ type: 'boolean', columnType: 'integer' })
  active = true;

  @Property({ type: 'integer', columnType: 'integer', version: true })
  version!: number;

  @Property({ type: 'text', columnType: 'text' })
  createdAt!: string;
}
