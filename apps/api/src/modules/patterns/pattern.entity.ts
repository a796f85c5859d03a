import { Entity, OptionalProps, PrimaryKey, Property } from '@mikro-orm/core';

/** A thing the shop makes; what it is made of is in its versions. */
@Entity({ tableName: 'pattern' })
export class Pattern {
  [OptionalProps]?: 'active' | 'version';

  @PrimaryKey({ type: 'integer', columnType: 'integer' })
  id!: number;

  @Property({ type: 'text', columnType: 'text' })
  name!: string;

  @Property({ type: 'integer', columnType: 'integer' })
  latestVersion!: number;

  @Property({ type: 'boolean', columnType: 'integer', runtimeType: 'boolean' })
  active = true;

  @Property({ type: 'integer', columnType: 'integer', version: true })
  version!: number;
}
