import { Entity, OptionalProps, PrimaryKey, Property } from '@mikro-orm/core';

/** Who the shop buys from. */
@Entity({ tableName: 'supplier' })
export class Supplier {
  [OptionalProps]?: 'email' | 'phone' | 'leadDays' | 'note' | 'active' | 'version';

  @PrimaryKey({ type: 'integer', columnType: 'integer' })
  id!: number;

  @Property({ type: 'text', columnType: 'text' })
  name!: string;

  @Property({ type: 'text', columnType: 'text' })
  email = '';

  @Property({ type: 'text', columnType: 'text' })
  phone = '';

  @Property({ type: 'integer', columnType: 'integer' })
  leadDays = 7;

  @Property({ type: 'text', columnType: 'text' })
  note = '';

  @Property({ type: 'boolean', columnType: 'integer', runtimeType: 'boolean' })
  active = true;

  @Property({ type: 'integer', columnType: 'integer', version: true })
  version!: number;
}
