import { Entity, PrimaryKey, Property } from '@mikro-orm/core';
import { JsonText } from '../../db/columns/json-text.ts';

/** A pattern as it was designed at one time; never changed, since quotes keep the version they were made with. */
@Entity({ tableName: 'pattern_version' })
export class PatternVersion {
  @PrimaryKey({ type: 'integer', columnType: 'integer' })
  id!: number;

  @Property({ type: 'integer', columnType: 'integer' })
  patternId!: number;

  @Property({ type: 'integer', columnType: 'integer' })
  number!: number;

  @Property({ type: JsonText })
  definition!: unknown;

  @Property({ type: 'text', columnType: 'text' })
  createdAt!: string;

  @Property({ type: 'text', columnType: 'text' })
  createdBy!: string;
}
