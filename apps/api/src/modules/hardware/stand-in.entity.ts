import { Entity, PrimaryKey, Property } from '@mikro-orm/core';

/** A hardware may be replaced by another; both ways are two rows. */
@Entity({ tableName: 'stand_in' })
export class StandIn {
  @PrimaryKey({ type: 'integer', columnType: 'integer' })
  id!: number;

  @Property({ type: 'integer', columnType: 'integer' })
  hardwareId!: number;

  /** What may be taken in its place. */
  @Property({ type: 'integer', columnType: 'integer' })
  byHardwareId!: number;
}
