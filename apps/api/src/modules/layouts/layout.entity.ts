import { Entity, PrimaryKey, Property } from '@mikro-orm/core';
import { JsonText } from '../../db/columns/json-text.ts';

/** A layout worked out once, found again by the hash of what went in. */
@Entity({ tableName: 'layout' })
export class StoredLayout {
  @PrimaryKey({ type: 'integer', columnType: 'integer' })
  id!: number;

  @Property({ type: 'text', columnType: 'text' })
  inputHash!: string;

  @Property({ type: JsonText })
  input!: unknown;

  @Property({ type: JsonText })
  result!: unknown;

  @Property({ type: 'integer', columnType: 'integer' })
  pieces!: number;

  @Property({ type: 'text', columnType: 'text' })
  createdAt!: string;
}
