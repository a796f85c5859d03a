import { Entity, PrimaryKey, Property } from '@mikro-orm/core';

/** One thing on a count sheet, in the unit of its balance. */
@Entity({ tableName: 'count_line' })
export class CountLine {
  @PrimaryKey({ type: 'integer', columnType: 'integer' })
  id!: number;

  @Property({ type: 'integer', columnType: 'integer' })
  countId!: number;

  @Property({ type: 'integer', columnType: 'integer', nullable: true })
  lotId: number | null = null;

  @Property({ type: 'integer', columnType: 'integer', nullable: true })
  hardwareId: number | null = null;

  /** Found there, although the books had it elsewhere. */
  @Property({ type: 'boolean', columnType: 'integer', runtimeType: 'boolean' })
  added = false;

  @Property({ type: 'integer', columnType: 'integer', nullable: true })
  counted: number | null = null;

  /** What the books said at the moment of counting. */
  @Property({ type: 'integer', columnType: 'integer', nullable: true })
  book: number | null = null;

  /** It is there and was not measured again. */
  @Property({ type: 'boolean', columnType: 'integer', runtimeType: 'boolean' })
  unmeasured = false;

  /** To be counted once more. */
  @Property({ type: 'boolean', columnType: 'integer', runtimeType: 'boolean' })
  again = false;

  @Property({ type: 'text', columnType: 'text', nullable: true })
  countedAt: string | null = null;

  @Property({ type: 'integer', columnType: 'integer', nullable: true })
  countedById: number | null = null;

  @Property({ type: 'text', columnType: 'text', nullable: true })
  countedByName: string | null = null;

  /** What it posted when the sheet was approved. */
  @Property({ type: 'integer', columnType: 'integer', nullable: true })
  movementId: number | null = null;
}
