import { Entity, OptionalProps, PrimaryKey, Property } from '@mikro-orm/core';
import type { Decimal } from 'decimal.js';
import { MoneyType } from '../../db/columns/columns.ts';

/** Somebody who signs in. */
@Entity({ tableName: 'person' })
export class Person {
  [OptionalProps]?: 'active' | 'wagePerHour' | 'version';

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

  @Property({ type: 'boolean', columnType: 'integer', runtimeType: 'boolean' })
  active = true;

  /** What an hour of theirs is paid; null where it is the shop's wage. */
  @Property({ type: MoneyType, nullable: true })
  wagePerHour: Decimal | null = null;

  @Property({ type: 'integer', columnType: 'integer', version: true })
  version!: number;

  @Property({ type: 'text', columnType: 'text' })
  createdAt!: string;
}
