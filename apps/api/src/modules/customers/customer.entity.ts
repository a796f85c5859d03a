import { Entity, OptionalProps, PrimaryKey, Property } from '@mikro-orm/core';

/** Who the shop makes for. */
@Entity({ tableName: 'customer' })
export class Customer {
  [OptionalProps]?: 'contactName' | 'email' | 'phone' | 'address' | 'note' | 'active' | 'version';

  @PrimaryKey({ type: 'integer', columnType: 'integer' })
  id!: number;

  @Property({ type: 'text', columnType: 'text' })
  name!: string;

  @Property({ type: 'text', columnType: 'text' })
  contactName = '';

  @Property({ type: 'text', columnType: 'text' })
  email = '';

  @Property({ type: 'text', columnType: 'text' })
  phone = '';

  @Property({ type: 'text', columnType: 'text' })
  address = '';

  @Property({ type: 'text', columnType: 'text' })
  note = '';

  @Property({ type: 'boolean', columnType: 'integer', runtimeType: 'boolean' })
  active = true;

  @Property({ type: 'integer', columnType: 'integer', version: true })
  version!: number;

  @Property({ type: 'text', columnType: 'text' })
  createdAt!: string;
}
