import { Entity, PrimaryKey, Property } from '@mikro-orm/core';

/** A file that never changes, named by the hash of its bytes. */
@Entity({ tableName: 'stored_file' })
export class StoredFile {
  @PrimaryKey({ type: 'text', columnType: 'text' })
  hash!: string;

  @Property({ type: 'text', columnType: 'text' })
  name!: string;

  @Property({ type: 'text', columnType: 'text' })
  type!: string;

  @Property({ type: 'integer', columnType: 'integer' })
  size!: number;

  @Property({ type: 'text', columnType: 'text' })
  createdAt!: string;
}
