import { Entity, PrimaryKey, Property } from '@mikro-orm/core';

/** A hardware that a kit is made up of, and how many of it: a rivet is a cap and a post. */
@Entity({ tableName: 'kit_part' })
export class KitPart {
  @PrimaryKey({ type: 'integer', columnType: 'integer' })
  id!: number;

  @Property({ type: 'integer', columnType: 'integer' })
  kitId!: number;

  @Property({ type: 'integer', columnType: 'integer' })
  hardwareId!: number;

  @Property({ type: 'integer', columnType: 'integer' })
  quantity!: number;
}
